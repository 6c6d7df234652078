import { describe, expect, it } from 'vitest'
import { createLocalPlanner } from '#server/planning/local-planner'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import { planProfile } from '#shared/bend-plan/plan-profile'
import { getStarter } from '#shared/profile/starters'
import type { Sheet } from '#shared/stock/stock.schema'
import { calibrationOf } from '../../support/shop-factories'

const sheet: Sheet = {
  metal: 'steel',
  thickness: 0.0239,
  insideRadius: 0.03,
  kFactor: 0.4,
  density: 0.284,
  springbackPer90: 2,
}
const own = { sheet, calibrations: [] }
const { profile } = getStarter('eaveDrip')
const brakes = [
  { id: 'two', brake: DEMO_BRAKE.upAndDown },
  { id: 'one', brake: DEMO_BRAKE.upOnly },
]

describe('The local planner', () => {
  it("gives the kernel's own plan for each brake, in the order asked for", async () => {
    const plans = await createLocalPlanner().planOnAll(profile, own, 120, brakes)
    expect(plans).toEqual([
      {
        brakeId: 'two',
        brakeName: DEMO_BRAKE.upAndDown.name,
        plan: planProfile(profile, sheet, DEMO_BRAKE.upAndDown, 120),
      },
      {
        brakeId: 'one',
        brakeName: DEMO_BRAKE.upOnly.name,
        plan: planProfile(profile, sheet, DEMO_BRAKE.upOnly, 120),
      },
    ])
  })

  it('plans once for bends that are tied to the roof and bends that are not', async () => {
    const planner = createLocalPlanner()
    const untied = { ...profile, bends: profile.bends.map(({ turn }) => ({ turn })) }
    const [first] = await planner.planOnAll(profile, own, 120, brakes)
    const [second] = await planner.planOnAll(untied, own, 120, brakes)
    expect(second?.plan).toBe(first?.plan)
  })

  it.each([
    ['sheet', profile, { ...sheet, thickness: 0.0299 }, 120],
    ['length', profile, sheet, 48],
    ['paint', { ...profile, colorSide: 'right' as const }, sheet, 120],
  ])('plans again for another %s', async (_what, otherProfile, otherSheet, otherLength) => {
    const planner = createLocalPlanner()
    const [first] = await planner.planOnAll(profile, own, 120, brakes)
    const [second] = await planner.planOnAll(
      otherProfile,
      { sheet: otherSheet, calibrations: [] },
      otherLength,
      brakes,
    )
    expect(second?.plan).not.toBe(first?.plan)
    expect(second?.plan).toEqual(
      planProfile(otherProfile, otherSheet, DEMO_BRAKE.upAndDown, otherLength),
    )
  })

  it('plans for each brake by what was measured there', async () => {
    const measured = { sheet, calibrations: [calibrationOf('one', 0.5, 0.06)] }
    const plans = await createLocalPlanner().planOnAll(profile, measured, 120, brakes)
    const worn = { ...sheet, kFactor: 0.5, insideRadius: 0.06 }
    expect(plans.map(({ plan }) => plan)).toEqual([
      planProfile(profile, sheet, DEMO_BRAKE.upAndDown, 120),
      planProfile(profile, worn, DEMO_BRAKE.upOnly, 120),
    ])
    expect(plans[1]?.plan).not.toEqual(planProfile(profile, sheet, DEMO_BRAKE.upOnly, 120))
  })

  it("passes the kernel's refusal of an impossible leg on", async () => {
    const eaten = { ...profile, legs: [0.001, ...profile.legs.slice(1)] }
    await expect(createLocalPlanner().planOnAll(eaten, own, 120, brakes)).rejects.toThrow(
      RangeError,
    )
  })
})
