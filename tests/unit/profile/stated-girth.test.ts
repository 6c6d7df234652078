import { describe, expect, it } from 'vitest'
import { findLegForGirth, girthDifference } from '#shared/profile/stated-girth'
import { closedHem, profileOf } from '../../support/arbitrary-profile'

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
  })
})
