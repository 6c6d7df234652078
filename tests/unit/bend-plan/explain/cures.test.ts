import fc from 'fast-check'
import { describe, expect, test, vi } from 'vitest'
import type { Brake } from '#shared/bend-plan/brake.schema'
import { DEMO_BRAKE, DEMO_BRAKES } from '#shared/bend-plan/demo-brakes'
import { cureByOtherBrake } from '#shared/bend-plan/explain/cure-by-other-brake'
import { planProfile, planSection } from '#shared/bend-plan/plan-profile'
import { planSchema } from '#shared/bend-plan/plan.schema'
import type { PlanCure } from '#shared/bend-plan/plan.schema'
import { planBends } from '#shared/bend-plan/planner'
import { applyEdit } from '#shared/profile/edits'
import { hasErrors } from '#shared/profile/problem'
import { profileProblems } from '#shared/profile/problems'
import type { Profile } from '#shared/profile/profile.schema'
import { STEEL, closedHem, hemArbitrary, profileOf } from '../../../support/arbitrary-profile'
import { CASES, STEEL_24, anyHemOrder, request, section } from '../../../support/bend-plan-cases'

vi.setConfig({ testTimeout: 120_000 })

const { upOnly, upAndDown, site } = DEMO_BRAKE

const cureNames = (cures: readonly PlanCure[]) =>
  cures.map(({ code, bend, leg, value }) => [code, leg ?? bend, value])

const curesOf = (profile: Profile, brake: Brake, length = 120) =>
  planProfile(profile, STEEL, brake, length).cures

const steps = fc.integer({ min: 2, max: 32 }).map((n) => n / 8)

/** Short legs and sharp turns: many of these cannot be bent. */
const tightProfile: fc.Arbitrary<Profile> = fc.integer({ min: 1, max: 5 }).chain((bends) =>
  fc
    .record({
      legs: fc.array(steps, { minLength: bends + 1, maxLength: bends + 1 }),
      turns: fc.array(
        fc.tuple(fc.constantFrom(45, 60, 90, 90, 120, 139), fc.constantFrom(1, 1, -1)),
        { minLength: bends, maxLength: bends },
      ),
      hemA: fc.option(hemArbitrary, { freq: 2 }),
      hemB: fc.option(hemArbitrary, { freq: 2 }),
    })
    .map(({ legs, turns, hemA, hemB }) =>
      profileOf(
        legs,
        turns.map(([turn, side]) => turn * side),
        { hemA, hemB },
      ),
    ),
)

describe('every cure', () => {
  test('applied by its edit has no errors and bends', () => {
    const seen = new Set<string>()
    let blocked = 0
    fc.assert(
      fc.property(
        tightProfile,
        fc.constantFrom(...DEMO_BRAKES),
        fc.constantFrom(60, 120, 130),
        (profile, brake, length) => {
          fc.pre(!hasErrors(profileProblems(profile, STEEL)))
          const { feasible, cures } = planProfile(profile, STEEL, brake, length)
          if (feasible) {
            expect(cures).toEqual([])
            return
          }
          blocked += 1
          expect(cures.length).toBeLessThanOrEqual(6)
          const kinds = cures.map(({ code, leg, bend }) => `${code} ${leg} ${bend}`)
          expect(new Set(kinds).size).toBe(kinds.length)
          for (const { code, edit, value } of cures) {
            seen.add(code)
            const cured = edit === null ? profile : applyEdit(profile, edit)
            const asked = code === 'shortenPiece' ? (value ?? NaN) : length
            expect(hasErrors(profileProblems(cured, STEEL))).toBe(false)
            expect(planProfile(cured, STEEL, brake, asked).feasible).toBe(true)
            expect(edit === null).toBe(code === 'shortenPiece')
          }
        },
      ),
      { ...CASES, numRuns: 300 },
    )
    expect(blocked).toBeGreaterThan(100)
    expect([...seen].sort()).toEqual([
      'changeHem',
      'closeHem',
      'dropHem',
      'lengthenLeg',
      'openAngle',
      'shortenLeg',
      'shortenPiece',
    ])
  })

  test('the same profile gives the same explanation to the byte, and keeps the schema', () => {
    fc.assert(
      fc.property(tightProfile, fc.constantFrom(...DEMO_BRAKES), (profile, brake) => {
        fc.pre(!hasErrors(profileProblems(profile, STEEL)))
        const plan = planProfile(profile, STEEL, brake, 120)
        const again = planProfile(structuredClone(profile), STEEL, structuredClone(brake), 120)
        expect(JSON.stringify(again)).toBe(JSON.stringify(plan))
        expect(planSchema.parse(JSON.parse(JSON.stringify(plan)))).toEqual(plan)
      }),
      { ...CASES, numRuns: 60 },
    )
  })
})

describe('cures by what is in the way', () => {
  test('a flange too short: the leg beside it, to the next eighth that is enough', () => {
    const cures = curesOf(profileOf([0.3, 2, 1.25], [90, -90]), upOnly)
    expect(cures[0]).toEqual({
      code: 'lengthenLeg',
      bend: null,
      leg: 1,
      value: 0.5,
      edit: { kind: 'setLeg', leg: 1, length: 0.5 },
    })
  })

  test('a fold beyond the brake: the angle, 5 degrees wider', () => {
    expect(cureNames(curesOf(profileOf([3, 3], [-138]), upOnly))).toEqual([['openAngle', 1, -133]])
    // Three steps of 5 degrees are as far as it is looked.
    expect(curesOf(profileOf([3, 3], [155]), upOnly)).toEqual([])
  })

  test('a hem outside the hems of the brake: another lip, or none', () => {
    const short = profileOf([3], [], { hemA: closedHem(0.25, 1) })
    expect(cureNames(curesOf(short, upOnly))).toEqual([
      ['changeHem', 'hemA', 0.5],
      ['dropHem', 'hemA', null],
    ])
    const long = profileOf([3], [], { hemB: closedHem(1.25, 1) })
    expect(cureNames(curesOf(long, upOnly))[0]).toEqual(['changeHem', 'hemB', 1])
    expect(curesOf(long, upOnly)[0]?.edit).toEqual({
      kind: 'setHem',
      edge: 'B',
      hem: closedHem(1, 1),
    })
  })

  test('too long for the brake: pieces as long as the brake, and only if that is all', () => {
    expect(curesOf(profileOf([3, 3], [90]), upOnly, 130)).toEqual([
      { code: 'shortenPiece', bend: null, leg: null, value: 126, edit: null },
    ])
    expect(curesOf(profileOf([3, 3], [150]), upOnly, 130)).toEqual([])
    const thick = planProfile(profileOf([3, 3], [90]), { ...STEEL, thickness: 0.06 }, upOnly, 120)
    expect(thick.cures).toEqual([])
  })

  test('a lip in the way of the nose: shorter, the smallest change first', () => {
    const pockets = section([0.75, 1.25, 4, 4, 1.25, 0.75], [-90, -90, -90, -90, -90])
    const { cures } = planSection(request(pockets, anyHemOrder(upOnly)))
    expect(cureNames(cures)).toEqual([
      ['shortenLeg', 5, 1.125],
      ['shortenLeg', 2, 1.125],
      ['shortenLeg', 6, 0.5],
    ])
    for (const { code, leg, value, edit } of cures) {
      expect([code, edit]).toEqual(['shortenLeg', null])
      const legs = pockets.legs.with((leg ?? 0) - 1, value ?? NaN)
      expect(planBends(request({ ...pockets, legs }, anyHemOrder(upOnly))).feasible).toBe(true)
    }
  })

  test('are not looked for while nobody asks, nor where the search was cut short', () => {
    const short = profileOf([0.3, 2, 1.25], [90, -90])
    expect(planProfile(short, STEEL, upOnly, 120, { explain: false }).cures).toEqual([])
    const cutShort = planProfile(profileOf([2, 2], [90]), STEEL, upOnly, 120, { nodes: 0 })
    expect(cutShort).toMatchObject({ feasible: false, proven: false, cures: [] })
  })
})

describe('another brake', () => {
  const plans = (of: ReturnType<typeof section>) =>
    [upOnly, upAndDown, site].map((brake) => ({
      brake,
      plan: planBends(request(of, anyHemOrder(brake), { sheet: STEEL_24 })),
    }))

  test('is the cheapest that bends it', () => {
    const found = cureByOtherBrake(plans(section([4, 4, 0.75], [-90, 45])))
    expect(found?.offer.brake).toBe(upAndDown)
    expect(found?.cure).toEqual({
      code: 'anotherBrake',
      bend: null,
      leg: null,
      value: null,
      edit: null,
    })
    const spiral = section([0.6, 1, 1.4, 1.8, 2.2, 2.6], [90, 90, 90, 90, 90])
    expect(cureByOtherBrake(plans(spiral))?.offer.brake).toBe(site)
  })

  test('is none where none bends it', () => {
    expect(cureByOtherBrake(plans(section([0.75, 2, 2, 2, 2], [90, 90, 90, 90])))).toBeUndefined()
  })
})
