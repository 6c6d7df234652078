import { isEqual } from '#shared/geometry/tolerance'
import type { Vector } from '#shared/geometry/vector'
import {
  add,
  cross,
  degrees,
  distance,
  dot,
  heading,
  ORIGIN,
  scale,
  subtract,
} from '#shared/geometry/vector'
import type { Bend, Profile } from '#shared/profile/profile.schema'
import type { Degrees } from '#shared/units/brands'

/**
 * The profile as it is drawn and dragged: a chain of its outside dimensions at sharp corners,
 * edge A at the origin, leg 1 along +x, y up, hems left out. n legs give n + 1 points.
 *
 * This is the drawing's model, not the metal's: it ignores thickness and radius, and over 90
 * degrees an outside dimension ends at the outermost tangent, short of the sharp corner.
 */
export const profileCorners = (profile: Profile): Vector[] => {
  const corners = [ORIGIN]
  let at = ORIGIN
  let direction: Degrees = 0
  profile.legs.forEach((leg, index) => {
    at = add(at, scale(heading(direction), leg))
    corners.push(at)
    direction += profile.bends[index]?.turn ?? 0
  })
  return corners
}

/** Signed degrees from one direction to another, over -180 up to 180; positive turns left. */
const turnBetween = (a: Vector, b: Vector): Degrees => degrees(Math.atan2(cross(a, b), dot(a, b)))

/**
 * The inverse of `profileCorners`: n + 1 points give n legs and n - 1 turns, wherever the chain
 * lies in the plane. Hems and color side come from `base`. A leg or turn that comes out as in
 * `base` keeps the very number, and its bend its tie to the roof, so that dragging one corner
 * never wears the others down; a turn that changes loses its tie.
 *
 * Two points at one place give a leg of no length, which `profileProblems` reports. Throws
 * RangeError for fewer than two points.
 */
export const profileFromCorners = (points: readonly Vector[], base: Profile): Profile => {
  if (points.length < 2) throw new RangeError('A profile needs at least two corners.')
  const walks = points.slice(1).map((point, index) => subtract(point, points[index] ?? point))
  const legs = points.slice(1).map((point, index) => {
    const leg = distance(point, points[index] ?? point)
    const kept = base.legs[index]
    return kept !== undefined && isEqual(kept, leg) ? kept : leg
  })
  const bends = walks.slice(1).map((walk, index): Bend => {
    const turn = turnBetween(walks[index] ?? walk, walk)
    const kept = base.bends[index]
    return kept !== undefined && isEqual(kept.turn, turn) ? kept : { turn }
  })
  return { ...base, legs, bends }
}
