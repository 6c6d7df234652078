import type { FailedCheck, Feasibility } from '../feasibility'
import { foldSetup } from '../fold-setup'
import type { FoldGround, FoldSetup } from '../fold-setup'
import type { FoldTest } from '../fold-tests/fold-test'
import { FOLD_TESTS } from '../fold-tests/fold-tests'
import { ORIENTATIONS, getOrientation } from '../orientation'
import type { PieceBend } from '../workpiece'
import { findOverlap } from './overlap'
import type { Overlap } from './overlap'

/** A fold that no orientation allows, in the orientation that comes nearest. */
export interface BlockedFold {
  readonly bend: PieceBend
  /** Bends made before, as bits. */
  readonly made: number
  readonly orientation: number
  readonly failure: FailedCheck
  /** Null where less length would not help, or none was asked for. */
  readonly overlap: Overlap | null
}

export type BlockedGround = FoldGround & { readonly feasibility: Feasibility }

export const setupOf = (ground: FoldGround, fold: BlockedFold): FoldSetup =>
  foldSetup(ground, fold.made, fold.bend, getOrientation(fold.orientation))

const rankOf = ({ failure }: BlockedFold): number =>
  FOLD_TESTS.findIndex((test) => test.check === failure.check)

const lengthOf = ({ overlap }: BlockedFold): number => overlap?.length ?? Infinity

/** Least overlap, then furthest through the tests; of equals the one looked at first. */
const isNearer = (a: BlockedFold, b: BlockedFold): boolean =>
  lengthOf(a) === lengthOf(b) ? rankOf(a) > rankOf(b) : lengthOf(a) < lengthOf(b)

/**
 * Undefined where the fold may be made in some orientation. Otherwise the orientation with the least
 * overlap if `overlaps` asks for it (those of at least `below` inches are left out), and of equals or
 * without overlaps the one that fails latest in the order of the tests.
 */
export const findBlockedFold = (
  ground: BlockedGround,
  made: number,
  bend: PieceBend,
  overlaps: { readonly below: number } | null,
  among?: (test: FoldTest) => boolean,
): BlockedFold | undefined => {
  let nearest: BlockedFold | undefined
  for (const [orientation, o] of ORIENTATIONS.entries()) {
    const failure = ground.feasibility.firstFailure(made, bend, orientation, among)
    if (failure === undefined) return undefined
    const below = Math.min(overlaps?.below ?? 0, nearest?.overlap?.length ?? Infinity)
    const overlap =
      overlaps === null ? null : findOverlap(foldSetup(ground, made, bend, o), failure.check, below)
    const fold = { bend, made, orientation, failure, overlap }
    if (nearest === undefined || isNearer(fold, nearest)) nearest = fold
  }
  return nearest
}
