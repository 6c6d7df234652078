import { describe, expect, it } from 'vitest'
import { findCheapestPlan } from '#server/planning/cheapest-plan'
import type { Plan, PlanCost } from '#shared/bend-plan/plan.schema'
import type { BrakePlan } from '#shared/plans/plans.contract'

const plan = (name: string, cost: PlanCost | null): BrakePlan => ({
  brakeId: name,
  brakeName: name,
  plan: {
    feasible: cost !== null,
    proven: true,
    cost,
    lowerBound: cost,
    steps: [],
    seconds: null,
    section: { legs: [1], turns: [], hemA: null, hemB: null },
    reasons: [],
    cures: [],
    checks: [],
  } satisfies Plan,
})

const cost = (handling: number, wideFront: number, faceGauge: number): PlanCost => ({
  handling,
  wideFront,
  faceGauge,
})

describe('The brake a line is released to', () => {
  it('is the one with the least handling, whatever its later figures are', () => {
    const plans = [plan('first', cost(4, 0, 0)), plan('second', cost(2, 9, 9))]
    expect(findCheapestPlan(plans)?.brakeName).toBe('second')
  })

  it('is settled by the hits with the wide part in front where handling is equal', () => {
    const plans = [plan('first', cost(2, 3, 0)), plan('second', cost(2, 1, 5))]
    expect(findCheapestPlan(plans)?.brakeName).toBe('second')
  })

  it('is settled by the gauging on formed faces where the rest is equal', () => {
    const plans = [plan('first', cost(2, 1, 2)), plan('second', cost(2, 1, 1))]
    expect(findCheapestPlan(plans)?.brakeName).toBe('second')
  })

  it("is the first in the shop's order where all is equal", () => {
    const plans = [plan('first', cost(2, 1, 1)), plan('second', cost(2, 1, 1))]
    expect(findCheapestPlan(plans)?.brakeName).toBe('first')
  })

  it('is never one that cannot bend it', () => {
    expect(findCheapestPlan([plan('first', null), plan('second', cost(9, 9, 9))])?.brakeName).toBe(
      'second',
    )
    expect(findCheapestPlan([plan('first', null)])).toBeUndefined()
  })
})
