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

/**
 * The polygon's border inside the box as open chains, without the cuts along the box; one closed
 * chain (its first point again at the end) where all of it lies inside.
 */
export const clipBorder = (polygon: readonly Vector[], box: Bounds): Vector[][] => {
  const chains: Vector[][] = []
  for (const { from, to } of clipSides(polygon, box)) {
    const chain = chains.at(-1)
    const end = chain?.at(-1)
    if (chain && end && isSamePlace(end, from)) chain.push(to)
    else chains.push([from, to])
  }
  const first = chains[0]
  const last = chains.at(-1)
  const [begin, end] = [first?.[0], last?.at(-1)]
  // The chain that the first corner lies on was begun in its middle.
  if (first && last && first !== last && begin && end && isSamePlace(end, begin)) {
    chains.pop()
    chains[0] = [...last, ...first.slice(1)]
  }
  return chains
}

const isSamePlace = (a: Vector, b: Vector): boolean => Math.hypot(a.x - b.x, a.y - b.y) < 1e-6

/** Slanting lines across a polygon, as far as they lie inside: `step` apart, rising to the right (y down). */
export const hatchPolygon = (polygon: readonly Vector[], step: number): Segment[] => {
  const sides = segmentsOf(polygon, true)
  const rises = polygon.map(({ x, y }) => x + y)
  const lines: Segment[] = []
  const last = Math.max(...rises)
  for (let rise = Math.ceil(Math.min(...rises) / step) * step; rise < last; rise += step) {
    // The line x + y = rise; where it passes a side, by x.
    const places = sides
      .flatMap(({ from, to }) => {
        const a = from.x + from.y - rise
        const b = to.x + to.y - rise
        return a > 0 === b > 0 ? [] : from.x + ((to.x - from.x) * a) / (a - b)
      })
      .sort((a, b) => a - b)
    for (let index = 0; index + 1 < places.length; index += 2) {
      const [from, to] = places.slice(index, index + 2)
      if (from === undefined || to === undefined || to - from < 0.5) continue
      lines.push({ from: { x: from, y: rise - from }, to: { x: to, y: rise - to } })
    }
  }
  return lines
}
