import type { Bounds } from './bounds'
import { contains } from './bounds'
import type { Vector } from './vector'
import { add, between, cross, distance, dot, scale, subtract, vector } from './vector'

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

export const distanceToPoint = (s: Segment, point: Vector): number =>
  distance(point, between(s.from, s.to, nearestAlong(s, point)))

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
  if (findCrossing(a, b) !== undefined) return 0
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

const sidesOf = (box: Bounds): Segment[] => {
  const a = vector(box.minX, box.minY)
  const b = vector(box.maxX, box.minY)
  const c = vector(box.maxX, box.maxY)
  const d = vector(box.minX, box.maxY)
  return [segment(a, b), segment(b, c), segment(c, d), segment(d, a)]
}

/** 0 when the segment enters or touches the box. */
export const distanceToBox = (s: Segment, box: Bounds): number => {
  if (contains(box, s.from) || contains(box, s.to)) return 0
  return Math.min(...sidesOf(box).map((side) => distanceBetween(side, s)))
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
