import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { applyEdit } from '#shared/profile/edits'
import { findLegForGirth, girthDifference } from '#shared/profile/stated-girth'
import { girthOf } from '#shared/strip/flat-strip'
import { closedHem, profileArbitrary, profileOf } from '../../support/arbitrary-profile'

const face = profileOf([3, 5, 0.75], [-90, 40], { hemB: closedHem(0.5, -1) })

describe('a stated girth', () => {
  it('is compared with the drawn one', () => {
    expect(girthDifference(face, 9.25)).toBe(0)
    expect(girthDifference(face, 10)).toBe(0.75)
    expect(girthDifference(face, 9)).toBe(-0.25)
  })

  it('gives one leg its length', () => {
    expect(findLegForGirth(face, 2, 10)).toBe(5.75)
    expect(findLegForGirth(face, 3, 8)).toBeNull()
    expect(() => findLegForGirth(face, 4, 10)).toThrow(RangeError)
    expect(() => findLegForGirth(face, 0, 10)).toThrow(RangeError)
  })

  it('is met where it differs by the rounding of binary alone', () => {
    const tenths = profileOf([0.1, 0.2], [90])
    expect(girthDifference(tenths, 0.3)).toBe(0)
    expect(findLegForGirth(tenths, 1, 0.3)).toBe(0.1)
  })

  it('leaves no leg of a hair where the others take it all', () => {
    expect(findLegForGirth(profileOf([1, 0.1, 0.2], [90, 90]), 1, 0.3)).toBeNull()
    expect(findLegForGirth(face, 1, NaN)).toBeNull()
  })

  it('agrees once the leg has the length it was solved for', () => {
    const stated = fc.integer({ min: 8, max: 60 * 16 }).map((count) => count / 16)
    fc.assert(
      fc.property(profileArbitrary, stated, fc.nat(), (profile, girth, pick) => {
        const leg = 1 + (pick % profile.legs.length)
        const length = findLegForGirth(profile, leg, girth)
        if (length === null) {
          expect(girthOf(profile) - (profile.legs[leg - 1] ?? NaN)).toBeGreaterThanOrEqual(girth)
          return
        }
        const solved = applyEdit(profile, { kind: 'setLeg', leg, length })
        expect(girthDifference(solved, girth)).toBe(0)
      }),
    )
  })
})
