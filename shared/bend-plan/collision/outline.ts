import { distance, vector } from '#shared/geometry/vector'
import type { Vector } from '#shared/geometry/vector'
import type { Inches } from '#shared/units/brands'
import { polarPoint, polarSide } from './polar'
import type { PolarPoint, PolarSide } from './polar'

/** One straight side of an outline. */
export interface OutlineSide {
  readonly a: Vector
  readonly b: Vector
}

export interface Box {
  readonly left: Inches
  readonly right: Inches
  readonly bottom: Inches
  readonly top: Inches
}

/** A tool (closed and solid) or a run of sheet (open, its centre line). */
export interface Outline {
  readonly points: readonly Vector[]
  readonly isSolid: boolean
  readonly sides: readonly OutlineSide[]
  readonly box: Box
  /** Points and sides seen from the bend line, worked out when a swing first asks. */
  readonly polar: {
    readonly points: readonly PolarPoint[]
    readonly sides: readonly PolarSide[]
  }
}

/** Throws RangeError where there are no two points. */
const outlineOf = (points: readonly Vector[], isSolid: boolean): Outline => {
  const [first] = points
  if (first === undefined || points.length < 2) {
    throw new RangeError(`An outline has two points or more, not ${points.length}.`)
  }
  const sides: OutlineSide[] = []
  let [left, right, bottom, top] = [first.x, first.x, first.y, first.y]
  let before = first
  for (const point of points) {
    if (point !== first) sides.push({ a: before, b: point })
    left = Math.min(left, point.x)
    right = Math.max(right, point.x)
    bottom = Math.min(bottom, point.y)
    top = Math.max(top, point.y)
    before = point
  }
  if (isSolid) sides.push({ a: before, b: first })
  let polar: Outline['polar'] | undefined
  return {
    points,
    isSolid,
    sides,
    box: { left, right, bottom, top },
    get polar() {
      return (polar ??= {
        points: points.map(polarPoint),
        sides: sides.map(polarSide),
      })
    },
  }
}

export const sheetOutline = (points: readonly Vector[]): Outline => outlineOf(points, false)

export const toolOutline = (points: readonly Vector[]): Outline => outlineOf(points, true)

export const movedOutline = (outline: Outline, dx: Inches, dy: Inches): Outline =>
  outlineOf(
    outline.points.map(({ x, y }) => vector(x + dx, y + dy)),
    outline.isSolid,
  )

/** Whether the boxes come nearer than a clearance, the first one moved by up to (dx, dy). */
export const boxesMeet = (a: Box, b: Box, clearance: Inches, dx = 0, dy = 0): boolean =>
  a.left + Math.min(0, dx) <= b.right + clearance &&
  a.right + Math.max(0, dx) >= b.left - clearance &&
  a.bottom + Math.min(0, dy) <= b.top + clearance &&
  a.top + Math.max(0, dy) >= b.bottom - clearance

/**
 * What is left of a run of points after its first inches are cut off; undefined when nothing is.
 */
export const cutStart = (
  points: readonly Vector[],
  length: Inches,
): readonly Vector[] | undefined => {
  let rest = length
  for (let i = 1; i < points.length; i++) {
    const [a, b] = [points[i - 1], points[i]]
    if (a === undefined || b === undefined) break
    const run = distance(a, b)
    if (rest < run) {
      const t = rest / run
      return [vector(a.x + (b.x - a.x) * t, a.y + (b.y - a.y) * t), ...points.slice(i)]
    }
    rest -= run
  }
  return undefined
}
