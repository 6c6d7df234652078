import { describe, expect, test, vi } from 'vitest'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import { planBends } from '#shared/bend-plan/planner'
import { replayPlan } from '#shared/bend-plan/replay'
import { anyHemOrder, request } from '../../support/bend-plan-cases'
import { KNOWN_PLANS } from '../../support/known-bend-plans'
import { forwardSearch } from '../../support/planner-opinions'

vi.setConfig({ testTimeout: 60_000 })

const brakes = ['upOnly', 'upAndDown', 'site'] as const

describe('known outcomes of the demo brakes', () => {
  describe.each(KNOWN_PLANS)('$name', ({ section, outcome }) => {
    test.each(brakes)('on %s', (key) => {
      const asked = request(section, anyHemOrder(DEMO_BRAKE[key]))
      const plan = planBends(asked)
      const found = plan.cost && [plan.cost.handling, plan.cost.wideFront, plan.cost.faceGauge]
      expect(found ?? 'no').toEqual(outcome[key])
      expect(plan.proven).toBe(true)
      expect(forwardSearch(asked) ?? null).toEqual(found)
      if (plan.feasible) expect(replayPlan(plan, asked)).toEqual({ problems: [], cost: plan.cost })
    })
  })

  test.each(['W valley', 'coping'])('%s is too deep for the throat of the site brake', (name) => {
    const known = KNOWN_PLANS.find((each) => each.name === name)
    if (known === undefined) throw new Error(`No known plan ${name}`)
    const { reasons } = planBends(request(known.section, anyHemOrder(DEMO_BRAKE.site)))
    expect(reasons.map(({ code }) => code)).toEqual(['throat', 'throat'])
  })
})
