import { describe, expect, it } from 'vitest'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import { planProfile } from '#shared/bend-plan/plan-profile'
import type { PlanReason } from '#shared/bend-plan/plan.schema'
import { starterProfile, STARTERS, type StarterKey } from '#shared/profile/starters'
import { STEEL } from '../../support/arbitrary-profile'
import { KNOWN_PLANS } from '../../support/known-bend-plans'

const brakes = [
  ['upOnly', DEMO_BRAKE.upOnly],
  ['upAndDown', DEMO_BRAKE.upAndDown],
  ['site', DEMO_BRAKE.site],
] as const

/** The starters that the site brake does not bend, and why; all else bends on every brake. */
const NOT_ON_SITE: Partial<Record<StarterKey, PlanReason['code']>> = {
  valley: 'throat',
  wValley: 'throat',
  coping: 'throat',
}

describe.each(brakes)('on the %s brake, in 10 ft of 24 gauge steel', (name, brake) => {
  it.each(STARTERS)('$key bends, or the reason is named', ({ key, profile }) => {
    const plan = planProfile(profile, STEEL, brake, 120)
    const reason = name === 'site' ? NOT_ON_SITE[key] : undefined
    expect(plan.feasible).toBe(reason === undefined)
    if (reason !== undefined) expect(plan.reasons.map(({ code }) => code)).toContain(reason)
  })
})

describe('of the plans that are known', () => {
  // At 6 in 12 the ribs of a W valley turn by (36.87 + 90) / 2 = 63.4 degrees, as in the known one.
  it.each([
    ['W valley', 'wValley', { wingWidth: 10, ribSide: 1.125 }],
    ['box gutter', 'boxGutter', { faceWidth: 4.5, bottomWidth: 5 }],
    ['coping', 'coping', { wallWidth: 12, faceWidth: 4 }],
  ] as const)('the %s costs what it is known to cost', (knownName, key, parameters) => {
    const known = KNOWN_PLANS.find(({ name }) => name === knownName)
    for (const [name, brake] of brakes) {
      const profile = starterProfile(key, parameters, 6)
      const plan = planProfile(profile, STEEL, { ...brake, hemsFirst: false }, 120)
      const cost = plan.cost && [plan.cost.handling, plan.cost.wideFront, plan.cost.faceGauge]
      expect(plan.feasible ? cost : 'no').toEqual(known?.outcome[name])
    }
  })
})
