import { isAtMost } from '#shared/geometry/tolerance'
import { findCapacity } from './capacity'
import type { FailedCheck, Feasibility } from './feasibility'
import type { FoldTest } from './fold-tests/fold-test'
import { FOLD_TESTS } from './fold-tests/fold-tests'
import { ORIENTATIONS } from './orientation'
import type { PlanReason } from './plan.schema'
import type { PlanRequest } from './plan-request'
import type { PieceBend, Workpiece } from './workpiece'

/** What rules the whole piece out on this brake before any fold is looked at. */
export const pieceReasons = ({ brake, sheet, pieceLength }: PlanRequest): PlanReason[] => {
  const reasons: PlanReason[] = []
  if (!isAtMost(pieceLength, brake.length)) {
    reasons.push({
      code: 'length',
      bend: null,
      found: pieceLength,
      limit: brake.length,
    })
  }
  const capacity = findCapacity(brake, sheet.metal)
  if (capacity === null) reasons.push({ code: 'metal', bend: null, found: null, limit: null })
  else if (capacity !== undefined && !isAtMost(sheet.thickness, capacity)) {
    reasons.push({
      code: 'thickness',
      bend: null,
      found: sheet.thickness,
      limit: capacity,
    })
  }
  return reasons
}

const rankOf = (failure: FailedCheck): number =>
  FOLD_TESTS.findIndex((test) => test.check === failure.check)

/** The failure that comes last in the order of the tests: the orientation that got furthest. */
const nearestFailure = (
  feasibility: Feasibility,
  made: number,
  bend: PieceBend,
  among?: (test: FoldTest) => boolean,
): FailedCheck | undefined => {
  let nearest: FailedCheck | undefined
  for (const orientation of ORIENTATIONS.keys()) {
    const failure = feasibility.firstFailure(made, bend, orientation, among)
    if (failure === undefined) return undefined
    if (nearest === undefined || rankOf(failure) > rankOf(nearest)) nearest = failure
  }
  return nearest
}

const asReason = (bend: PieceBend, { check, found, limit }: FailedCheck): PlanReason => ({
  code: check,
  bend: bend.fold,
  found,
  limit,
})

/** Bends that fail on the flat sheet in a way that no bend made before could mend: no order exists. */
export const hopelessReasons = (piece: Workpiece, feasibility: Feasibility): PlanReason[] => {
  return piece.bends.flatMap((bend) => {
    const failure = nearestFailure(feasibility, 0, bend, (test) => test.neverEases)
    return failure === undefined ? [] : [asReason(bend, failure)]
  })
}

/** Bends that cannot be made even with nothing but the hems done before them, each with its reason. */
export const flatSheetReasons = (piece: Workpiece, feasibility: Feasibility): PlanReason[] => {
  const hems = piece.bends.reduce(
    (set, bend) => (bend.hem === null ? set : set | (1 << bend.index)),
    0,
  )
  return piece.bends.flatMap((bend) => {
    const onFlat = nearestFailure(feasibility, 0, bend)
    if (onFlat === undefined || bend.hem !== null) return onFlat ? [asReason(bend, onFlat)] : []
    // Where hems go first, a plain bend's flat sheet has its hems.
    const onHems = hems === 0 ? onFlat : nearestFailure(feasibility, hems, bend)
    return onHems === undefined ? [] : [asReason(bend, onHems)]
  })
}

/** No order works: the blocked last bends of the dead end nearest to the flat sheet, each with its reason. */
export const deadEndReasons = (
  piece: Workpiece,
  feasibility: Feasibility,
  deadEnd: number,
): PlanReason[] => [
  { code: 'noOrder', bend: null, found: null, limit: null },
  ...piece.bends.flatMap((bend) => {
    const bit = 1 << bend.index
    if ((deadEnd & bit) === 0) return []
    const failure = nearestFailure(feasibility, deadEnd & ~bit, bend)
    return failure === undefined ? [] : [asReason(bend, failure)]
  }),
]
