import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Plan } from '#shared/bend-plan/plan.schema'
import { planBends } from '#shared/bend-plan/planner'
import { SEEDS, wildBrake, wildRequest } from '../../support/bend-plan-cases'
import { bruteForce, forwardSearch } from '../../support/planner-opinions'

const costOf = ({ cost }: Plan) => cost && [cost.handling, cost.wideFront, cost.faceGauge]

describe.each(SEEDS)('the planner agrees with other opinions ($name seed $seed)', ({ seed }) => {
  test('backward equals forward equals brute force to four bends', () => {
    let feasible = 0
    let infeasible = 0
    fc.assert(
      fc.property(wildRequest(4), (request) => {
        const plan = planBends(request)
        const brute = bruteForce(request) ?? null
        expect(plan.proven).toBe(true)
        expect(costOf(plan)).toEqual(brute)
        expect(forwardSearch(request) ?? null).toEqual(brute)
        if (brute === null) infeasible++
        else feasible++
      }),
      { seed, numRuns: 1000 },
    )
    // The cases must be of both kinds, or the agreement says little.
    expect(Math.min(feasible, infeasible)).toBeGreaterThan(100)
  })

  test('backward equals forward to eight bends', () => {
    fc.assert(
      fc.property(wildRequest(8, 3), (request) => {
        expect(costOf(planBends(request))).toEqual(forwardSearch(request) ?? null)
      }),
      { seed, numRuns: 500 },
    )
  })

  test('backward equals forward on brakes of all sorts', () => {
    let feasible = 0
    fc.assert(
      fc.property(wildRequest(6, 1, wildBrake), (request) => {
        const forward = forwardSearch(request) ?? null
        expect(costOf(planBends(request))).toEqual(forward)
        if (forward !== null) feasible++
      }),
      { seed, numRuns: 600 },
    )
    expect(feasible).toBeGreaterThan(40)
  })
})
