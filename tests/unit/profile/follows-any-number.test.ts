import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { resolveFollows } from '#shared/profile/follows'
import { profileProblems } from '#shared/profile/problems'
import type { Follows } from '#shared/profile/profile.schema'
import { followsSchema } from '#shared/profile/profile.schema'
import { profileOf } from '../../support/arbitrary-profile'

describe('slopes that are no slopes', () => {
  const slope = fc.oneof(
    fc.double(),
    fc.constantFrom(NaN, Infinity, -Infinity, 1e308, -1e308, 5e-324, 0, -0, 90, 180, -45),
  )
  const follows: fc.Arbitrary<Follows> = fc.record({
    rule: fc.constantFrom(...followsSchema.shape.rule.options),
    pitch: fc.oneof(slope, fc.constant('job' as const)),
    second: slope,
  })

  it('never crash, and what cannot be bent is a problem of that bend', () => {
    fc.assert(
      fc.property(follows, fc.option(slope), (tie, jobRise) => {
        const tied = { ...profileOf([4, 3]), bends: [{ turn: -30, follows: tie }] }
        const resolved = resolveFollows(tied, jobRise)
        const turned = Math.abs(resolved.bends[0]?.turn ?? NaN)
        const bendable = turned > 1e-9 && turned < 180 - 1e-9
        const values = [tie.pitch, tie.second].filter((value) => typeof value === 'number')
        const problems = profileProblems(resolved, null)
        expect(problems.every(({ bend, leg }) => bend === 1 || leg !== null)).toBe(true)
        if (bendable && values.every(Number.isFinite)) return
        expect(problems.some(({ bend }) => bend === 1)).toBe(true)
      }),
      { numRuns: 1000 },
    )
  })
})
