import type { Vector } from '#shared/geometry/vector'
import { dot, leftOf, lengthOf, scale, subtract } from '#shared/geometry/vector'
import type { SolidPiece } from '#shared/profile/folded-solid'
import { foldedSolid } from '#shared/profile/folded-solid'
import type { FlatParts, FlatRun } from '#shared/strip/flat-parts'

/**
 * Sheets that only touch are not crossing: a closed hem lies flat on its leg. A millionth of an
 * inch is far above the rounding of the walk and far below any thickness.
 */
const TOUCH = 1e-6

const boxesMeet = (a: SolidPiece, b: SolidPiece): boolean =>
  a.low.x < b.high.x && b.low.x < a.high.x && a.low.y < b.high.y && b.low.y < a.high.y

const depthAlong = (axis: Vector, a: readonly Vector[], b: readonly Vector[]): number => {
  let lowA = Infinity
  let highA = -Infinity
  let lowB = Infinity
  let highB = -Infinity
  for (const corner of a) {
    const place = dot(axis, corner)
    lowA = Math.min(lowA, place)
    highA = Math.max(highA, place)
  }
  for (const corner of b) {
    const place = dot(axis, corner)
    lowB = Math.min(lowB, place)
    highB = Math.max(highB, place)
  }
  return Math.min(highA, highB) - Math.max(lowA, lowB)
}

/** True when no side of `a` has all of `b` beyond it. */
const noSideParts = (a: readonly Vector[], b: readonly Vector[]): boolean =>
  a.every((corner, index) => {
    const side = subtract(a[(index + 1) % a.length] ?? corner, corner)
    const length = lengthOf(side)
    // A wedge of a bend without radius has a side of no length; it cannot part anything.
    if (length < TOUCH) return true
    return depthAlong(scale(leftOf(side), 1 / length), a, b) > TOUCH
  })

/** Two convex pieces share more than a touch (separating axes). */
const piecesOverlap = (a: SolidPiece, b: SolidPiece): boolean =>
  boxesMeet(a, b) && noSideParts(a.corners, b.corners) && noSideParts(b.corners, a.corners)

/**
 * The first two runs whose metal would have to be in the same place once folded, walking from
 * edge A, or null. The whole thickness counts, hems and round bends included; lying flat against
 * one another is allowed. Every run's straight part must be zero or more.
 */
export const findCrossing = (parts: FlatParts): readonly [FlatRun['of'], FlatRun['of']] | null => {
  const pieces = foldedSolid(parts)
  for (const [index, later] of pieces.entries()) {
    for (let before = 0; before < index; before += 1) {
      const earlier = pieces[before]
      if (earlier && piecesOverlap(earlier, later)) return [earlier.run, later.run]
    }
  }
  return null
}
