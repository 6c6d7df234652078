import { describe, expect, it } from 'vitest'
import { K_HALF_HARD, K_SOFT } from '#shared/strip/bend-allowance'
import { dinKFactor } from '#shared/strip/din-6935'
import { publishedRows } from '../../support/published-values'

/*
 * K by material, thickness and inside radius, quoted as Machinery's Handbook, 26th ed. What the
 * table can say of ours is how far the strip of one right angle would be off: (π/2) T times the
 * difference of the two K. The aluminum column of 0.100 in. drops from 0.406 to 0.381 between two
 * radii where its neighbors hardly move; it is kept, and is the worst of its metal.
 */
const rows = publishedRows('k-factors.csv').map((row) => ({
  material: row.text('material'),
  thickness: row.number('thickness_in'),
  radius: row.number('radius_in'),
  k: row.number('k_factor'),
}))

type KRow = (typeof rows)[number]

const of = (material: string, thickest = 1) =>
  rows.filter((row) => row.material === material && row.thickness <= thickest)

/** Inches that a strip cut with `kFactor` is longer for one right angle than the table's. */
const longer = ({ thickness, k }: KRow, kFactor: number): number =>
  (Math.PI / 2) * thickness * (kFactor - k)

/** Machinery's Handbook, 31st ed., eq. 34: hard and cold-rolled metal. */
const K_HARD = 0.71 / (Math.PI / 2)

describe('the printed K table', () => {
  it.each(rows)(
    '$material, T $thickness, R $radius: $k lies between our soft K and the middle of the sheet',
    ({ k }) => {
      expect(k).toBeGreaterThan(K_SOFT)
      expect(k).toBeLessThan(0.5)
    },
  )

  it('has three metals: 20 of aluminum, 15 of cold-rolled steel, 10 of stainless', () => {
    const counts = ['aluminum', 'cold-rolled steel', 'stainless steel'].map((one) => of(one).length)
    expect(counts).toEqual([20, 15, 10])
    expect(rows).toHaveLength(45)
  })
})

describe('our K of half-hard metal (eq. 33) beside the table', () => {
  it('never makes aluminum short, and up to 0.063 in. long by less than 0.001 in. for a right angle', () => {
    for (const row of of('aluminum')) expect(longer(row, K_HALF_HARD)).toBeGreaterThan(0)
    for (const row of of('aluminum', 0.063)) expect(longer(row, K_HALF_HARD)).toBeLessThan(0.001)
  })

  it('makes thick aluminum long by 0.0043 in. at the worst', () => {
    const worst = Math.max(...of('aluminum').map((row) => longer(row, K_HALF_HARD)))
    expect(worst).toBeCloseTo(0.0043, 4)
  })

  it('is too low for cold-rolled steel: 0.001 to 0.0075 in. short; eq. 34 is within 0.0025', () => {
    for (const row of of('cold-rolled steel')) {
      expect(longer(row, K_HALF_HARD)).toBeLessThan(-0.0009)
      expect(longer(row, K_HALF_HARD)).toBeGreaterThan(-0.0076)
      expect(Math.abs(longer(row, K_HARD))).toBeLessThan(0.0025)
    }
  })

  it('is too low for stainless too: 0.002 to 0.0051 in. short; eq. 34 is within 0.0018', () => {
    for (const row of of('stainless steel')) {
      expect(longer(row, K_HALF_HARD)).toBeLessThan(-0.002)
      expect(longer(row, K_HALF_HARD)).toBeGreaterThan(-0.0052)
      expect(Math.abs(longer(row, K_HARD))).toBeLessThan(0.0018)
    }
  })
})

describe('DIN 6935 beside the table', () => {
  const longerByDin = (row: KRow) => longer(row, dinKFactor(row.radius, row.thickness))

  it('is another model: its K grows with the radius, the table shrinks with it', () => {
    for (const [index, row] of rows.entries()) {
      const softer = rows
        .slice(index + 1)
        .find((one) => one.material === row.material && one.thickness === row.thickness)
      if (softer === undefined) continue
      const more = dinKFactor(softer.radius, softer.thickness)
      expect(more).toBeGreaterThanOrEqual(dinKFactor(row.radius, row.thickness))
      // By a thousandth or two it goes up again at the largest radii of aluminum.
      expect(softer.k).toBeLessThanOrEqual(row.k + 0.001 + 1e-9)
    }
  })

  it('agrees within 1/128 in. for a right angle in sheet up to 0.032 in.', () => {
    const thin = rows.filter(({ thickness }) => thickness <= 0.032)
    expect(thin).toHaveLength(10)
    for (const row of thin) expect(Math.abs(longerByDin(row))).toBeLessThan(1 / 128)
  })

  it('makes a strip shorter wherever the radius is 1.25 thicknesses or less', () => {
    const sharp = rows.filter(({ radius, thickness }) => radius <= 1.25 * thickness)
    expect(sharp.length).toBeGreaterThan(15)
    for (const row of sharp) expect(longerByDin(row)).toBeLessThan(0)
  })

  it('parts from it most, by 0.0465 in., in 1/8 in. aluminum bent to 0.030', () => {
    const [worst] = rows.toSorted((a, b) => longerByDin(a) - longerByDin(b))
    expect(worst).toMatchObject({ material: 'aluminum', thickness: 0.125, radius: 0.03 })
    expect(worst && longerByDin(worst)).toBeCloseTo(-0.0465, 4)
  })
})
