import { isAtMost } from '#shared/geometry/tolerance'
import { findCapacity } from './capacity'
import { findBlockedFold, setupOf } from './explain/blocked-fold'
import type { BlockedFold, BlockedGround } from './explain/blocked-fold'
import { contactOf } from './explain/contact'
import { nearestDeadEnd } from './explain/dead-ends'
import { frontSide, getOrientation, rearSide } from './orientation'
import type { PlanReason, ReasonCode } from './plan.schema'
import type { PlanRequest } from './plan-request'

/** A reason that no single fold gives. */
export const pieceReason = (
  code: ReasonCode,
  found: number | null = null,
  limit: number | null = null,
): PlanReason => ({ code, bend: null, found, limit, overlap: null, edge: null, contact: null })

/** What rules the whole piece out on this brake before any fold is looked at. */
export const pieceReasons = ({ brake, sheet, pieceLength }: PlanRequest): PlanReason[] => {
  const reasons: PlanReason[] = []
  if (!isAtMost(pieceLength, brake.length)) {
    reasons.push(pieceReason('length', pieceLength, brake.length))
  }
  const capacity = findCapacity(brake, sheet.metal)
  if (capacity === null) reasons.push(pieceReason('metal'))
  else if (capacity !== undefined && !isAtMost(sheet.thickness, capacity)) {
    reasons.push(pieceReason('thickness', sheet.thickness, capacity))
  }
  return reasons
}

/** The edge on the side that is too short or in the way. */
const edgeOf = ({ failure, orientation, overlap }: BlockedFold): PlanReason['edge'] => {
  const o = getOrientation(orientation)
  if (overlap !== null) return overlap.place === 'front' ? frontSide(o) : rearSide(o)
  if (failure.check === 'flange') return frontSide(o)
  return failure.check === 'clamp' ? rearSide(o) : null
}

const asReason = (ground: BlockedGround, fold: BlockedFold, explain: boolean): PlanReason => {
  const { bend, failure, overlap } = fold
  return {
    code: failure.check,
    bend: bend.fold,
    found: failure.found,
    limit: failure.limit,
    overlap: overlap?.length ?? null,
    edge: edgeOf(fold),
    contact: explain ? contactOf(setupOf(ground, fold), failure.check) : null,
  }
}

/** Bends that fail on the flat sheet in a way that no bend made before could mend: no order exists. */
export const hopelessReasons = (ground: BlockedGround): PlanReason[] =>
  ground.piece.bends.flatMap((bend) => {
    const fold = findBlockedFold(ground, 0, bend, null, (test) => test.neverEases)
    return fold === undefined ? [] : [asReason(ground, fold, false)]
  })

/**
 * Bends that cannot be made even with nothing but the hems done before them, each with its reason.
 * `explain` looks for overlaps and contacts too.
 */
export const flatSheetReasons = (ground: BlockedGround, explain: boolean): PlanReason[] => {
  const { bends } = ground.piece
  const overlaps = explain ? { below: Infinity } : null
  const hems = bends.reduce((set, bend) => (bend.hem === null ? set : set | (1 << bend.index)), 0)
  return bends.flatMap((bend) => {
    const onFlat = findBlockedFold(ground, 0, bend, overlaps)
    // Where hems go first, a plain bend's flat sheet has its hems.
    const fold =
      onFlat === undefined || bend.hem !== null || hems === 0
        ? onFlat
        : findBlockedFold(ground, hems, bend, overlaps)
    return fold === undefined ? [] : [asReason(ground, fold, explain)]
  })
}

/** The last bends that a dead end does not allow. */
const blockedLastBends = (ground: BlockedGround, deadEnd: number): BlockedFold[] =>
  ground.piece.bends.flatMap((bend) => {
    const bit = 1 << bend.index
    if ((deadEnd & bit) === 0) return []
    return findBlockedFold(ground, deadEnd & ~bit, bend, null) ?? []
  })

/**
 * No order works: the blocked folds of a dead end, each with its reason. With `explain` of the dead end
 * that comes nearest to bending, least overlap first; else of the one that the search came upon.
 */
export const deadEndReasons = (
  ground: BlockedGround,
  deadEnd: number,
  explain: boolean,
): PlanReason[] => {
  const folds = explain ? nearestDeadEnd(ground) : blockedLastBends(ground, deadEnd)
  return [pieceReason('noOrder'), ...folds.map((fold) => asReason(ground, fold, explain))]
}
