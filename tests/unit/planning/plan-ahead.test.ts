import { describe, expect, it } from 'vitest'
import { AheadOutdated } from '#server/http/ahead-outdated'
import { createLocalPlanner } from '#server/planning/local-planner'
import { planAhead } from '#server/planning/plan-ahead'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import { STEEL_24, STOCK_24 } from '../../support/bend-plan-cases'
import { calibrationOf, zProfile } from '../../support/shop-factories'

const brakes = [
  { id: 'one', brake: DEMO_BRAKE.upOnly },
  { id: 'two', brake: DEMO_BRAKE.upAndDown },
]

async function planned() {
  const ahead = planAhead(createLocalPlanner())
  const plans = await ahead.planner.planOnAll(zProfile(), STOCK_24, 120, brakes)
  return { known: ahead.known, plans }
}

describe('What was planned ahead', () => {
  it('is known in the transaction, for fewer brakes too', async () => {
    const { known, plans } = await planned()
    expect(await known.planOnAll(zProfile(), STOCK_24, 120, brakes)).toEqual(plans)
    expect(await known.planOnAll(zProfile(), STOCK_24, 120, brakes.slice(1))).toEqual(
      plans.slice(1),
    )
  })

  it.each([
    ['drawing', zProfile([1, 2, 1]), STOCK_24, 120, brakes],
    ['stock', zProfile(), { ...STOCK_24, sheet: { ...STEEL_24, thickness: 0.03 } }, 120, brakes],
    [
      'calibration of a brake',
      zProfile(),
      { ...STOCK_24, calibrations: [calibrationOf('two', 0.45, 0.05)] },
      120,
      brakes,
    ],
    ['length', zProfile(), STOCK_24, 96, brakes],
    [
      'brake',
      zProfile(),
      STOCK_24,
      120,
      [...brakes, { id: 'three', brake: { ...DEMO_BRAKE.site, length: 99 } }],
    ],
  ])('is outdated where the %s is another by now', async (_what, profile, stock, length, on) => {
    const { known } = await planned()
    await expect(known.planOnAll(profile, stock, length, on)).rejects.toThrow(AheadOutdated)
  })
})
