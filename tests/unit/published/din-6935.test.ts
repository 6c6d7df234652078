import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { bendDeduction } from '#shared/strip/bend-allowance'
import { dinCompensation, dinFactor, dinKFactor } from '#shared/strip/din-6935'
import { flatStrip } from '#shared/strip/flat-strip'
import { profileOf } from '../../support/arbitrary-profile'
import { expectPrinted } from '../../support/published-values'

describe('DIN 6935 after Tabellenbuch Metall', () => {
  it.each([
    [1, '0.65'],
    [1.6, '0.752'],
    [2.5, '0.849'],
    [4, '0.951'],
    [5, '1.0'],
  ])('r/s %s: k %s (recomputed from the formula)', (ratio, printed) => {
    expectPrinted(dinFactor(ratio * 0.7, 0.7), printed)
    expect(dinKFactor(ratio * 0.7, 0.7)).toBe(dinFactor(ratio * 0.7, 0.7) / 2)
  })

  it('above r/s 5 the neutral line is the middle of the sheet: k 1', () => {
    expect(dinFactor(5.001, 1)).toBe(1)
    expect(dinFactor(200, 1)).toBe(1)
  })

  it.each([
    [1, '1.9'],
    [1.6, '2.1'],
    [2.5, '2.4'],
    [4, '3.0'],
  ])(
    '90 degrees, s 1 mm, r %s mm: v %s mm (table of the supplement, from memory)',
    (r, printed) => {
      expectPrinted(dinCompensation({ openingAngle: 90, insideRadius: r, thickness: 1 }), printed)
    },
  )

  it('takes nothing off from 165 degrees of opening up', () => {
    const bend = { insideRadius: 1, thickness: 1 }
    expect(dinCompensation({ ...bend, openingAngle: 165 })).toBeGreaterThan(0)
    expect(dinCompensation({ ...bend, openingAngle: 165.1 })).toBe(0)
    expect(dinCompensation({ ...bend, openingAngle: 180 })).toBe(0)
  })

  it.each([
    [{ openingAngle: -1, insideRadius: 1, thickness: 1 }, /openingAngle/],
    [{ openingAngle: 181, insideRadius: 1, thickness: 1 }, /openingAngle/],
    [{ openingAngle: NaN, insideRadius: 1, thickness: 1 }, /openingAngle/],
    [{ openingAngle: 90, insideRadius: 0, thickness: 1 }, /insideRadius/],
    [{ openingAngle: 90, insideRadius: NaN, thickness: 1 }, /insideRadius/],
    [{ openingAngle: 90, insideRadius: 1, thickness: 0 }, /thickness/],
  ])('%o is refused and named', (bend, named) => {
    expect(() => dinCompensation(bend)).toThrow(named)
  })
})

describe('our strip beside DIN 6935', () => {
  const bend = fc.record({
    insideRadius: fc.double({ min: 0.02, max: 0.5, noNaN: true }),
    thickness: fc.double({ min: 0.01, max: 0.125, noNaN: true }),
    // Evenly spread, the turning point at 90 included.
    openingAngle: fc.integer({ min: 10, max: 1650 }).map((tenths) => tenths / 10),
  })

  it('takes off the same for the same K, up to 165 degrees of opening', () => {
    fc.assert(
      fc.property(bend, ({ insideRadius, thickness, openingAngle }) => {
        const kFactor = dinKFactor(insideRadius, thickness)
        const ours = bendDeduction({ turn: 180 - openingAngle, insideRadius, thickness, kFactor })
        expect(ours).toBeCloseTo(dinCompensation({ openingAngle, insideRadius, thickness }), 9)
      }),
      { numRuns: 1000 },
    )
  })

  it('gives the flat length a + b - v', () => {
    const sheet = { thickness: 0.0276, insideRadius: 0.0394 }
    const strip = flatStrip(profileOf([4, 3], [90]), {
      ...sheet,
      kFactor: dinKFactor(0.0394, 0.0276),
    })
    expect(strip.stripWidth).toBeCloseTo(7 - dinCompensation({ ...sheet, openingAngle: 90 }), 12)
  })

  it('goes on where DIN stops: at 15 degrees of turn 24 ga steel loses less than 1/128 in. more', () => {
    const sheet = { thickness: 0.0276, insideRadius: 0.0394 }
    const ours = bendDeduction({ ...sheet, turn: 15, kFactor: dinKFactor(0.0394, 0.0276) })
    expect(ours).toBeGreaterThan(0)
    expect(ours).toBeLessThan(1 / 128)
  })
})
