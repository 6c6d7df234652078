import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { mirrorProfile, reverseProfile } from '#shared/profile/flips'
import { bendDeduction, outsideSetback } from '#shared/strip/bend-allowance'
import { flatParts } from '#shared/strip/flat-parts'
import { flatStrip, roundToShear } from '#shared/strip/flat-strip'
import { paintedArea } from '#shared/strip/weight'
import {
  closedHem,
  profileArbitrary,
  profileOf,
  sheetArbitrary,
  STEEL,
} from '../../support/arbitrary-profile'

describe('strip width', () => {
  it('is the girth less every deduction', () => {
    fc.assert(
      fc.property(profileArbitrary, sheetArbitrary, (profile, sheet) => {
        const { girth, stripWidth } = flatStrip(profile, sheet)
        const { folds } = flatParts(profile, sheet)
        const deductions = folds.reduce((sum, fold) => sum + bendDeduction(fold), 0)
        expect(stripWidth).toBeCloseTo(girth - deductions, 9)
      }),
    )
  })

  it('grows by exactly what a leg grows', () => {
    fc.assert(
      fc.property(
        profileArbitrary,
        sheetArbitrary,
        fc.nat(),
        fc.integer({ min: 1, max: 64 }),
        (profile, sheet, pick, sixteenths) => {
          const leg = pick % profile.legs.length
          const longer = {
            ...profile,
            legs: profile.legs.with(leg, (profile.legs[leg] ?? 0) + sixteenths / 16),
          }
          const grown = flatStrip(longer, sheet).stripWidth - flatStrip(profile, sheet).stripWidth
          expect(grown).toBeCloseTo(sixteenths / 16, 9)
        },
      ),
    )
  })

  it('is the same for the mirror image and for the walk from edge B', () => {
    fc.assert(
      fc.property(profileArbitrary, sheetArbitrary, (profile, sheet) => {
        const strip = flatStrip(profile, sheet)
        const mirrored = flatStrip(mirrorProfile(profile), sheet)
        const reversed = flatStrip(reverseProfile(profile), sheet)
        expect(mirrored.stripWidth).toBeCloseTo(strip.stripWidth, 9)
        expect(reversed.stripWidth).toBeCloseTo(strip.stripWidth, 9)
        expect(mirrored.creases.map(({ turn }) => 0 - turn)).toEqual(
          strip.creases.map(({ turn }) => turn),
        )
        reversed.creases.toReversed().forEach((crease, index) => {
          expect(strip.stripWidth - crease.at).toBeCloseTo(strip.creases[index]?.at ?? NaN, 9)
        })
      }),
    )
  })

  it('scales with everything', () => {
    fc.assert(
      fc.property(profileArbitrary, sheetArbitrary, (profile, sheet) => {
        const twice = (hem: typeof profile.hemA) =>
          hem &&
          (hem.style === 'open'
            ? { ...hem, length: hem.length * 2, gap: hem.gap * 2 }
            : { ...hem, length: hem.length * 2 })
        const large = flatStrip(
          {
            ...profile,
            legs: profile.legs.map((leg) => leg * 2),
            hemA: twice(profile.hemA),
            hemB: twice(profile.hemB),
          },
          { ...sheet, thickness: sheet.thickness * 2, insideRadius: sheet.insideRadius * 2 },
        )
        expect(large.stripWidth).toBeCloseTo(flatStrip(profile, sheet).stripWidth * 2, 9)
      }),
    )
  })
})

describe('creases', () => {
  it('lie in order, their zones apart, runs and zones filling the strip', () => {
    fc.assert(
      fc.property(profileArbitrary, sheetArbitrary, (profile, sheet) => {
        const { runs, folds } = flatParts(profile, sheet)
        fc.pre(runs.every(({ straight }) => straight >= 0))
        const { creases, stripWidth } = flatStrip(profile, sheet)
        let reached = 0
        for (const { at, from, to } of creases) {
          expect(from).toBeGreaterThanOrEqual(reached)
          expect(at).toBeGreaterThan(from)
          expect(to).toBeGreaterThan(at)
          expect(at).toBeCloseTo((from + to) / 2, 12)
          reached = to
        }
        expect(stripWidth).toBeGreaterThanOrEqual(reached)
        const filled =
          runs.reduce((sum, run) => sum + run.straight, 0) +
          folds.reduce((sum, fold) => sum + fold.allowance, 0)
        expect(filled).toBeCloseTo(stripWidth, 9)
      }),
    )
  })

  it('number bends from edge A and name the folds of hems, with the turn of the walk', () => {
    const profile = profileOf([3, 4, 2], [30, -60], {
      hemA: closedHem(0.5, 1),
      hemB: closedHem(0.5, -1),
    })
    expect(flatStrip(profile, STEEL).creases.map(({ fold, turn }) => [fold, turn])).toEqual([
      ['hemA', 180],
      [1, 30],
      [2, -60],
      ['hemB', -180],
    ])
  })

  it('leave a leg with a hem less R + T of the fold, and the lip too', () => {
    const { runs } = flatParts(profileOf([3], [], { hemA: closedHem(0.5, 1) }), STEEL)
    expect(runs).toEqual([
      { of: 'lipA', outside: 0.5, straight: 0.5 - 0.024 },
      { of: 1, outside: 3, straight: 3 - 0.024 },
    ])
  })
})

describe('outside setback', () => {
  it('agrees from both sides of 90 degrees and stays R + T above', () => {
    const bend = { thickness: 0.024, insideRadius: 0.03, kFactor: 0.4 }
    expect(outsideSetback({ ...bend, turn: 90 })).toBeCloseTo(0.054, 12)
    expect(outsideSetback({ ...bend, turn: 90.000001 })).toBeCloseTo(0.054, 7)
    expect(outsideSetback({ ...bend, turn: -150 })).toBeCloseTo(0.054, 12)
    expect(outsideSetback({ ...bend, turn: 45 })).toBeCloseTo(0.054 * Math.tan(Math.PI / 8), 12)
  })
})

describe('what is shown of a strip', () => {
  it('is rounded to 1/32 for the shear', () => {
    expect(roundToShear(9.18069)).toBe(9.1875)
    expect(roundToShear(5)).toBe(5)
  })

  it('counts painted faces', () => {
    expect(paintedArea({ stripWidth: 10 }, 'left', 120)).toBe(1200)
    expect(paintedArea({ stripWidth: 10 }, 'both', 120)).toBe(2400)
    expect(paintedArea({ stripWidth: 10 }, 'none', 120)).toBe(0)
  })
})
