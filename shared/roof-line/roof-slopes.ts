import { TOLERANCE } from '#shared/geometry/tolerance'
import { degrees, radians } from '#shared/geometry/vector'
import { includedAngle } from '#shared/units/angle'
import type { Degrees, Inches } from '#shared/units/brands'

/*
 * Plane geometry of roofs. A slope is in degrees (`pitchAngle` makes it of a rise in 12). Two roof
 * planes meet along a line: a hip or valley where the eave turns in plan, a ridge where they fall
 * away from each other, a transition where they face one way. Hip and valley have the same figures.
 */

/** Two roof planes that meet. */
export interface RoofCorner {
  /** Degrees from level, 0 up to less than 90. */
  readonly slope: Degrees
  /** The slope of the other plane; equal on most roofs. */
  readonly otherSlope: Degrees
  /**
   * How far the eave turns in plan from one plane to the other, degrees: 90 at a square corner, 45
   * at an octagon's, 180 for a ridge, 0 for a transition. The side it turns to plays no part.
   */
  readonly planTurn: Degrees
}

/** A square corner of a roof of one slope: the usual hip or valley. */
export const squareCorner = (slope: Degrees): RoofCorner => ({
  slope,
  otherSlope: slope,
  planTurn: 90,
})

const checkSlope = (name: string, slope: Degrees): void => {
  if (!(slope >= 0 && slope < 90)) {
    throw new RangeError(`${name} must be from 0 to less than 90 degrees, not ${slope}.`)
  }
}

/**
 * The cross product of the planes' unit normals, which lies along their meeting line: `across`
 * level and square to the eave of `slope`, `along` level and along that eave, `up` plumb.
 */
const meetingLine = ({ slope, otherSlope, planTurn }: RoofCorner) => {
  checkSlope('slope', slope)
  checkSlope('otherSlope', otherSlope)
  if (!(Math.abs(planTurn) <= 180)) {
    throw new RangeError(`planTurn must be from -180 to 180 degrees, not ${planTurn}.`)
  }
  const [p, q, turn] = [radians(slope), radians(otherSlope), radians(Math.abs(planTurn))]
  return {
    across: Math.cos(p) * Math.sin(q) * Math.sin(turn),
    along: Math.sin(p) * Math.cos(q) - Math.cos(p) * Math.sin(q) * Math.cos(turn),
    up: Math.sin(p) * Math.sin(q) * Math.sin(turn),
    /** The dot product of the normals. */
    likeness: Math.cos(p) * Math.cos(q) + Math.sin(p) * Math.sin(q) * Math.cos(turn),
  }
}

/** As `meetingLine`, but only of planes that do meet in a line. */
const lineOf = (corner: RoofCorner) => {
  const line = meetingLine(corner)
  if (Math.hypot(line.across, line.along, line.up) <= TOLERANCE) {
    throw new RangeError('The two slopes lie in one plane and meet in no line: change a slope.')
  }
  return line
}

/**
 * The bend of a flat piece that lies on both planes (hip, valley or ridge piece), degrees: the
 * angle between the planes' normals. For equal slopes p at a square corner acos(cos² p); for a
 * ridge the sum of the slopes, for a transition their difference. 0 where the planes are one.
 * Throws RangeError on a slope or turn outside its range.
 */
export const bendOverPlanes = (corner: RoofCorner): Degrees => {
  const { across, along, up, likeness } = meetingLine(corner)
  return degrees(Math.atan2(Math.hypot(across, along, up), likeness))
}

/** The dihedral: the angle between the two roof planes, 180 less the bend of a piece on both. */
export const angleBetweenPlanes = (corner: RoofCorner): Degrees =>
  includedAngle(bendOverPlanes(corner))

/**
 * The pitch of the hip or valley line from level, degrees. For equal slopes p it is
 * atan(tan p sin a), a the plan angle beside the hip; for slopes of tangent s1 and s2 at a square
 * corner atan(s1 s2 / √(s1² + s2²)). Source: Bartok, hip and valley geometry. Throws RangeError
 * where the planes meet in no line.
 */
export const hipPitch = (corner: RoofCorner): Degrees => {
  const { across, along, up } = lineOf(corner)
  return degrees(Math.atan2(up, Math.hypot(across, along)))
}

/**
 * The angle in plan between the eave of `slope` and the hip, degrees. For equal slopes half of the
 * corner: 90 less half the turn, 45 at a square corner. Over 90 where the other slope is much the
 * steeper. Throws as `hipPitch`.
 */
export const hipPlanAngle = (corner: RoofCorner): Degrees => {
  const { across, along } = lineOf(corner)
  return degrees(Math.atan2(across, along))
}

/**
 * The length of hip or valley for one unit of common run under `slope`: √(2 + tan² p) at a square
 * corner of equal slopes, the framing square's second row over 12. Throws as `hipPitch`, and where
 * the line runs level along the eave (ridge, transition), which no common run measures.
 */
export const hipLengthFactor = (corner: RoofCorner): number => {
  const { across, along, up } = lineOf(corner)
  if (across <= TOLERANCE) {
    throw new RangeError('A line along the eave has no length for a common run: give a planTurn.')
  }
  return Math.hypot(across, along, up) / across
}

/**
 * The backing angle on the side of `slope`, degrees: how far that roof plane falls off a plane
 * square to the hip's plumb face, atan(sin(hip pitch) / tan(plan angle)). Both sides together are
 * the bend of a piece over the hip. Source: Bartok, hip and valley geometry. Throws as `hipPitch`.
 */
export const backingAngle = (corner: RoofCorner): Degrees =>
  degrees(Math.atan(Math.sin(radians(hipPitch(corner))) / Math.tan(radians(hipPlanAngle(corner)))))

/** The sloped length for one unit of plan run, 1 / cos(slope): the framing square's first row over 12. */
export const rakeFactor = (slope: Degrees): number => {
  checkSlope('slope', slope)
  return 1 / Math.cos(radians(slope))
}

/** The length of a rake in inches, of its plan run in inches and its slope in degrees. */
export const rakeLength = (planRun: Inches, slope: Degrees): Inches => planRun * rakeFactor(slope)
