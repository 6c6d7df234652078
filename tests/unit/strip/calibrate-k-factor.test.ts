import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { kFactorFromTestBend } from '#shared/strip/calibrate-k-factor'
import { flatStrip } from '#shared/strip/flat-strip'
import { profileOf, sheetArbitrary, turnArbitrary } from '../../support/arbitrary-profile'

const testBend = {
  stripWidth: 4,
  legA: 2.03,
  legB: 2.02,
  turn: 90,
  insideRadius: 0.03,
  thickness: 0.024,
}

describe('K from a test bend', () => {
  it('gives back the K that the strip was made with', () => {
    fc.assert(
      fc.property(sheetArbitrary, turnArbitrary, (sheet, turn) => {
        const { stripWidth } = flatStrip(profileOf([3, 2], [turn]), sheet)
        const result = kFactorFromTestBend({ ...sheet, stripWidth, legA: 3, legB: 2, turn })
        if (!result.ok) expect.fail(`refused: ${result.code}`)
        // A bend of a degree uses so little sheet that a K from it carries the rounding of 5 in.
        expect(result.kFactor).toBeCloseTo(sheet.kFactor, 6)
      }),
    )
  })

  it('names the deduction it found', () => {
    const result = kFactorFromTestBend(testBend)
    expect(result).toMatchObject({ ok: true })
    if (result.ok) expect(result.bendDeduction).toBeCloseTo(0.05, 12)
  })

  it.each([
    ['notFinite', 'legA', { legA: NaN }],
    ['notFinite', 'turn', { turn: Infinity }],
    ['notPositive', 'stripWidth', { stripWidth: 0 }],
    ['notPositive', 'insideRadius', { insideRadius: -0.1 }],
    ['turnOutOfRange', 'turn', { turn: 0 }],
    ['turnOutOfRange', 'turn', { turn: -180 }],
    ['kOutOfRange', 'kFactor', { legA: 2.2 }],
    ['kOutOfRange', 'kFactor', { legA: 1.9 }],
  ])('refuses %s at %s', (code, field, given) => {
    expect(kFactorFromTestBend({ ...testBend, ...given })).toMatchObject({ ok: false, code, field })
  })

  it('does not change with the side the bend turns to', () => {
    expect(kFactorFromTestBend({ ...testBend, turn: -90 })).toEqual(kFactorFromTestBend(testBend))
  })

  it('answers any numbers at all: with a K inside the sheet, or a refusal that names its field', () => {
    const value = fc.oneof(
      fc.double(),
      fc.double({ min: 0, max: 5, noNaN: true }),
      fc.constantFrom(NaN, Infinity, -Infinity, 1e308, -1e308, 5e-324, 0, -0, 180),
    )
    const garbage = fc.record({
      stripWidth: value,
      legA: value,
      legB: value,
      turn: value,
      insideRadius: value,
      thickness: value,
    })
    fc.assert(
      fc.property(garbage, (bend) => {
        const result = kFactorFromTestBend(bend)
        if (result.ok) {
          expect(result.kFactor).toBeGreaterThan(0)
          expect(result.kFactor).toBeLessThanOrEqual(1)
        } else if (result.field !== 'kFactor') {
          expect(result.found).toBe(bend[result.field])
        } else {
          expect(result.found > 0 && result.found <= 1).toBe(false)
        }
      }),
      { numRuns: 2000 },
    )
  })
})
