import { flattenArc } from '#shared/geometry/arc'
import type { Bounds } from '#shared/geometry/bounds'
import { contains, grow } from '#shared/geometry/bounds'
import { distanceToPath, pointAlong } from '#shared/geometry/polyline'
import type { Vector } from '#shared/geometry/vector'
import { add, degrees, heading, scale } from '#shared/geometry/vector'
import type { DisplayItem, Point } from './display-list'
import type { Pen } from './pen'
import { halfWeight } from './pen'
import { path } from './strip-items'

interface ArrowView {
  readonly frame: Bounds
  readonly place: (point: Vector) => Point
}

/** Points of the front that the arrow may follow, in parts of its length from the bend line. */
const FOLLOWED = [0.5, 0.65, 0.8, 1, 0.35, 0.25]

/** Degrees left free at either end of the swing. */
const GAP = 5

const arcPoints = (radius: number, from: number, to: number): Vector[] =>
  flattenArc({ center: { x: 0, y: 0 }, radius, start: from, sweep: to - from }, 4, radius)

/**
 * The arrow from the front as it is to the front as it will be, about the bend line, in pixels
 * with y up. Of several radii it takes the one that stays clearest of both.
 */
export const swingArrow = (
  before: readonly Vector[],
  after: readonly Vector[],
  direction: 'up' | 'down',
  pen: Pen,
  { frame, place }: ArrowView,
): DisplayItem[] => {
  const first = after[1]
  if (first === undefined) return []
  const sign = direction === 'up' ? 1 : -1
  const angle = Math.abs(degrees(Math.atan2(first.y, first.x)))
  if (angle < 4 * GAP) return []
  const head = Math.max(7, pen.metal * 2.2)
  const keep = halfWeight(pen) + 3
  const inside = grow(frame, -4)
  const options = FOLLOWED.map((share) => {
    const followed = pointAlong(before, share)
    const radius = Math.max(Math.hypot(followed.x, followed.y), 4 * head)
    const from = degrees(Math.atan2(followed.y, followed.x))
    const tipGap = degrees((head + keep) / radius)
    const swing = sign * Math.max(angle - tipGap, 2 * GAP)
    const points = arcPoints(radius, from + sign * GAP, from + swing)
    const touched = points.filter(
      (point) =>
        distanceToPath(after, point) < keep ||
        distanceToPath(before, point) < keep ||
        !contains(inside, place(point)),
    ).length
    return { points, touched: touched / points.length }
  })
  const best = options.reduce((a, b) => (b.touched < a.touched - 0.02 ? b : a))
  const end = best.points.at(-1)
  if (end === undefined) return []
  const out = degrees(Math.atan2(end.y, end.x))
  const along = scale(heading(out + 90 * sign), head * 1.5)
  const aside = scale(heading(out), head * 0.7)
  const tip = [add(end, along), add(end, aside), add(end, scale(aside, -1))]
  return [
    path('selected', best.points.map(place), Math.max(2, pen.metal * 0.6)),
    { ...path('selected', tip.map(place), 0), closed: true, filled: true },
  ]
}
