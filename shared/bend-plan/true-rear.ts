import type { Vector } from '#shared/geometry/vector'
import { vector } from '#shared/geometry/vector'
import type { FlatFold, FlatParts } from '#shared/strip/flat-parts'
import { offsetChain, walkSection } from '#shared/strip/section-walk'
import type { FoldToWalk, RunToWalk } from '#shared/strip/section-walk'
import type { Fold } from '#shared/strip/strip.schema'
import type { Inches } from '#shared/units/brands'
import type { Side } from './workpiece'

/** Fine enough that chords stay within a hundred thousandth of an inch of any bend's arc. */
const FLATNESS = { maxStep: 1, tolerance: 1e-5 }

/** Runs and folds from a fold outwards to an edge. */
const outwards = ({ runs, folds }: FlatParts, at: number, side: Side) =>
  side === 'B'
    ? { runs: runs.slice(at + 1), folds: folds.slice(at + 1) }
    : { runs: runs.slice(0, at + 1).toReversed(), folds: folds.slice(0, at).toReversed() }

/**
 * The metal behind a fold with its true thickness and round bends, as a closed border. Inches: the
 * origin on the middle of the thickness where the fold's zone ends, x away from the fold, y up for a
 * fold up. Bends not made lie flat with their allowance.
 *
 * Throws RangeError where the profile has no such fold.
 */
export const trueRear = (
  parts: FlatParts,
  fold: Fold,
  side: Side,
  made: ReadonlySet<Fold>,
  thickness: Inches,
): readonly Vector[] => {
  const at = parts.folds.findIndex((each) => each.fold === fold)
  const own = parts.folds[at]
  if (own === undefined) throw new RangeError(`The profile has no fold ${fold}.`)
  const behind = outwards(parts, at, side)
  const runs: RunToWalk[] = []
  const folds: FoldToWalk[] = []
  let straight = 0
  const endRun = () => {
    runs.push({ of: runs.length + 1, straight })
    straight = 0
  }
  const bent = ({ insideRadius, ...each }: FlatFold): FoldToWalk => ({
    fold: each.fold,
    // Of the same sign as this fold, it turns the same way: up.
    turn: each.turn * Math.sign(own.turn),
    radius: insideRadius + thickness / 2,
  })
  behind.runs.forEach((run, i) => {
    straight += run.straight
    const next = behind.folds[i]
    if (next === undefined) endRun()
    else if (made.has(next.fold)) {
      endRun()
      folds.push(bent(next))
    } else straight += next.allowance
  })
  const walked = walkSection(runs, folds, vector(0, 0))
  return [
    ...offsetChain(walked, thickness / 2, FLATNESS),
    ...offsetChain(walked, thickness / -2, FLATNESS).toReversed(),
  ]
}
