import { describe, expect, it } from 'vitest'
import { includedFromRoof, resolveFollows } from '#shared/profile/follows'
import { profileProblems } from '#shared/profile/problems'
import type { Follows } from '#shared/profile/profile.schema'
import { profileOf } from '../../support/arbitrary-profile'

const slope6 = (Math.atan(6 / 12) * 180) / Math.PI

describe('the angle the roof gives', () => {
  it.each<[Follows, number]>([
    [{ rule: 'ridge', pitch: 'job' }, 180 - 2 * slope6],
    [{ rule: 'ridge', pitch: 'job', second: 10 }, 170 - slope6],
    [{ rule: 'highSidePeak', pitch: 'job' }, 90 - slope6],
    [{ rule: 'eave', pitch: 'job' }, 90 + slope6],
    [{ rule: 'eaveSquare', pitch: 'job' }, 90],
    [{ rule: 'gable', pitch: 'job' }, 90],
    [{ rule: 'headwall', pitch: 'job' }, 90 + slope6],
    [{ rule: 'headwall', pitch: 15 }, 105],
    [{ rule: 'sidewall', pitch: 'job' }, 90],
    [{ rule: 'transition', pitch: 40, second: 15 }, 155],
    [{ rule: 'transition', pitch: 15, second: 40 }, 155],
  ])('%o at 6 in 12 is %s', (follows, included) => {
    expect(includedFromRoof(follows, slope6)).toBeCloseTo(included, 12)
  })

  it('is not known where the pitch of the job is not', () => {
    expect(includedFromRoof({ rule: 'eave', pitch: 'job' }, null)).toBeNull()
    expect(includedFromRoof({ rule: 'eave', pitch: 20 }, null)).toBe(110)
    expect(includedFromRoof({ rule: 'gable', pitch: 'job' }, null)).toBe(90)
  })
})

describe('resolveFollows', () => {
  const eave = (turn: number) => ({
    ...profileOf([4, 3, 1]),
    bends: [{ turn, follows: { rule: 'eave' as const, pitch: 'job' as const } }, { turn: 30 }],
  })

  it('turns the bend to the side it is drawn to and leaves the others alone', () => {
    const right = resolveFollows(eave(-10), 12)
    expect(right.bends[0]?.turn).toBeCloseTo(-45, 12)
    expect(right.bends[0]?.follows).toEqual({ rule: 'eave', pitch: 'job' })
    expect(right.bends[1]).toEqual({ turn: 30 })
    expect(resolveFollows(eave(10), 12).bends[0]?.turn).toBeCloseTo(45, 12)
  })

  it('leaves the turn as it is while the pitch is not known', () => {
    expect(resolveFollows(eave(-10), null)).toEqual(eave(-10))
  })

  it('resolves again to the same when asked twice', () => {
    const once = resolveFollows(eave(-10), 7)
    expect(resolveFollows(once, 7)).toEqual(once)
  })

  it('makes no bend of two equal slopes, which is a problem with a name', () => {
    const level = resolveFollows(
      {
        ...profileOf([4, 3]),
        bends: [{ turn: 10, follows: { rule: 'transition', pitch: 20, second: 20 } }],
      },
      6,
    )
    expect(profileProblems(level, null)).toMatchObject([{ code: 'turnOutOfRange', bend: 1 }])
  })
})
