import type { Arc } from './arc'
import { flattenArc } from './arc'
import { withoutRepeats } from './polyline'
import { findMeeting } from './segment'
import type { Vector } from './vector'
import { add, cross, degrees, distance, dot, leftOf, scale, subtract } from './vector'

const unitBetween = (from: Vector, to: Vector): Vector => {
  const length = distance(from, to)
  return length === 0 ? { x: 1, y: 0 } : scale(subtract(to, from), 1 / length)
}

/** Signed turn in degrees from one direction to another; positive to the left (y up). */
const turnBetween = (before: Vector, after: Vector): number =>
  degrees(Math.atan2(cross(before, after), dot(before, after)))

/** The chain moved to its left (negative: right) with sharp corners, one point for each point. */
export const offsetCorners = (points: readonly Vector[], left: number): Vector[] =>
  points.map((point, index) => {
    const previous = points[index - 1]
    const next = points[index + 1]
    const before = previous && unitBetween(previous, point)
    const after = next && unitBetween(point, next)
    const along = before ?? after
    if (along === undefined) return point
    const moved = add(point, scale(leftOf(along), left))
    if (before === undefined || after === undefined) return moved
    const other = add(point, scale(leftOf(after), left))
    return findMeeting(moved, before, other, after) ?? moved
  })

/**
 * The chain with its corners rounded. `radius` is that of a chain in the middle; the corners of a
 * chain `left` beside it get the radius that keeps the arcs concentric. A corner takes at most half
 * of the shorter segment beside it.
 */
export const roundCorners = (points: readonly Vector[], radius: number, left = 0): Vector[] => {
  const rounded = points.flatMap((corner, index) => {
    const previous = points[index - 1]
    const next = points[index + 1]
    if (previous === undefined || next === undefined) return [corner]
    const before = unitBetween(previous, corner)
    const after = unitBetween(corner, next)
    const turn = turnBetween(before, after)
    const side = Math.sign(turn)
    const wanted = radius - left * side
    const tangent = Math.tan(((Math.abs(turn) / 2) * Math.PI) / 180)
    const room = Math.min(distance(previous, corner), distance(corner, next)) / 2
    const fitting = tangent === 0 ? 0 : Math.min(wanted, room / tangent)
    if (fitting <= 0 || Math.abs(turn) < 0.5) return [corner]
    const start = subtract(corner, scale(before, fitting * tangent))
    const arc: Arc = {
      center: add(start, scale(leftOf(before), side * fitting)),
      radius: fitting,
      start: degrees(Math.atan2(before.y, before.x)) - 90 * side,
      sweep: turn,
    }
    return flattenArc(arc, 12, fitting)
  })
  return withoutRepeats(rounded)
}
