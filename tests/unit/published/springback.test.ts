import { describe, expect, it } from 'vitest'
import type { SpringbackMaterial } from '#shared/metal/springback'
import {
  radiusAfterSpringback,
  SPRINGBACK_COLUMNS,
  SPRINGBACK_ROWS,
  springbackPer90FromTable,
  springbackRatio,
  turnBeforeSpringback,
} from '#shared/metal/springback'
import { expectPrinted, publishedRows } from '../../support/published-values'

const isMaterial = (name: string): name is SpringbackMaterial => name in SPRINGBACK_ROWS

describe('springback formula, MIT 2.008 homework 5 (2004), aluminum 1200-O', () => {
  // The modulus is printed garbled; 10e6 psi fits, 1e6 would give 28 degrees.
  const bend = { insideRadius: 2, thickness: 1 / 8, yieldStress: 5075, elasticModulus: 10e6 }

  it('T 1/8, radius 2 in., 90 degrees wanted: about 2 degrees', () => {
    expectPrinted(turnBeforeSpringback(bend, 90) - 90, '2')
  })

  it('keeps 0.97564 of its curve, radius 2.0499 in., bent to 92.18 (arithmetic redone)', () => {
    expectPrinted(springbackRatio(bend), '0.97564')
    expectPrinted(radiusAfterSpringback(bend), '2.0499')
    expectPrinted(turnBeforeSpringback(bend, 90), '92.18')
  })
})

describe('springback formula, other examples', () => {
  it('Kalpakjian, 20 ga steel, T 0.0359, radius 0.5 in.: 0.942 and 0.531 in. (from memory)', () => {
    const bend = {
      insideRadius: 0.5,
      thickness: 0.0359,
      yieldStress: 40_000,
      elasticModulus: 29e6,
    }
    expectPrinted(springbackRatio(bend), '0.942')
    expectPrinted(radiusAfterSpringback(bend), '0.531')
  })

  it('T 0.0265, radius 0.5 in., 300 MPa, no printed answer: 0.918 and 0.545 in. at 30e6 psi (derived)', () => {
    const bend = {
      insideRadius: 0.5,
      thickness: 0.0265,
      yieldStress: 300 / 0.00689476,
      elasticModulus: 30e6,
    }
    expectPrinted(springbackRatio(bend), '0.918')
    expectPrinted(radiusAfterSpringback(bend), '0.545')
  })

  it('a sheet that bends elastically only is refused, and so is a value that is not positive', () => {
    const bend = { insideRadius: 20, thickness: 0.02, yieldStress: 40_000, elasticModulus: 29e6 }
    expect(() => springbackRatio(bend)).toThrow(/springs back flat/)
    expect(() => springbackRatio({ ...bend, thickness: 0 })).toThrow(/thickness/)
    expect(() => springbackRatio({ ...bend, yieldStress: NaN })).toThrow(/yieldStress/)
  })
})

describe('Tabellenbuch Metall, springback factor kR (column heads from memory)', () => {
  const rows = publishedRows('springback-factor.csv').map((row) => ({
    material: row.text('material'),
    row,
  }))

  it.each(rows)('$material, every column', ({ material, row }) => {
    if (!isMaterial(material)) expect.fail(`${material} is not in our table`)
    const printed = SPRINGBACK_COLUMNS.map((head) => row.text(`${head}`)).filter((v) => v !== '')
    expect(SPRINGBACK_ROWS[material]).toEqual(printed.map(Number))
  })

  it('is carried whole', () => {
    expect(rows.map(({ material }) => material)).toEqual(Object.keys(SPRINGBACK_ROWS))
  })

  it('DC01 at r/s 1, 90 wanted: bend to 90.9 degrees (derived)', () => {
    const result = springbackPer90FromTable('steel', 0.0276, 0.0276)
    if (!result.ok) expect.fail(result.code)
    expect(result.factor).toBe(0.99)
    expectPrinted(90 + result.springbackPer90, '90.9')
    // kR is the wanted angle over the one at the tool.
    expect((90 + result.springbackPer90) * result.factor).toBeCloseTo(90, 9)
  })

  it.each([
    ['steel', 'DC01'],
    ['stainless', 'X12CrNi18-8'],
    ['copper', 'E-Cu-R20'],
    ['aluminum', 'EN-AW-Al99.0'],
  ] as const)('%s reads %s: every column, and half way between two', (metal, material) => {
    const row = SPRINGBACK_ROWS[material]
    const factorAt = (ratio: number) => {
      const result = springbackPer90FromTable(metal, ratio * 0.03125, 0.03125)
      return result.ok ? result.factor : NaN
    }
    row.forEach((factor, index) => {
      const [head = NaN, nextHead] = SPRINGBACK_COLUMNS.slice(index)
      expect(factorAt(head)).toBeCloseTo(factor, 12)
      const next = row[index + 1]
      if (next === undefined || nextHead === undefined) return
      expect(factorAt((head + nextHead) / 2)).toBeCloseTo((factor + next) / 2, 12)
    })
  })

  it.each([
    ['steel', 0.02, { code: 'ratioOutsideTable', least: 1, most: 100 }],
    ['steel', 3.2, { code: 'ratioOutsideTable', most: 100 }],
    ['stainless', 1.5, { code: 'ratioOutsideTable', most: 40 }],
    ['zinc', 0.06, { code: 'metalNotInTable' }],
  ] as const)('%s of 1/32 in. with a radius of %s in. is refused', (metal, radius, refusal) => {
    expect(springbackPer90FromTable(metal, radius, 0.03125)).toMatchObject({
      ok: false,
      ...refusal,
    })
  })

  it('refuses a radius or thickness that is not positive', () => {
    expect(() => springbackPer90FromTable('steel', 0, 0.03)).toThrow(/insideRadius/)
    expect(() => springbackPer90FromTable('steel', 0.03, NaN)).toThrow(/thickness/)
  })
})
