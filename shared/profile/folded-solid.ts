import type { Vector } from '#shared/geometry/vector'
import { add, heading, leftOf, ORIGIN, scale, subtract } from '#shared/geometry/vector'
import type { FlatParts, FlatRun } from '#shared/strip/flat-parts'
import type { Degrees } from '#shared/units/brands'

/** A convex piece of the folded sheet in the plane of the section, and the run it belongs to. */
export interface SolidPiece {
  readonly run: FlatRun['of']
  readonly corners: readonly Vector[]
  readonly low: Vector
  readonly high: Vector
}

/** Bend zones are cut into wedges of at most this many degrees; their outer chords lie inside the true arc. */
const WEDGE: Degrees = 30

const solidPiece = (run: FlatRun['of'], corners: readonly Vector[]): SolidPiece => {
  const xs = corners.map((corner) => corner.x)
  const ys = corners.map((corner) => corner.y)
  return {
    run,
    corners,
    low: { x: Math.min(...xs), y: Math.min(...ys) },
    high: { x: Math.max(...xs), y: Math.max(...ys) },
  }
}

/**
 * The folded sheet with its true thickness and round bends as convex pieces, from edge A to edge
 * B: a rectangle for each run, wedges for each bend zone. Edge A's middle lies at the origin and
 * the first run goes along +x. Inches.
 */
export const foldedSolid = ({ runs, folds }: FlatParts): SolidPiece[] => {
  const pieces: SolidPiece[] = []
  const half = (folds[0]?.thickness ?? 0) / 2
  let at = ORIGIN
  let direction: Degrees = 0
  runs.forEach((run, index) => {
    const along = heading(direction)
    const side = scale(leftOf(along), half)
    const end = add(at, scale(along, run.straight))
    if (run.straight > 0) {
      pieces.push(
        solidPiece(run.of, [
          subtract(at, side),
          subtract(end, side),
          add(end, side),
          add(at, side),
        ]),
      )
    }
    at = end
    const fold = folds[index]
    if (!fold) return
    const sign = fold.turn < 0 ? -1 : 1
    const center = add(at, scale(leftOf(along), sign * (fold.insideRadius + half)))
    // From the center of the bend back to the sheet, at a part of the turn.
    const spoke = (turned: Degrees) => scale(leftOf(heading(direction + turned)), -sign)
    const count = Math.max(1, Math.ceil(Math.abs(fold.turn) / WEDGE))
    for (let wedge = 0; wedge < count; wedge += 1) {
      const from = spoke((fold.turn * wedge) / count)
      const to = spoke((fold.turn * (wedge + 1)) / count)
      const outside = fold.insideRadius + fold.thickness
      pieces.push(
        solidPiece(run.of, [
          add(center, scale(from, fold.insideRadius)),
          add(center, scale(from, outside)),
          add(center, scale(to, outside)),
          add(center, scale(to, fold.insideRadius)),
        ]),
      )
    }
    at = add(center, scale(spoke(fold.turn), fold.insideRadius + half))
    direction += fold.turn
  })
  return pieces
}
