import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { sectionOf } from '#shared/bend-plan/section'
import { mirrorProfile, reverseProfile } from '#shared/profile/flips'
import type { ProfileProblem } from '#shared/profile/problem'
import { hasErrors } from '#shared/profile/problem'
import { profileProblems } from '#shared/profile/problems'
import type { Profile } from '#shared/profile/profile.schema'
import {
  closedHem,
  hemArbitrary,
  profileArbitrary,
  profileOf,
  sheetArbitrary,
  STEEL,
  turnArbitrary,
} from '../../support/arbitrary-profile'

const found = (profile: Profile, limits = {}) => profileProblems(profile, STEEL, limits)

describe('a sound profile', () => {
  it('has no problems', () => {
    expect(found(profileOf([3.5, 5.5, 0.75], [-90, 40], { hemB: closedHem(0.5, -1) }))).toEqual([])
    expect(found(profileOf([5]))).toEqual([])
  })
})

describe('values that mean nothing', () => {
  it.each<[string, Profile, Partial<ProfileProblem>]>([
    ['a leg of NaN', profileOf([NaN]), { code: 'notFinite', leg: 1 }],
    ['an endless leg', profileOf([2, Infinity], [90]), { code: 'notFinite', leg: 2 }],
    ['a leg of zero', profileOf([2, 0], [90]), { code: 'legNotPositive', leg: 2, found: 0 }],
    ['a leg below zero', profileOf([-2]), { code: 'legNotPositive', leg: 1, found: -2 }],
    ['a turn of NaN', profileOf([2, 2], [NaN]), { code: 'notFinite', bend: 1 }],
    ['a turn of zero', profileOf([2, 2], [0]), { code: 'turnOutOfRange', bend: 1, limit: 0 }],
    [
      'a turn of 180',
      profileOf([2, 2], [-180]),
      { code: 'turnOutOfRange', bend: 1, found: -180, limit: 180 },
    ],
    [
      'a hem of zero',
      profileOf([2], [], { hemA: closedHem(0, 1) }),
      { code: 'hemNotPositive', hem: 'A' },
    ],
    [
      'a hem of NaN',
      profileOf([2], [], { hemB: closedHem(NaN, 1) }),
      { code: 'notFinite', hem: 'B' },
    ],
    [
      'an open hem without a gap',
      profileOf([2], [], { hemB: { style: 'open', length: 0.5, gap: 0, turn: 1 } }),
      { code: 'gapNotPositive', hem: 'B', found: 0 },
    ],
    ['a bend too few', profileOf([2, 2]), { code: 'bendCountMismatch', found: 0, limit: 1 }],
    [
      'a transition without its second slope',
      {
        ...profileOf([2, 2]),
        bends: [{ turn: 20, follows: { rule: 'transition' as const, pitch: 'job' as const } }],
      },
      { code: 'followsIncomplete', bend: 1 },
    ],
    [
      'a slope past plumb',
      { ...profileOf([2, 2]), bends: [{ turn: 20, follows: { rule: 'ridge', pitch: 90 } }] },
      { code: 'pitchOutOfRange', bend: 1, found: 90, limit: 90, unit: 'degrees' },
    ],
    [
      'a second slope below level',
      {
        ...profileOf([2, 2]),
        bends: [{ turn: 20, follows: { rule: 'hip', pitch: 'job', second: -1 } }],
      },
      { code: 'pitchOutOfRange', bend: 1, found: -1, limit: 0 },
    ],
    ['a leg of less than a hair', profileOf([2, 1e-12], [90]), { code: 'legNotPositive', leg: 2 }],
  ])('%s is named', (_, profile, problem) => {
    const problems = found(profile)
    expect(problems).toHaveLength(1)
    expect(problems[0]).toMatchObject({ ...problem, severity: 'error' })
  })

  it('are all named, not only the first', () => {
    const codes = found(profileOf([NaN, -1, 2], [0, 200])).map(({ code }) => code)
    expect(codes).toEqual(['notFinite', 'legNotPositive', 'turnOutOfRange', 'turnOutOfRange'])
  })

  it('25 bends are one too many, 24 are not', () => {
    const zigzag = (bends: number) =>
      profileOf(
        Array.from({ length: bends + 1 }, () => 0.5),
        Array.from({ length: bends }, (_, index) => (index % 2 ? 30 : -30)),
      )
    expect(found(zigzag(24))).toEqual([])
    expect(found(zigzag(25))).toMatchObject([{ code: 'tooManyBends', found: 25, limit: 24 }])
  })
})

describe('what the bends leave no room for', () => {
  it('a leg needs at least what its two bends consume', () => {
    // Two bends of 90: 2 (R + T) = 0.108 in.
    expect(found(profileOf([1, 0.108, 1], [90, -90]))).toEqual([])
    const problems = found(profileOf([1, 0.1, 1], [90, -90]))
    expect(problems).toMatchObject([{ code: 'legEatenByBends', leg: 2, found: 0.1 }])
    expect(problems[0]?.limit).toBeCloseTo(0.108, 12)
  })

  it('a hem needs its fold, and a leg room for both', () => {
    const tiny = profileOf([2], [], { hemA: closedHem(0.02, 1) })
    expect(found(tiny)).toMatchObject([{ code: 'hemTooShort', hem: 'A', limit: 0.024 }])
  })

  it('a lip reaches as far as the next fold, no farther', () => {
    const withHem = (length: number) => profileOf([1, 2], [90], { hemA: closedHem(length, 1) })
    expect(found(withHem(0.946))).toEqual([])
    expect(found(withHem(0.95))).toMatchObject([
      { code: 'hemTooLong', hem: 'A', leg: 1, found: 0.95, limit: 0.946 },
    ])
  })
})

describe('a profile that crosses itself', () => {
  it.each<[string, Profile, number, number]>([
    ['a triangle that overruns', profileOf([2, 1, 2], [135, 135]), 1, 3],
    ['a tube closed onto its own first leg', profileOf([0.75, 2, 2, 2, 2], [90, 90, 90, 90]), 1, 5],
    ['the same the other way round', profileOf([0.75, 2, 2, 2, 2], [-90, -90, -90, -90]), 1, 5],
  ])('%s is refused, both legs named', (_, profile, otherLeg, leg) => {
    expect(found(profile)).toMatchObject([{ code: 'crossesItself', leg, otherLeg }])
  })

  it('counts hems: two lips on one side of a short leg', () => {
    const lips = (turnB: 1 | -1) =>
      profileOf([1], [], { hemA: closedHem(0.6, 1), hemB: closedHem(0.6, turnB) })
    expect(found(lips(1))).toMatchObject([{ code: 'crossesItself', hem: 'B' }])
    expect(found(lips(-1))).toEqual([])
  })

  it('allows sheet that lies flat on sheet', () => {
    // A channel whose last leg comes back to touch the first: outside height 2 T + nothing between.
    const sharp = { ...STEEL, insideRadius: 0 }
    expect(profileProblems(profileOf([2, 0.048, 2], [90, 90]), sharp)).toMatchObject([
      { code: 'radiusTight', severity: 'warning' },
    ])
  })

  it('allows a spiral that has room and refuses it when it has not', () => {
    expect(found(profileOf([0.6, 1, 1.4, 1.8, 2.2, 2.6], [90, 90, 90, 90, 90]))).toEqual([])
    const tight = found(profileOf([0.6, 1, 0.6, 1, 0.6], [90, 90, 90, 90]))
    expect(tight.map(({ code }) => code)).toEqual(['crossesItself'])
  })

  it('is never seen in one bend or one hem, whatever the sheet', () => {
    const long = fc.integer({ min: 16, max: 256 }).map((count) => count / 16)
    fc.assert(
      fc.property(
        long,
        long,
        turnArbitrary,
        hemArbitrary,
        sheetArbitrary,
        (a, b, turn, hem, sheet) => {
          const codes = [profileOf([a, b], [turn]), profileOf([a], [], { hemB: hem })].flatMap(
            (profile) => profileProblems(profile, sheet).map(({ code }) => code),
          )
          expect(codes).not.toContain('crossesItself')
        },
      ),
    )
  })

  it('is the same fault in the mirror and from edge B', () => {
    fc.assert(
      fc.property(profileArbitrary, sheetArbitrary, (profile, sheet) => {
        const sorted = (of: Profile) =>
          profileProblems(of, sheet)
            .map(({ code }) => code)
            .toSorted()
        expect(sorted(mirrorProfile(profile))).toEqual(sorted(profile))
        expect(sorted(reverseProfile(profile))).toEqual(sorted(profile))
      }),
      { numRuns: 300 },
    )
  })
})

describe('width', () => {
  it('over 60 in. is refused whatever the stock', () => {
    expect(found(profileOf([40, 30], [90]))).toMatchObject([{ code: 'stripTooWide', limit: 60 }])
    expect(found(profileOf([1e308, 1e308], [90]))).toMatchObject([{ code: 'stripTooWide' }])
    expect(profileProblems(profileOf([61]), null)).toMatchObject([{ code: 'stripTooWide' }])
  })

  it('names the leg that is too wide all alone', () => {
    expect(found(profileOf([1, 61], [90]))).toMatchObject([{ code: 'stripTooWide', leg: 2 }])
    expect(found(profileOf([40, 30], [90]))).toMatchObject([{ code: 'stripTooWide', leg: null }])
    expect(found(profileOf([21, 2], [90]), { widestStrip: 20 })).toMatchObject([
      { code: 'stripWiderThanStock', leg: 1 },
    ])
  })

  it('over the stock is refused with both widths', () => {
    const wide = profileOf([10, 10.5], [90])
    expect(found(wide, { widestStrip: 20 })).toMatchObject([
      { code: 'stripWiderThanStock', limit: 20 },
    ])
    expect(found(wide, { widestStrip: 20.5 })).toEqual([])
  })
})

describe('warnings', () => {
  it('do not keep a piece from being made', () => {
    const sharp = { ...STEEL, insideRadius: 0.01 }
    const tightGap = profileOf([2, 2], [90], {
      hemA: { style: 'open', length: 0.5, gap: 0.02, turn: 1 },
    })
    const problems = profileProblems(tightGap, sharp)
    expect(problems.map(({ code, severity }) => [code, severity])).toEqual([
      ['radiusTight', 'warning'],
      ['gapTight', 'warning'],
    ])
    expect(hasErrors(problems)).toBe(false)
  })
})

describe('a profile without errors', () => {
  it('can always be given to the planner', () => {
    fc.assert(
      fc.property(profileArbitrary, sheetArbitrary, (profile, sheet) => {
        fc.pre(!hasErrors(profileProblems(profile, sheet)))
        expect(sectionOf(profile, sheet).legs).toHaveLength(profile.legs.length)
      }),
      { numRuns: 300 },
    )
  })
})

describe('garbage of the right shape', () => {
  const value = fc.oneof(
    fc.double(),
    fc.constantFrom(NaN, Infinity, -Infinity, 1e308, -1e308, 5e-324, 0, -0, 180, 1e-12, 60, 0.054),
  )
  const turn = fc.constantFrom<1 | -1>(1, -1)
  const hem = fc.option(
    fc.oneof(
      fc.record({ style: fc.constant('closed' as const), length: value, turn }),
      fc.record({ style: fc.constant('open' as const), length: value, gap: value, turn }),
    ),
  )
  const garbage: fc.Arbitrary<Profile> = fc.record({
    version: fc.constant(1 as const),
    legs: fc.array(value, { maxLength: 40 }),
    bends: fc.array(fc.record({ turn: value }), { maxLength: 40 }),
    hemA: hem,
    hemB: hem,
    colorSide: fc.constantFrom('left' as const, 'none' as const),
  })

  it('never throws, and each refusal names its cause', () => {
    fc.assert(
      fc.property(garbage, fc.option(sheetArbitrary), (profile, sheet) => {
        for (const problem of profileProblems(profile, sheet)) {
          const { code, leg, bend, hem: edge } = problem
          const ofTheWhole = [
            'bendCountMismatch',
            'tooManyBends',
            'stripTooWide',
            'radiusTight',
          ].includes(code)
          expect(ofTheWhole || leg !== null || bend !== null || edge !== null).toBe(true)
          if (leg !== null) expect(leg).toBeLessThanOrEqual(profile.legs.length)
          if (bend !== null) expect(bend).toBeLessThanOrEqual(profile.bends.length)
        }
      }),
      { numRuns: 2000 },
    )
  })

  it('always refuses a value that is no number or not positive', () => {
    const bad = fc.constantFrom(NaN, Infinity, -Infinity, 0, -0, -1, -1e308)
    fc.assert(
      fc.property(profileArbitrary, bad, fc.nat(), (profile, length, pick) => {
        const leg = pick % profile.legs.length
        const spoilt = { ...profile, legs: profile.legs.with(leg, length) }
        expect(profileProblems(spoilt, STEEL).some((problem) => problem.leg === leg + 1)).toBe(true)
      }),
    )
  })
})
