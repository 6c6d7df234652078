import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Profile } from '#shared/profile/profile.schema'
import { hasErrors } from '#shared/profile/problem'
import { profileProblems } from '#shared/profile/problems'
import { foldedSection } from '#shared/strip/folded-section'
import { sectionMeasures } from '#shared/strip/section-measures'
import { profileArbitrary, profileOf, sheetArbitrary } from '../../support/arbitrary-profile'

const sheet = {
  metal: 'steel',
  thickness: 0.02,
  insideRadius: 0.02,
  kFactor: 0.4074,
  density: 0.2836,
  springbackPer90: 2,
} as const

const measuresOf = (profile: Profile, thickness: number = sheet.thickness) =>
  sectionMeasures(foldedSection(profile, { ...sheet, thickness }))

describe('the size and the middle of a folded piece', () => {
  it('of a flat sheet is its length by its thickness, and its middle', () => {
    const { box, centroid } = measuresOf(profileOf([6]))
    expect(box.width).toBeCloseTo(6, 12)
    expect(box.height).toBeCloseTo(0.02, 12)
    expect(centroid.x).toBeCloseTo(3, 9)
    expect(centroid.y).toBeCloseTo(0, 9)
  })

  it('of an angle is that of two thin strips', () => {
    // Outside dimensions 4 by 2; two thin rectangles, each in its middle.
    const { box, centroid } = measuresOf(profileOf([4, 2], [90]))
    expect(box.width).toBeCloseTo(4, 9)
    expect(box.height).toBeCloseTo(2, 9)
    const middle = { x: (4 * 2 + 2 * 4) / 6, y: (2 * 1) / 6 }
    expect(Math.abs(centroid.x - middle.x)).toBeLessThan(0.02)
    expect(Math.abs(centroid.y - middle.y)).toBeLessThan(0.02)
  })

  it('is mirrored with the piece', () => {
    fc.assert(
      fc.property(profileArbitrary, sheetArbitrary, (profile, sheetGiven) => {
        fc.pre(!hasErrors(profileProblems(profile, sheetGiven)))
        const flip = (hem: Profile['hemA']) =>
          hem && { ...hem, turn: hem.turn === 1 ? (-1 as const) : (1 as const) }
        const mirrored: Profile = {
          ...profile,
          bends: profile.bends.map(({ turn }) => ({ turn: 0 - turn })),
          hemA: flip(profile.hemA),
          hemB: flip(profile.hemB),
        }
        const [one, other] = [profile, mirrored].map((each) =>
          sectionMeasures(foldedSection(each, sheetGiven)),
        )
        expect(other?.box.width).toBeCloseTo(one?.box.width ?? NaN, 9)
        expect(other?.box.height).toBeCloseTo(one?.box.height ?? NaN, 9)
        expect(other?.centroid.x).toBeCloseTo(one?.centroid.x ?? NaN, 6)
        expect(other?.centroid.y).toBeCloseTo(0 - (one?.centroid.y ?? NaN), 6)
      }),
      { numRuns: 60 },
    )
  })
})
