import { describe, expect, it } from 'vitest'
import { EXPANSION, thermalMovement } from '#shared/metal/thermal-movement'
import type { Metal } from '#shared/stock/stock.schema'
import { expectPrinted, expectSameInUnits, publishedRows } from '../../support/published-values'

const rows = publishedRows('materials.csv').map((row) => ({ material: row.text('material'), row }))

const OURS: readonly [Metal, string][] = [
  ['steel', 'steel (carbon)'],
  ['aluminum', 'aluminum alloy sheet'],
  ['copper', 'copper (cold rolled roofing)'],
  ['zinc', 'zinc-titanium rolled'],
  ['stainless', 'stainless AISI 300'],
]

describe('expansion', () => {
  it.each(OURS)('of %s is that of %s in both units', (metal, material) => {
    const row = rows.find((one) => one.material === material)?.row
    expectPrinted(EXPANSION[metal].perFahrenheit * 1e6, row?.text('expansion_1e-6_per_F') ?? '')
    expectPrinted(EXPANSION[metal].perCelsius * 1e6, row?.text('expansion_1e-6_per_C') ?? '')
  })

  it('of copper C11000, 9.4 per F and 17.0 per C (Callister), is less than roofing copper moves', () => {
    const row = rows.find((one) => one.material === 'copper C11000')?.row
    expectSameInUnits('9.4', 1.8, '17.0')
    expect(row?.number('expansion_1e-6_per_F')).toBe(9.4)
    expect(EXPANSION.copper.perFahrenheit).toBeGreaterThan(9.4e-6)
    expect(EXPANSION.copper.perCelsius).toBeGreaterThan(17e-6)
  })

  it('of aluminum alloys is 13 per F (Gere); the 23 per C beside it is less than ours', () => {
    expectPrinted(EXPANSION.aluminum.perFahrenheit * 1e6, '13')
    expectSameInUnits('13', 1.8, '23')
    expect(EXPANSION.aluminum.perCelsius).toBeGreaterThan(23e-6)
  })

  it('of pure zinc, 12.7 to 18.1 per F and 23.0 to 32.5 per C (Callister), is more than the alloy moves', () => {
    const row = rows.find((one) => one.material === 'zinc commercially pure')?.row
    expect(row?.text('expansion_1e-6_per_F')).toBe('12.7 to 18.1')
    expectSameInUnits('12.7', 1.8, '23.0')
    expectSameInUnits('18.1', 1.8, '32.5')
    expect(EXPANSION.zinc.perCelsius).toBeLessThan(23e-6)
  })
})

describe('worked examples', () => {
  it('a zinc panel of 10 m, roofing zinc technical data: +13.2 mm at +60 C, -8.8 mm at -40 C', () => {
    const length = 10_000 / 25.4
    const moved = (celsius: number) => thermalMovement({ metal: 'zinc', length, celsius }) * 25.4
    expect(moved(60)).toBeCloseTo(13.2, 9)
    expect(moved(-40)).toBeCloseTo(-8.8, 9)
  })

  it('1 in. of copper over 60 F: 0.00057 in. at the 9.5 of Copper Flashings, p. 60; ours is 3 % more', () => {
    expectPrinted(9.5e-6 * 60, '0.00057')
    const ours = thermalMovement({ metal: 'copper', length: 1, fahrenheit: 60 })
    expect(ours / 0.00057).toBeCloseTo(9.8 / 9.5, 9)
  })

  it.each([
    ['copper', 0.86],
    ['steel', 0.61],
  ] as const)(
    'a meter of %s over 50 C moves %s mm, an older roofing text; ours within 3 %',
    (metal, printed) => {
      const moved = thermalMovement({ metal, length: 1000 / 25.4, celsius: 50 }) * 25.4
      expect(Math.abs(moved / printed - 1)).toBeLessThan(0.03)
    },
  )

  it('its 1.47 mm for zinc is of pure zinc, inside the range of Callister', () => {
    const millionths = (1.47 / 1000 / 50) * 1e6
    expect(millionths).toBeGreaterThan(23)
    expect(millionths).toBeLessThan(32.5)
  })

  it.each([
    ['aluminum', '0.157'],
    ['copper', '0.118'],
    ['zinc', '0.147'],
    ['stainless', '0.115'],
    ['steel', '0.080'],
  ] as const)('10 ft of %s over 100 F moves %s in. (derived)', (metal, printed) => {
    expectPrinted(thermalMovement({ metal, length: 120, fahrenheit: 100 }), printed)
  })

  it('a roof from -20 to 150 F (Copper Flashings, p. 60) moves 10 ft of copper by 170 degrees (derived)', () => {
    const moved = thermalMovement({ metal: 'copper', length: 120, fahrenheit: 150 - -20 })
    expectPrinted(moved, (120 * 9.8e-6 * 170).toFixed(4))
  })
})

describe('thermalMovement', () => {
  it('is the same whichever degrees are given', () => {
    for (const [metal] of OURS) {
      const fahrenheit = thermalMovement({ metal, length: 120, fahrenheit: 90 })
      expect(thermalMovement({ metal, length: 120, celsius: 50 })).toBeCloseTo(fahrenheit, 12)
    }
  })

  it.each([
    [{ length: NaN, fahrenheit: 1 }, /length/],
    [{ length: -1, fahrenheit: 1 }, /length/],
    [{ length: 1, fahrenheit: Infinity }, /fahrenheit/],
    [{ length: 1, celsius: NaN }, /celsius/],
  ])('refuses %o and names it', (given, named) => {
    expect(() => thermalMovement({ metal: 'steel', ...given })).toThrow(named)
  })
})
