import type { Segment } from './segment'
import { distanceToPoint, segment } from './segment'
import type { Vector } from './vector'
import { add, between, cross, distance, scale, vector } from './vector'

export const segmentsOf = (points: readonly Vector[], closed = false): Segment[] => {
  const segments: Segment[] = []
  points.forEach((point, index) => {
    const next = points[index + 1] ?? (closed ? points[0] : undefined)
    if (next !== undefined) segments.push(segment(point, next))
  })
  return segments
}

export const pathLength = (points: readonly Vector[]): number =>
  segmentsOf(points).reduce((sum, s) => sum + distance(s.from, s.to), 0)

/** The point a part (0 to 1) of the way along a chain. Throws a RangeError on an empty chain. */
export const pointAlong = (points: readonly Vector[], part: number): Vector => {
  let left = pathLength(points) * part
  for (const { from, to } of segmentsOf(points)) {
    const length = distance(from, to)
    if (left <= length && length > 0) return between(from, to, left / length)
    left -= length
  }
  const last = points.at(-1)
  if (last === undefined) throw new RangeError('A chain without points has no point along it.')
  return last
}

/** Signed area of a closed chain: positive when it runs counter-clockwise. */
export const areaOf = (polygon: readonly Vector[]): number =>
  segmentsOf(polygon, true).reduce((sum, s) => sum + cross(s.from, s.to), 0) / 2

/** Centroid of the area of a closed chain that does not cross itself. */
export const centroidOf = (polygon: readonly Vector[]): Vector => {
  const area = areaOf(polygon)
  if (area === 0) throw new RangeError('A polygon without area has no centroid.')
  const sum = segmentsOf(polygon, true).reduce(
    (total, s) => add(total, scale(add(s.from, s.to), cross(s.from, s.to))),
    vector(0, 0),
  )
  return scale(sum, 1 / (6 * area))
}

/** Infinity for a chain without segments. */
export const distanceToPath = (points: readonly Vector[], point: Vector): number =>
  Math.min(Infinity, ...segmentsOf(points).map((s) => distanceToPoint(s, point)))

/** Without the points that repeat the one before them. */
export const withoutRepeats = (points: readonly Vector[], tolerance = 1e-12): Vector[] => {
  const kept: Vector[] = []
  for (const point of points) {
    const last = kept.at(-1)
    // Most points differ along an axis already, which is sooner known than their distance.
    const isApart =
      last === undefined ||
      Math.abs(last.x - point.x) > tolerance ||
      Math.abs(last.y - point.y) > tolerance ||
      distance(last, point) > tolerance
    if (isApart) kept.push(point)
  }
  return kept
}
