import { createFeasibility } from './feasibility'
import { foldGroundOf } from './fold-setup'
import { createLowerBound } from './lower-bound'
import { operationCost } from './operation-cost'
import type { PlanRequest } from './plan-request'
import type { SearchGround } from './search-ground'

/** Enough for panels of twenty bends; a search that reaches it answers with the best so far. */
const DEFAULT_NODES = 100_000

/**
 * The bound is built when the search for the cheapest order first asks: most pieces that cannot be bent
 * never come so far.
 *
 * Throws RangeError where turns and legs of the section do not match or there are too many bends.
 */
export const searchGroundOf = (request: PlanRequest): SearchGround => {
  const { section, sheet, brake, pieceLength, limits } = request
  const ground = foldGroundOf(section, sheet, brake)
  const cost = operationCost(ground, pieceLength)
  let lowerBound: SearchGround['lowerBound'] | undefined
  return {
    ...ground,
    cost,
    feasibility: createFeasibility(ground),
    get lowerBound() {
      return (lowerBound ??= createLowerBound(ground, cost))
    },
    nodes: limits?.nodes ?? DEFAULT_NODES,
    isOver: limits?.isOver ?? (() => false),
  }
}
