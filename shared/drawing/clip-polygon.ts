import type { Bounds } from '#shared/geometry/bounds'
import { segmentsOf } from '#shared/geometry/polyline'
import type { Segment } from '#shared/geometry/segment'
import { clipToBox } from '#shared/geometry/segment'
import type { Vector } from '#shared/geometry/vector'
import { between } from '#shared/geometry/vector'

/** Positive inside one border of a box. */
type Border = (point: Vector) => number

const bordersOf = (box: Bounds): Border[] => [
  (point) => point.x - box.minX,
  (point) => box.maxX - point.x,
  (point) => point.y - box.minY,
  (point) => box.maxY - point.y,
]

/** The part of a polygon inside a box (Sutherland and Hodgman 1974); empty when none of it is. */
export const clipPolygon = (polygon: readonly Vector[], box: Bounds): Vector[] =>
  bordersOf(box).reduce<Vector[]>(
    (points, depth) =>
      segmentsOf(points, true).flatMap(({ from, to }) => {
        const a = depth(from)
        const b = depth(to)
        const kept = b >= 0 ? [to] : []
        return a >= 0 === b >= 0 ? kept : [between(from, to, a / (a - b)), ...kept]
      }),
    [...polygon],
  )

/** The polygon's own sides inside the box, without the cuts along the box. */
export const clipSides = (polygon: readonly Vector[], box: Bounds): Segment[] =>
  segmentsOf(polygon, true).flatMap((side) => clipToBox(side, box) ?? [])
