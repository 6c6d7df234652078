import type { Bounds } from '#shared/geometry/bounds'
import { segmentsOf } from '#shared/geometry/polyline'
import type { Segment } from '#shared/geometry/segment'
import { clipToBox } from '#shared/geometry/segment'
import type { Vector } from '#shared/geometry/vector'
import { between } from '#shared/geometry/vector'

/** What lies on the positive side of a border, given by how deep a point lies inside it. */
const clipAtBorder = (
  polygon: readonly Vector[],
  depth: (point: Vector) => number,
): readonly Vector[] => {
  const kept: Vector[] = []
  let from = polygon.at(-1)
  let a = from === undefined ? 0 : depth(from)
  for (const to of polygon) {
    const b = depth(to)
    if (from !== undefined && a >= 0 !== b >= 0) kept.push(between(from, to, a / (a - b)))
    if (b >= 0) kept.push(to)
    from = to
    a = b
  }
  return kept
}

/** The part of a polygon inside a box (Sutherland and Hodgman 1974); empty when none of it is. */
export const clipPolygon = (polygon: readonly Vector[], box: Bounds): Vector[] => {
  let points = clipAtBorder(polygon, ({ x }) => x - box.minX)
  points = clipAtBorder(points, ({ x }) => box.maxX - x)
  points = clipAtBorder(points, ({ y }) => y - box.minY)
  return [...clipAtBorder(points, ({ y }) => box.maxY - y)]
}

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
  const lines: Segment[] = []
  let least = Infinity
  let last = -Infinity
  for (const { x, y } of polygon) {
    least = Math.min(least, x + y)
    last = Math.max(last, x + y)
  }
  for (let rise = Math.ceil(least / step) * step; rise < last; rise += step) {
    // Where the line x + y = rise passes the polygon's border, by x.
    const places: number[] = []
    let from = polygon.at(-1)
    for (const to of polygon) {
      const a = from === undefined ? 0 : from.x + from.y - rise
      const b = to.x + to.y - rise
      if (from !== undefined && a > 0 !== b > 0) {
        places.push(from.x + ((to.x - from.x) * a) / (a - b))
      }
      from = to
    }
    if (places.length > 2) places.sort((one, other) => one - other)
    for (let index = 0; index + 1 < places.length; index += 2) {
      const one = places[index] ?? 0
      const other = places[index + 1] ?? 0
      const minX = Math.min(one, other)
      const maxX = Math.max(one, other)
      if (maxX - minX < 0.5) continue
      lines.push({ from: { x: minX, y: rise - minX }, to: { x: maxX, y: rise - maxX } })
    }
  }
  return lines
}
