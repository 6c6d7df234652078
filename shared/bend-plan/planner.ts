import { firstOfEquals } from './first-of-equals'
import { FOLD_TESTS } from './fold-tests/fold-tests'
import { orientOrder } from './orient-order'
import { unpackCost } from './packed-cost'
import type { Plan, PlanReason } from './plan.schema'
import {
  deadEndReasons,
  flatSheetReasons,
  hopelessReasons,
  pieceReason,
  pieceReasons,
} from './plan-reasons'
import type { PlanRequest } from './plan-request'
import { planSteps } from './plan-steps'
import { searchGroundOf } from './search-ground-of'
import { searchSequence } from './sequence-search'
import { searchSets } from './set-search'
import { secondsOf } from './step-seconds'

export type { PlanRequest } from './plan-request'

/**
 * The cheapest order and orientation in which the section bends on the brake, or the reasons why
 * there is none. Exact under the tests named in `checks`: `proven` says that no cheaper sequence (or,
 * if infeasible, no sequence at all) exists. At the limit on nodes the best so far comes back with
 * `proven: false` and the lower bound; with none found, `feasible: false` and the reason `limit`.
 * The same request gives the same answer to the byte. Cures are for `planProfile` and `planSection`.
 *
 * Throws RangeError where turns and legs of the section do not match or there are too many bends.
 */
export const planBends = (request: PlanRequest): Plan => {
  const { section, explain = false } = request
  const checks = FOLD_TESTS.map((test) => test.check)
  const infeasible = (reasons: PlanReason[]): Plan => ({
    feasible: false,
    proven: true,
    cost: null,
    lowerBound: null,
    steps: [],
    seconds: null,
    section,
    reasons,
    cures: [],
    checks,
  })

  const ground = searchGroundOf(request)
  const whole = pieceReasons(request)
  if (whole.length > 0) return infeasible(whole)
  const hopeless = hopelessReasons(ground)
  if (hopeless.length > 0) return infeasible(hopeless)

  const sets = searchSets(ground)
  if (sets.outcome === 'none') {
    const flat = flatSheetReasons(ground, explain)
    return infeasible(flat.length > 0 ? flat : deadEndReasons(ground, sets.deadEnd, explain))
  }
  if (sets.outcome === 'limit') {
    return { ...infeasible([pieceReason('limit', null, ground.nodes)]), proven: false }
  }

  const known = orientOrder(ground, sets.order)
  if (known === undefined) throw new Error('An order that was found bendable has no orientations.')
  const search = searchSequence(ground, known)
  const { best, findRest } = search
  const chosen =
    findRest === null ? best : firstOfEquals(ground, best, findRest, request.paintedSide)
  const steps = planSteps(ground, chosen.operations)
  return {
    feasible: true,
    proven: search.proven,
    cost: unpackCost(chosen.cost),
    lowerBound: unpackCost(search.lowerBound),
    steps,
    seconds: secondsOf(steps),
    section,
    reasons: [],
    cures: [],
    checks,
  }
}
