import { describe, expect, test } from 'vitest'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import { planBends } from '#shared/bend-plan/planner'
import { replayPlan } from '#shared/bend-plan/replay'
import { anyHemOrder, request } from '../../support/bend-plan-cases'
import { KNOWN_PLANS } from '../../support/known-bend-plans'
import { forwardSearch, isCheaper } from '../../support/planner-opinions'

const brakes = ['upOnly', 'upAndDown', 'site'] as const

describe('known outcomes of the demo brakes', () => {
  describe.each(KNOWN_PLANS)('$name', ({ section, outcome }) => {
    test.each(brakes)('on %s: never dearer than with every test made', (key) => {
      const asked = request(section, anyHemOrder(DEMO_BRAKE[key]))
      const plan = planBends(asked)
      const found =
        plan.cost && ([plan.cost.handling, plan.cost.wideFront, plan.cost.faceGauge] as const)
      // Fewer tests only ever allow more: what bends under all of them bends under the first ones.
      const known = outcome[key]
      if (known !== 'no') {
        expect(plan.feasible).toBe(true)
        expect(found !== null && isCheaper(known, found)).toBe(false)
      }
      expect(plan.proven).toBe(true)
      expect(found).toEqual(forwardSearch(asked) ?? null)
      if (plan.feasible) expect(replayPlan(plan, asked)).toEqual({ problems: [], cost: plan.cost })
    })
  })

  // Sections whose cheapest sequence meets no tool: the first tests alone decide them.
  test.each([
    ['gable', 'upOnly'],
    ['gable', 'upAndDown'],
    ['gable', 'site'],
    ['box eave', 'upAndDown'],
    ['ridge, kicked', 'site'],
    ['Z closure', 'upAndDown'],
  ] as const)('%s on %s costs exactly what is known', (name, key) => {
    const known = KNOWN_PLANS.find((each) => each.name === name)
    if (known === undefined) throw new Error(`No known plan ${name}`)
    const plan = planBends(request(known.section, anyHemOrder(DEMO_BRAKE[key])))
    const [handling, wideFront, faceGauge] = known.outcome[key]
    expect(plan.cost).toEqual({ handling, wideFront, faceGauge })
  })
})
