import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { isAtMost } from '#shared/geometry/tolerance'
import { includedFromRoof, resolveFollows } from '#shared/profile/follows'
import { profileProblems } from '#shared/profile/problems'
import type { Follows } from '#shared/profile/profile.schema'
import { pitchAngle } from '#shared/units/angle'
import { profileOf } from '../../support/arbitrary-profile'
import { expectPrinted, publishedRows } from '../../support/published-values'

const slope6 = (Math.atan(6 / 12) * 180) / Math.PI

const acos = (cosine: number) => (Math.acos(cosine) * 180) / Math.PI

describe('the angle the roof gives', () => {
  it.each<[Follows, number]>([
    [{ rule: 'ridge', pitch: 'job' }, 180 - 2 * slope6],
    [{ rule: 'ridge', pitch: 'job', second: 10 }, 170 - slope6],
    [{ rule: 'hip', pitch: 'job' }, 180 - acos(0.8)],
    [{ rule: 'valley', pitch: 'job' }, 180 - acos(0.8)],
    [{ rule: 'valley', pitch: 'job', second: 0 }, 180 - slope6],
    [{ rule: 'hip', pitch: 45, second: 60 }, 180 - acos(Math.SQRT1_2 / 2)],
    [{ rule: 'valleyRib', pitch: 'job' }, 135 - acos(0.8) / 2],
    [{ rule: 'valleyRib', pitch: 'job', second: 0 }, 135 - slope6 / 2],
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

  const rafters = publishedRows('rafters.csv')

  it.each(rafters.map((row) => ({ rise: row.number('rise_per_12'), row })))(
    'along a hip or valley at $rise in 12 is that of the rafter tables',
    ({ rise, row }) => {
      for (const rule of ['hip', 'valley'] as const) {
        const included = includedFromRoof({ rule, pitch: 'job' }, pitchAngle(rise)) ?? NaN
        expectPrinted(included, row.text('hip_dihedral_deg'))
        expectPrinted(180 - included, row.text('valley_flat_bend_deg'))
      }
    },
  )

  it('along a hip lies between the slopes of its two planes and their sum', () => {
    const slopes = fc.double({ min: 0, max: 89.9, noNaN: true })
    fc.assert(
      fc.property(slopes, slopes, (slope, second) => {
        const turn = 180 - (includedFromRoof({ rule: 'hip', pitch: slope, second }, null) ?? NaN)
        expect(isAtMost(Math.max(slope, second), turn)).toBe(true)
        expect(isAtMost(turn, slope + second)).toBe(true)
      }),
    )
  })

  it.each([-1, 90, 200, NaN, Infinity])('is not known for a slope of %s degrees', (slope) => {
    for (const rule of ['ridge', 'hip', 'highSidePeak', 'eave', 'headwall'] as const) {
      expect(includedFromRoof({ rule, pitch: slope }, slope6)).toBeNull()
    }
    expect(includedFromRoof({ rule: 'valley', pitch: 'job', second: slope }, slope6)).toBeNull()
    expect(includedFromRoof({ rule: 'gable', pitch: slope }, slope6)).toBe(90)
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
