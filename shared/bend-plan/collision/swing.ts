import { TOLERANCE } from '#shared/geometry/tolerance'
import type { Inches } from '#shared/units/brands'
import type { Outline } from './outline'
import { withinHalfTurn } from './polar'
import { pointSquare } from './segment-distance'
import { meetsStill } from './still'

const FULL_TURN = 2 * Math.PI

/** Far above the rounding of a sum of angles; only ever keeps a side in the running. */
const ANGLE_SLACK = 1e-9

/** The start, the end, two for each of two circles and two lines. */
const MOST_ANGLES = 10

/**
 * The angles of one swing at which something changes, kept in order. One list serves all swings, which
 * never overlap in time: a search makes hundreds of thousands, and lists of their own would be garbage.
 */
const angles = { count: 0, values: new Float64Array(MOST_ANGLES) }

const insert = (angle: number): void => {
  let at = angles.count++
  for (; at > 0; at--) {
    const before = angles.values[at - 1] ?? 0
    if (before <= angle) break
    angles.values[at] = before
  }
  angles.values[at] = angle
}

/** Adds the angles of swing above 0 and below `swing` where cos(angle - towards) is `cosine`. */
const insertCrossings = (swing: number, towards: number, cosine: number): void => {
  if (!(cosine >= -1 && cosine <= 1)) return
  const half = Math.acos(cosine)
  const first = towards - half
  const second = towards + half
  const one = first - FULL_TURN * Math.floor(first / FULL_TURN)
  const two = second - FULL_TURN * Math.floor(second / FULL_TURN)
  if (one < swing) insert(one)
  if (two < swing) insert(two)
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
  radius: Inches,
  towards: number,
  swing: number,
  way: 1 | -1,
  sides: Outline,
  side: number,
  clearance: Inches,
): boolean => {
  const { xs, ys, polar } = sides
  const next = side + 1 === xs.length ? 0 : side + 1
  angles.count = 0
  insert(0)
  insert(swing)
  // An end at the origin is the bend line itself: a cosine without a value, and no angle added.
  const toA = way * ((polar.towards[side] ?? NaN) - towards)
  const toB = way * ((polar.towards[next] ?? NaN) - towards)
  const square = way * ((polar.normal[side] ?? NaN) - towards)
  const offset = polar.offset[side] ?? NaN
  insertCrossings(swing, toA, circleCosine(radius, polar.radius[side] ?? NaN, clearance))
  insertCrossings(swing, toB, circleCosine(radius, polar.radius[next] ?? NaN, clearance))
  insertCrossings(swing, square, (offset - clearance) / radius)
  insertCrossings(swing, square, (offset + clearance) / radius)
  const near = clearance - TOLERANCE
  const ax = xs[side] ?? NaN
  const ay = ys[side] ?? NaN
  const bx = xs[next] ?? NaN
  const by = ys[next] ?? NaN
  for (let i = 1; i < angles.count; i++) {
    const start = angles.values[i - 1] ?? 0
    const end = angles.values[i] ?? 0
    if (end <= start) continue
    const at = towards + (way * (start + end)) / 2
    const found = pointSquare(radius * Math.cos(at), radius * Math.sin(at), ax, ay, bx, by)
    if (found < near * near) return true
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
  const from = points.polar
  const to = sides.polar
  for (let i = 0; i < points.xs.length; i++) {
    const radius = from.radius[i] ?? NaN
    if (radius === 0) continue
    const towards = from.towards[i] ?? NaN
    // A point belongs to the sides before and after it: skipped where only the first side has it.
    const onlyOnFirst = i === 0 || (i === 1 && points.sideCount === 1)
    // A side nearer than the clearance is seen from the point's arc at most so far off.
    const aside = radius > clearance ? Math.asin(clearance / radius) : Math.PI
    const half = swing / 2 + aside + ANGLE_SLACK
    const middle = towards + (way * swing) / 2
    for (let j = skipFirst && onlyOnFirst ? 1 : 0; j < sides.sideCount; j++) {
      if (radius < (to.near[j] ?? NaN) - clearance) continue
      if (radius > (to.far[j] ?? NaN) + clearance) continue
      const apart = Math.abs(withinHalfTurn((to.middle[j] ?? NaN) - middle))
      if (apart > half + (to.spread[j] ?? NaN)) continue
      if (arcEnters(radius, towards, swing, way, sides, j, clearance)) return true
    }
  }
  return false
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
