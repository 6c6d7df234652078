import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Sheet } from '#shared/stock/stock.schema'
import { kFactorFromTestBend } from '#shared/strip/calibrate-k-factor'
import { fitTestBends, type MeasuredBend, type TestBendFit } from '#shared/strip/fit-test-bends'
import { flatStrip } from '#shared/strip/flat-strip'
import { profileOf, sheetArbitrary, STEEL } from '../../support/arbitrary-profile'

/** The bend that a strip of this sheet would measure, without an error of the tape. */
const bendOf = (
  sheet: Sheet,
  turn: number,
  insideRadius: number | null = null,
  [legA, legB]: readonly [number, number] = [3, 2],
): MeasuredBend => ({
  legA,
  legB,
  turn,
  insideRadius,
  thickness: sheet.thickness,
  stripWidth: flatStrip(profileOf([legA, legB], [turn]), sheet).stripWidth,
})

const fitted = (fit: TestBendFit) => {
  if (!fit.ok) expect.fail(`refused: ${fit.code} ${fit.found}`)
  return fit
}

/** Two angles that tell a radius from a K: one about square, one sharper or much flatter. */
const anglesArbitrary = fc.tuple(
  fc.integer({ min: 85, max: 92 }),
  fc.oneof(fc.integer({ min: 20, max: 45 }), fc.integer({ min: 120, max: 170 })),
)

describe('K and radius from test bends', () => {
  it('gives back K and R of the sheet, from bends at two angles and any more', () => {
    fc.assert(
      fc.property(
        sheetArbitrary,
        anglesArbitrary,
        fc.array(fc.integer({ min: 5, max: 175 }), { maxLength: 4 }),
        (sheet, angles, more) => {
          const bends = [...angles, ...more].map((turn) => bendOf(sheet, turn))
          const fit = fitted(fitTestBends(bends))
          expect(fit.kFactor).toBeCloseTo(sheet.kFactor, 6)
          expect(fit.insideRadius).toBeCloseTo(sheet.insideRadius, 6)
          expect(fit.spread).toBeLessThan(1e-9)
        },
      ),
    )
  })

  it('does so where the strips were of different thickness, which a gauge allows', () => {
    const thin = { ...STEEL, thickness: 0.0221 }
    const fit = fitted(fitTestBends([bendOf(STEEL, 90), bendOf(thin, 135), bendOf(thin, -30)]))
    expect(fit.kFactor).toBeCloseTo(STEEL.kFactor, 9)
    expect(fit.insideRadius).toBeCloseTo(STEEL.insideRadius, 9)
  })

  it('gives what one bend gives alone where its radius was measured', () => {
    fc.assert(
      fc.property(sheetArbitrary, fc.integer({ min: 30, max: 170 }), (sheet, turn) => {
        const bend = { ...bendOf(sheet, turn), insideRadius: sheet.insideRadius }
        const alone = kFactorFromTestBend(bend)
        const fit = fitted(fitTestBends([bend]))
        expect(alone.ok && alone.kFactor).toBeCloseTo(fit.kFactor, 9)
        expect(fit).toMatchObject({ insideRadius: sheet.insideRadius })
      }),
    )
  })

  it('takes the radius that was measured, for bends where it was not as well', () => {
    const sheet = { ...STEEL, insideRadius: 0.05 }
    const fit = fitted(fitTestBends([bendOf(sheet, 90, 0.048), bendOf(sheet, 90, 0.052)]))
    expect(fit.insideRadius).toBeCloseTo(0.05, 12)
    expect(fit.kFactor).toBeCloseTo(sheet.kFactor, 9)
    expect(fitted(fitTestBends([bendOf(sheet, 90, 0.05), bendOf(sheet, 120)]))).toMatchObject({
      insideRadius: 0.05,
    })
  })

  it('lies between bends that differ a little, and says by how much', () => {
    const wide = bendOf(STEEL, 90, STEEL.insideRadius)
    const narrow = { ...wide, stripWidth: wide.stripWidth - 1 / 128 }
    const fit = fitted(fitTestBends([wide, narrow]))
    expect(fit.spread).toBeCloseTo(1 / 256, 9)
    const k = (bend: MeasuredBend) => fitted(fitTestBends([bend])).kFactor
    expect(fit.kFactor).toBeCloseTo((k(wide) + k(narrow)) / 2, 9)
  })
})

describe('refuses', () => {
  const refused = (bends: readonly MeasuredBend[]) => {
    const fit = fitTestBends(bends)
    if (fit.ok) expect.fail(`gave K ${fit.kFactor}`)
    return fit
  }
  const square = bendOf(STEEL, 90, STEEL.insideRadius)

  it('nothing at all', () => {
    expect(refused([])).toMatchObject({ code: 'noBends', bend: null })
  })

  it.each([
    ['notFinite', { legA: NaN }],
    ['notFinite', { insideRadius: Infinity }],
    ['notPositive', { stripWidth: 0 }],
    ['notPositive', { thickness: -0.024 }],
    ['turnOutOfRange', { turn: 0 }],
    ['turnOutOfRange', { turn: 180 }],
  ])('a measure that is none (%s), naming the bend', (code, given) => {
    expect(refused([square, { ...square, ...given }])).toMatchObject({ code, bend: 1 })
  })

  it('one bend without its radius', () => {
    expect(refused([bendOf(STEEL, 90)])).toMatchObject({ code: 'radiusUnknown' })
  })

  it.each([
    [90, 90],
    [90, 80],
    // A radius shows the same in both: (2 tan 30° - π/3) / (π/3) = (2 - θ) / θ.
    [60, 103.9],
  ])('bends of %s and %s degrees, which do not tell a radius from a K', (one, other) => {
    expect(refused([bendOf(STEEL, one), bendOf(STEEL, other)])).toMatchObject({
      code: 'anglesTooAlike',
      limit: 0.15,
    })
  })

  it('strips that contradict each other by more than a sixty-fourth', () => {
    const off = { ...square, stripWidth: square.stripWidth + 0.04 }
    const fit = refused([square, off])
    expect(fit).toMatchObject({ code: 'contradicting', limit: 1 / 64 })
    expect(fit.found).toBeCloseTo(0.02, 9)
    expect(fitTestBends([square, { ...square, stripWidth: square.stripWidth + 0.03 }]).ok).toBe(
      true,
    )
  })

  it('radii that contradict each other', () => {
    expect(refused([square, bendOf(STEEL, 90, STEEL.insideRadius + 0.04)])).toMatchObject({
      code: 'contradicting',
    })
  })

  it.each([-0.06, 0.08])('a K outside the sheet: a strip %s in. off', (off) => {
    expect(refused([{ ...square, stripWidth: square.stripWidth + off }])).toMatchObject({
      code: 'kOutOfRange',
      limit: 1,
    })
  })

  it('a radius that would lie on the other side of the sheet', () => {
    const bends = [bendOf(STEEL, 90), bendOf(STEEL, 150)]
    const off = bends.map((bend, index) => ({
      ...bend,
      stripWidth: bend.stripWidth + (index === 0 ? 0.03 : -0.03),
    }))
    expect(refused(off)).toMatchObject({ code: 'radiusOutOfRange' })
  })
})
