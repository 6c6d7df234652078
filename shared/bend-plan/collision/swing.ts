import { TOLERANCE } from '#shared/geometry/tolerance'
import type { Inches } from '#shared/units/brands'
import type { Outline } from './outline'
import type { PolarPoint, PolarSide } from './polar'
import { pointToSegment } from './segment-distance'
import { meetsStill } from './still'

const FULL_TURN = 2 * Math.PI

/** The angles of one swing at which something changes, kept in order. One list serves many swings. */
interface Angles {
  count: number
  readonly values: Float64Array
}

/** The start, the end, two for each of two circles and two lines. */
const MOST_ANGLES = 10

const insert = (angles: Angles, angle: number): void => {
  let at = angles.count++
  for (; at > 0; at--) {
    const before = angles.values[at - 1] ?? 0
    if (before <= angle) break
    angles.values[at] = before
  }
  angles.values[at] = angle
}

/** Adds the angles of swing above 0 and below `swing` where cos(angle - towards) is `cosine`. */
const insertCrossings = (angles: Angles, swing: number, towards: number, cosine: number): void => {
  if (!(cosine >= -1 && cosine <= 1)) return
  const half = Math.acos(cosine)
  const first = towards - half
  const second = towards + half
  const one = first - FULL_TURN * Math.floor(first / FULL_TURN)
  const two = second - FULL_TURN * Math.floor(second / FULL_TURN)
  if (one < swing) insert(angles, one)
  if (two < swing) insert(angles, two)
}

/** Cosine of the angle, seen from the origin, between a circle's center and its points at a radius. */
const circleCosine = (radius: Inches, center: Inches, clearance: Inches): number =>
  (radius * radius + center * center - clearance * clearance) / (2 * radius * center)

/**
 * Whether a point swung about the origin comes nearer than the clearance to a still side.
 *
 * The point's arc meets the border of the side's neighborhood only on two circles about its ends and
 * two lines beside it: those angles in closed form, then the middle of each interval between them.
 * `way` is 1 counter-clockwise, -1 clockwise; `swing` radians.
 */
const arcEnters = (
  { radius, towards }: PolarPoint,
  swing: number,
  way: 1 | -1,
  side: PolarSide,
  clearance: Inches,
  angles: Angles,
): boolean => {
  if (radius === 0 || radius < side.near - clearance || radius > side.far + clearance) return false
  angles.count = 0
  insert(angles, 0)
  insert(angles, swing)
  // An end at the origin is the bend line itself: a cosine without a value, and no angle added.
  const { radiusA, radiusB, offset } = side
  const toA = way * (side.towardsA - towards)
  const toB = way * (side.towardsB - towards)
  const square = way * (side.normalTowards - towards)
  insertCrossings(angles, swing, toA, circleCosine(radius, radiusA, clearance))
  insertCrossings(angles, swing, toB, circleCosine(radius, radiusB, clearance))
  insertCrossings(angles, swing, square, (offset - clearance) / radius)
  insertCrossings(angles, swing, square, (offset + clearance) / radius)
  for (let i = 1; i < angles.count; i++) {
    const start = angles.values[i - 1] ?? 0
    const end = angles.values[i] ?? 0
    if (end <= start) continue
    const at = towards + (way * (start + end)) / 2
    const distance = pointToSegment(radius * Math.cos(at), radius * Math.sin(at), side.a, side.b)
    if (distance < clearance - TOLERANCE) return true
  }
  return false
}

const pointsEnter = (
  points: Outline,
  sides: Outline,
  swing: number,
  way: 1 | -1,
  clearance: Inches,
  skipFirst: boolean,
): boolean => {
  const angles: Angles = { count: 0, values: new Float64Array(MOST_ANGLES) }
  return points.polar.points.some((point, i) => {
    // A point belongs to the sides before and after it: skipped where only the first side has it.
    const onlyOnFirst = i === 0 || (i === 1 && points.sides.length === 1)
    return sides.polar.sides.some(
      (side, j) =>
        !(skipFirst && j === 0 && onlyOnFirst) &&
        arcEnters(point, swing, way, side, clearance, angles),
    )
  })
}

/**
 * Whether an outline swung counter-clockwise about the origin, from 0 to `swing` radians, meets a
 * still one: within the clearance at the start, or nearer than it on the way. Exact: apart from the
 * start, two sides first come within a clearance where an end point of one does.
 */
export const meetsSwinging = (
  moving: Outline,
  still: Outline,
  swing: number,
  clearance: Inches,
  skipFirst = false,
): boolean =>
  meetsStill(moving, still, clearance, skipFirst) ||
  pointsEnter(moving, still, swing, 1, clearance, skipFirst) ||
  pointsEnter(still, moving, swing, -1, clearance, skipFirst)
