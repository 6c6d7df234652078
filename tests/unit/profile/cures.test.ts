import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { findCureEdit } from '#shared/profile/cures'
import type { ProfileEdit } from '#shared/profile/edits'
import { applyEdit } from '#shared/profile/edits'
import type { ProfileProblem } from '#shared/profile/problem'
import { hasErrors } from '#shared/profile/problem'
import type { ProfileLimits } from '#shared/profile/problems'
import { profileProblems } from '#shared/profile/problems'
import type { Follows, Profile } from '#shared/profile/profile.schema'
import {
  closedHem,
  profileArbitrary,
  profileOf,
  sheetArbitrary,
  STEEL,
} from '../../support/arbitrary-profile'

const firstOf = (profile: Profile, limits: ProfileLimits = {}): ProfileProblem => {
  const [problem] = profileProblems(profile, STEEL, limits)
  if (!problem) throw new Error('The profile has no problem.')
  return problem
}

const cureOf = (profile: Profile, limits: ProfileLimits = {}) =>
  findCureEdit(profile, firstOf(profile, limits), STEEL, limits)

const openHem = (length: number, gap: number, turn: 1 | -1 = 1) =>
  ({ style: 'open', length, gap, turn }) as const

const following = (follows: Follows, turn = 30): Profile => ({
  ...profileOf([3, 3]),
  bends: [{ turn, follows }],
})

const leg = (place: number, length: number): ProfileEdit => ({ kind: 'setLeg', leg: place, length })

const hem = (edge: 'A' | 'B', lip: Profile['hemA']): ProfileEdit => ({
  kind: 'setHem',
  edge,
  hem: lip,
})

describe('a problem with a cure of one edit', () => {
  it.each<[string, Profile, ProfileEdit, ProfileLimits?]>([
    ['a minus that slipped in', profileOf([3, -2, 1], [90, -90]), leg(2, 2)],
    ['a leg of nothing', profileOf([3, 0, 1], [90, -90]), leg(2, 0.5)],
    ['a leg that its bends eat', profileOf([1, 0.0625, 1], [90, -90]), leg(2, 0.125)],
    [
      'a corner that turns nowhere',
      profileOf([3, 2, 1], [90, 0]),
      { kind: 'removeCorner', corner: 2 },
    ],
    [
      'a turn the long way round',
      profileOf([3, 2], [270]),
      { kind: 'setTurn', bend: 1, turn: -90 },
    ],
    [
      'a transition to an unknown slope',
      following({ rule: 'transition', pitch: 30 }),
      { kind: 'setFollows', bend: 1, follows: null },
    ],
    [
      'a slope past plumb',
      following({ rule: 'eave', pitch: 95 }),
      { kind: 'setFollows', bend: 1, follows: { rule: 'eave', pitch: 'job' } },
    ],
    [
      'a second slope below level',
      following({ rule: 'hip', pitch: 30, second: -5 }),
      { kind: 'setFollows', bend: 1, follows: { rule: 'hip', pitch: 30 } },
    ],
    [
      'a hem of nothing',
      profileOf([3], [], { hemA: closedHem(0, 1) }),
      hem('A', closedHem(0.5, 1)),
    ],
    [
      'a gap of nothing',
      profileOf([3], [], { hemB: openHem(0.5, 0) }),
      hem('B', openHem(0.5, 1 / 8)),
    ],
    [
      'a hem that its fold eats',
      profileOf([3], [], { hemA: closedHem(0.015, 1) }),
      hem('A', closedHem(0.0625, 1)),
    ],
    [
      'a hem longer than its leg',
      profileOf([1, 2], [90], { hemA: closedHem(1, 1) }),
      hem('A', closedHem(15 / 16, 1)),
    ],
    ['a strip over 60 in.', profileOf([40, 30], [90]), leg(1, 30)],
    ['a strip over the stock', profileOf([12, 10], [90]), leg(1, 10), { widestStrip: 20 }],
    [
      'a gap tighter than the sheet',
      profileOf([3], [], { hemA: openHem(0.5, 0.01) }),
      hem('A', openHem(0.5, 0.0625)),
    ],
    [
      'a hem that cracks the paint',
      profileOf([3], [], { hemB: closedHem(0.5, -1) }),
      hem('B', openHem(0.5, 0.0625, -1)),
      { paintRadius: 0.024 },
    ],
  ])('%s', (_, profile, edit, limits = {}) => {
    expect(cureOf(profile, limits)).toEqual(edit)
    expect(profileProblems(applyEdit(profile, edit), STEEL, limits)).toEqual([])
  })

  it('two sheets in one place: by the smallest change that parts them', () => {
    const overrun = profileOf([2, 1, 2], [135, 135])
    const edit = cureOf(overrun)
    if (!edit) throw new Error('There is no cure.')
    expect(edit.kind).toMatch(/setLeg|setTurn/)
    expect(hasErrors(profileProblems(applyEdit(overrun, edit), STEEL))).toBe(false)
  })

  it('two lips on one side: by a lip that is shorter or lies on the other', () => {
    const lips = profileOf([1], [], { hemA: closedHem(0.6, 1), hemB: closedHem(0.6, 1) })
    expect(cureOf(lips)).toMatchObject({ kind: 'setHem' })
  })

  it('leaves a bend alone that follows the roof', () => {
    const ridge = { rule: 'ridge', pitch: 'job' } as const
    const shut = { ...profileOf([2, 1, 2]), bends: [{ turn: 135, follows: ridge }, { turn: 135 }] }
    expect(firstOf(shut).code).toBe('crossesItself')
    expect(cureOf(shut)).not.toMatchObject({ kind: 'setTurn', bend: 1 })
  })

  it('is offered although it brings to light what the problem hid', () => {
    const hidden = profileOf([3, -2, 0.01, 2], [90, -90, 90])
    expect(cureOf(hidden)).toEqual(leg(2, 2))
    expect(firstOf(applyEdit(hidden, leg(2, 2)))).toMatchObject({ code: 'legEatenByBends', leg: 3 })
  })
})

describe('a problem without one', () => {
  it.each<[string, Profile, ProfileLimits?]>([
    ['a value to be typed', profileOf([NaN, 2], [90])],
    ['bends that do not match the legs', profileOf([2, 2], [])],
    [
      'more bends than can be made',
      profileOf(Array<number>(26).fill(2), Array<number>(25).fill(1)),
    ],
    ['a fold shut by a bend', profileOf([2, 2], [180])],
    ['a level roof that takes the bend away', following({ rule: 'ridge', pitch: 0 }, 0)],
    ['the radius of the stock', profileOf([3, 3], [90]), { metalRadius: 0.1 }],
    ['the paint of the stock', profileOf([3, 3], [-90]), { paintRadius: 0.1 }],
    [
      'a strip that no one leg can make narrow',
      profileOf(Array<number>(9).fill(9), Array<number>(8).fill(10)),
    ],
  ])('%s', (_, profile, limits = {}) => {
    expect(cureOf(profile, limits)).toBeNull()
  })
})

describe('every cure', () => {
  const spoilt = fc
    .record({
      profile: profileArbitrary,
      pick: fc.nat(),
      value: fc.constantFrom(0, -2, 0.02, 1e-12, NaN, 70, 200, -270, 180),
      what: fc.constantFrom('leg' as const, 'turn' as const, 'hem' as const, 'nothing' as const),
    })
    .map(({ profile, pick, value, what }): Profile => {
      const { legs, bends } = profile
      if (what === 'leg') return { ...profile, legs: legs.with(pick % legs.length, value) }
      if (what === 'hem') return { ...profile, hemB: closedHem(value, 1) }
      return what === 'turn' && bends.length > 0
        ? { ...profile, bends: bends.with(pick % bends.length, { turn: value }) }
        : profile
    })
  const limits = fc.record({
    widestStrip: fc.constantFrom(12, 20, 48),
    paintRadius: fc.constantFrom(0, 0.02, 0.05),
  })
  const withAnySheet = fc.option(sheetArbitrary)

  it('removes the problem it was offered for, and adds no error that could be seen before', () => {
    const cured = new Set<string>()
    fc.assert(
      fc.property(spoilt, withAnySheet, limits, (profile, sheet, bounds) => {
        const before = profileProblems(profile, sheet, bounds)
        for (const problem of before) {
          const edit = findCureEdit(profile, problem, sheet, bounds)
          if (edit === null) continue
          cured.add(problem.code)
          const after = profileProblems(applyEdit(profile, edit), sheet, bounds)
          const { code, leg: place, otherLeg, bend, hem: edge } = problem
          const same = (list: readonly ProfileProblem[], anywhere: boolean) =>
            list.filter(
              (other) =>
                other.code === code &&
                (anywhere ||
                  (other.leg === place &&
                    other.otherLeg === otherLeg &&
                    other.bend === bend &&
                    other.hem === edge)),
            ).length
          // A corner taken away moves the numbers of those after it.
          const renumbered = edit.kind === 'removeCorner'
          expect(same(after, renumbered)).toBeLessThan(same(before, renumbered))
        }
      }),
      {
        numRuns: 500,
        // Rare among the others.
        examples: [
          [profileOf([1, 0.0625, 1], [90, -90]), STEEL, { widestStrip: 48, paintRadius: 0 }],
          [
            profileOf([3], [], { hemA: closedHem(0.015, 1) }),
            STEEL,
            { widestStrip: 48, paintRadius: 0 },
          ],
        ],
      },
    )
    // The property would hold of a function that never offers anything.
    expect([...cured]).toEqual(
      expect.arrayContaining([
        'legNotPositive',
        'turnOutOfRange',
        'hemNotPositive',
        'legEatenByBends',
        'hemTooShort',
        'crossesItself',
        'stripWiderThanStock',
        'hemBelowPaint',
      ]),
    )
  })

  it('of a crossing leaves a profile that can be made, or another crossing', () => {
    fc.assert(
      fc.property(profileArbitrary, (profile) => {
        const problem = profileProblems(profile, STEEL).find(({ code }) => code === 'crossesItself')
        fc.pre(problem !== undefined)
        const edit = problem ? findCureEdit(profile, problem, STEEL) : null
        if (!edit) return
        const codes = profileProblems(applyEdit(profile, edit), STEEL)
          .filter(({ severity }) => severity === 'error')
          .map(({ code }) => code)
        expect(codes.filter((code) => code !== 'crossesItself')).toEqual([])
      }),
      { numRuns: 200 },
    )
  })
})
