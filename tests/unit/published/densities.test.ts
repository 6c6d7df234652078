import { describe, expect, it } from 'vitest'
import { DENSITIES, weightPerSquareFoot } from '#shared/metal/densities'
import { findCopper } from '#shared/metal/gauges'
import type { Metal } from '#shared/stock/stock.schema'
import { pieceWeight } from '#shared/strip/weight'
import { expectPrinted, expectSameInUnits, publishedRows } from '../../support/published-values'

/** kg/m³ of one lb/in³: 0.45359237 kg in 0.0254³ m³, exact by definition. */
const PER_POUND_INCH = 0.45359237 / 0.0254 ** 3

const rows = publishedRows('materials.csv')
  .filter((row) => row.text('density_lb_per_in3') !== '')
  .map((row) => ({ material: row.text('material'), row }))

const OURS: readonly [Metal, string][] = [
  ['steel', 'steel (carbon)'],
  ['aluminum', 'aluminum alloy sheet'],
  ['copper', 'copper (cold rolled roofing)'],
  ['zinc', 'zinc-titanium rolled'],
  ['stainless', 'stainless AISI 300'],
]

describe('density', () => {
  it.each(OURS)('of %s is that of %s in materials.csv', (metal, material) => {
    const row = rows.find((one) => one.material === material)?.row
    expect(DENSITIES[metal]).toBe(row?.number('density_lb_per_in3'))
  })

  it.each(rows)('of $material is the same in lb/in³ and kg/m³', ({ row }) => {
    // The kilograms are printed to the ten.
    const tens = row.number('density_kg_per_m3') / 10
    expectSameInUnits(row.text('density_lb_per_in3'), PER_POUND_INCH / 10, `${tens}`)
  })

  it('of steel is 490 lb/ft³ (Gere, Mechanics of Materials, 5th ed.)', () => {
    expectPrinted(DENSITIES.steel * 1728, '490')
  })

  it('of zinc-titanium is 7.18 g/cm³, give or take 0.02 (roofing zinc technical data)', () => {
    expectPrinted((DENSITIES.zinc * PER_POUND_INCH) / 1000, '7.18')
  })

  it('of aluminum 3003, 0.099 lb/in³, is 2730 kg/m³ (from memory)', () => {
    expectSameInUnits('0.099', PER_POUND_INCH / 10, '273')
  })
})

describe('weight of a square foot (derived from the densities)', () => {
  it.each([
    ['steel', '40.8'],
    ['copper', '46.4'],
    ['aluminum', '14.1'],
    ['zinc', '37.4'],
    ['stainless', '41.3'],
  ] as const)('%s weighs %s lb for each inch of thickness', (metal, printed) => {
    expectPrinted(weightPerSquareFoot(metal, 1), printed)
  })

  it.each([
    [0.024, '0.339'],
    [0.032, '0.452'],
    [0.04, '0.564'],
    [0.05, '0.706'],
    [0.063, '0.889'],
  ])('aluminum of %s in. weighs %s lb', (thickness, printed) => {
    expectPrinted(weightPerSquareFoot('aluminum', thickness), printed)
  })

  it('16 oz copper weighs 16 oz by its density too', () => {
    expectPrinted(weightPerSquareFoot('copper', findCopper(16)?.thickness ?? 0) * 16, '16')
  })
})

describe('mill weight chart for aluminum, alloy 2014', () => {
  it('0.063 x 48 x 144 in. at 0.101 lb/in³ weighs 43.98 lb', () => {
    const weight = pieceWeight({ stripWidth: 48 }, { thickness: 0.063, density: 0.101 }, 144)
    expectPrinted(weight, '43.98')
  })
})
