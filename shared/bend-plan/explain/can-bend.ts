import { hopelessReasons, pieceReasons } from '../plan-reasons'
import type { PlanRequest } from '../plan-request'
import { searchGroundOf } from '../search-ground-of'
import { searchSets } from '../set-search'

/**
 * Whether the planner bends this request, by the same tests and the same search over made sets, without
 * the search for the cheapest order. False also where the limit on folds (`limits.nodes`) comes first.
 */
export const canBend = (request: PlanRequest): boolean => {
  if (pieceReasons(request).length > 0) return false
  const ground = searchGroundOf(request)
  return hopelessReasons(ground).length === 0 && searchSets(ground).outcome === 'found'
}
