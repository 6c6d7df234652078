import fc from 'fast-check'
import { describe, expect, test, vi } from 'vitest'
import type { Plan } from '#shared/bend-plan/plan.schema'
import { planBends } from '#shared/bend-plan/planner'
import { CASES, requestArbitrary } from '../../support/bend-plan-cases'
import { bruteForce, forwardSearch } from '../../support/planner-opinions'

const costOf = ({ cost }: Plan) => cost && [cost.handling, cost.wideFront, cost.faceGauge]

// Hundreds of plans in one test: a busy machine needs longer than the usual five seconds.
vi.setConfig({ testTimeout: 60_000 })

describe('the planner agrees with other opinions', () => {
  test('backward equals forward equals brute force to four bends', () => {
    let feasible = 0
    let infeasible = 0
    fc.assert(
      fc.property(requestArbitrary(4), (request) => {
        const plan = planBends(request)
        const brute = bruteForce(request) ?? null
        expect(plan.proven).toBe(true)
        expect(costOf(plan)).toEqual(brute)
        expect(forwardSearch(request) ?? null).toEqual(brute)
        if (brute === null) infeasible++
        else feasible++
      }),
      { ...CASES, numRuns: 400 },
    )
    // The cases must be of both kinds, or the agreement says little.
    expect(feasible).toBeGreaterThan(80)
    expect(infeasible).toBeGreaterThan(20)
  })

  test('backward equals forward to eight bends', () => {
    fc.assert(
      fc.property(requestArbitrary(8), (request) => {
        expect(costOf(planBends(request))).toEqual(forwardSearch(request) ?? null)
      }),
      { ...CASES, numRuns: 60 },
    )
  })
})
