import type { Bounds } from './bounds'
import type { Vector } from './vector'
import { add, between, cross, dot, scale, subtract } from './vector'

export interface Segment {
  readonly from: Vector
  readonly to: Vector
}

export const segment = (from: Vector, to: Vector): Segment => ({ from, to })

export const boxOfSegment = ({ from, to }: Segment): Bounds => ({
  minX: Math.min(from.x, to.x),
  minY: Math.min(from.y, to.y),
  maxX: Math.max(from.x, to.x),
  maxY: Math.max(from.y, to.y),
})

/** How far along the segment (0 to 1) the point nearest to `point` lies. */
export const nearestAlong = (s: Segment, point: Vector): number => {
  const d = subtract(s.to, s.from)
  const squared = dot(d, d)
  if (squared === 0) return 0
  return Math.min(1, Math.max(0, dot(subtract(point, s.from), d) / squared))
}

/** Plain numbers instead of vectors: drawing asks this many thousand times for one figure. */
const pointToSegment = (x: number, y: number, { from, to }: Segment): number => {
  const dx = to.x - from.x
  const dy = to.y - from.y
  const squared = dx * dx + dy * dy
  const along = squared === 0 ? 0 : ((x - from.x) * dx + (y - from.y) * dy) / squared
  const part = along < 0 ? 0 : along > 1 ? 1 : along
  const awayX = x - from.x - part * dx
  const awayY = y - from.y - part * dy
  return Math.sqrt(awayX * awayX + awayY * awayY)
}

export const distanceToPoint = (s: Segment, point: Vector): number =>
  pointToSegment(point.x, point.y, s)

/** Which side of a segment's line a point lies on: positive left (y up), 0 on it. */
const sideOf = (s: Segment, point: Vector): number =>
  (s.to.x - s.from.x) * (point.y - s.from.y) - (s.to.y - s.from.y) * (point.x - s.from.x)

/** True when two segments cross at a point inside both; touching ends and overlaps are left out. */
export const crosses = (a: Segment, b: Segment): boolean =>
  sideOf(a, b.from) * sideOf(a, b.to) < 0 && sideOf(b, a.from) * sideOf(b, a.to) < 0

/** Where two segments cross, as the part of each (0 to 1); undefined when apart or parallel. */
export const findCrossing = (
  a: Segment,
  b: Segment,
): { readonly alongA: number; readonly alongB: number } | undefined => {
  const da = subtract(a.to, a.from)
  const db = subtract(b.to, b.from)
  const denominator = cross(da, db)
  if (denominator === 0) return undefined
  const offset = subtract(b.from, a.from)
  const alongA = cross(offset, db) / denominator
  const alongB = cross(offset, da) / denominator
  if (alongA < 0 || alongA > 1 || alongB < 0 || alongB > 1) return undefined
  return { alongA, alongB }
}

/** 0 when they cross. */
export const distanceBetween = (a: Segment, b: Segment): number => {
  if (crosses(a, b)) return 0
  return Math.min(
    distanceToPoint(a, b.from),
    distanceToPoint(a, b.to),
    distanceToPoint(b, a.from),
    distanceToPoint(b, a.to),
  )
}

/** Where two endless lines meet, each given by a point and a direction; undefined when parallel. */
export const findMeeting = (
  point: Vector,
  direction: Vector,
  otherPoint: Vector,
  otherDirection: Vector,
): Vector | undefined => {
  const denominator = cross(direction, otherDirection)
  if (Math.abs(denominator) < 1e-12) return undefined
  const t = cross(subtract(otherPoint, point), otherDirection) / denominator
  return add(point, scale(direction, t))
}

const pointToBox = ({ x, y }: Vector, box: Bounds): number => {
  const awayX = Math.max(box.minX - x, 0, x - box.maxX)
  const awayY = Math.max(box.minY - y, 0, y - box.maxY)
  return Math.sqrt(awayX * awayX + awayY * awayY)
}

/** Signs of the box's corners about a segment's line differ when the line enters the box. */
const lineEnters = ({ from, to }: Segment, box: Bounds): boolean => {
  const dx = to.x - from.x
  const dy = to.y - from.y
  const a = dx * (box.minY - from.y) - dy * (box.minX - from.x)
  const b = dx * (box.minY - from.y) - dy * (box.maxX - from.x)
  const c = dx * (box.maxY - from.y) - dy * (box.maxX - from.x)
  const d = dx * (box.maxY - from.y) - dy * (box.minX - from.x)
  return Math.min(a, b, c, d) <= 0 && Math.max(a, b, c, d) >= 0
}

/** True when a segment has a point in a box, its border included (separating axes). */
export const meetsBox = (s: Segment, box: Bounds): boolean =>
  Math.min(s.from.x, s.to.x) <= box.maxX &&
  Math.max(s.from.x, s.to.x) >= box.minX &&
  Math.min(s.from.y, s.to.y) <= box.maxY &&
  Math.max(s.from.y, s.to.y) >= box.minY &&
  lineEnters(s, box)

/** 0 when the segment enters or touches the box. */
export const distanceToBox = (s: Segment, box: Bounds): number => {
  if (meetsBox(s, box)) return 0
  return Math.min(
    pointToBox(s.from, box),
    pointToBox(s.to, box),
    pointToSegment(box.minX, box.minY, s),
    pointToSegment(box.maxX, box.minY, s),
    pointToSegment(box.maxX, box.maxY, s),
    pointToSegment(box.minX, box.maxY, s),
  )
}

/** The part of a segment inside a box (Liang and Barsky 1984); undefined when none of it is. */
export const clipToBox = (s: Segment, box: Bounds): Segment | undefined => {
  const d = subtract(s.to, s.from)
  let start = 0
  let end = 1
  const limits: [number, number][] = [
    [0 - d.x, s.from.x - box.minX],
    [d.x, box.maxX - s.from.x],
    [0 - d.y, s.from.y - box.minY],
    [d.y, box.maxY - s.from.y],
  ]
  for (const [slope, room] of limits) {
    if (slope === 0) {
      if (room < 0) return undefined
    } else if (slope < 0) {
      start = Math.max(start, room / slope)
    } else {
      end = Math.min(end, room / slope)
    }
  }
  if (start > end) return undefined
  return segment(between(s.from, s.to, start), between(s.from, s.to, end))
}
