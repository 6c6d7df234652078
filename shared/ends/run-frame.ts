import type { Corner, Side } from '#shared/ends/end.schema'
import { degrees, radians } from '#shared/geometry/vector'
import type { Vector3 } from '#shared/geometry/vector3'
import { add3, cross3, dot3, scale3, subtract3, unit3, vector3 } from '#shared/geometry/vector3'
import type { Degrees } from '#shared/units/brands'

/** A piece's own axes as unit vectors of the world (x, y level, z up): right-handed, t × u = v. */
export interface RunFrame {
  /** Along the piece from left to right. */
  readonly t: Vector3
  /** From edge A to edge B, level. */
  readonly u: Vector3
  /** The world's up less its part along t. */
  readonly v: Vector3
}

export interface CornerFrames {
  /** Unit direction of the run into the corner, in the plane of x and z. */
  readonly into: Vector3
  readonly outOf: Vector3
  /** Of the corner's plane: the sum of the two, not a unit vector. */
  readonly normal: Vector3
  /** The entering piece, which comes to the corner with its right end. */
  readonly right: RunFrame
  /** The leaving piece, whose left end lies in the corner. */
  readonly left: RunFrame
}

const UP = vector3(0, 0, 1)

/** The direction of a run: `slope` is its rise, `plan` its turn seen from above, positive left. */
const runDirection = (slope: Degrees, plan: Degrees): Vector3 => {
  const level = Math.cos(radians(slope))
  return vector3(
    level * Math.cos(radians(plan)),
    level * Math.sin(radians(plan)),
    Math.sin(radians(slope)),
  )
}

/** The axes of a piece that runs along the unit vector `t`, which is never plumb. */
const frameAlong = (t: Vector3): RunFrame => {
  const v = unit3(subtract3(UP, scale3(t, dot3(UP, t))))
  return { t, u: cross3(v, t), v }
}

/**
 * The corner of two runs in the world, with the corner's point at the origin: unit run directions
 * d1 = (cos in, 0, sin in) and d2 = (cos out cos plan, cos out sin plan, sin out), the plane's
 * normal d1 + d2, and the axes of both pieces. Slopes in degrees between -90 and 90, which a
 * RangeError guards: the axes of a plumb run mean nothing.
 */
export const cornerFrames = ({ slopeIn, slopeOut, plan }: Corner): CornerFrames => {
  for (const slope of [slopeIn, slopeOut]) {
    if (!(Math.abs(slope) < 90)) throw new RangeError(`A run of slope ${slope} has no frame.`)
  }
  const into = runDirection(slopeIn, 0)
  const outOf = runDirection(slopeOut, plan)
  return {
    into,
    outOf,
    normal: add3(into, outOf),
    right: frameAlong(into),
    left: frameAlong(outOf),
  }
}

/** Over -180 up to 180. */
const withinTurn = (angle: Degrees): Degrees => {
  const rest = angle % 360
  return rest > 180 ? rest - 360 : rest <= -180 ? rest + 360 : rest
}

/**
 * How far a section turns about its run on its way through the corner, degrees: the mirror image
 * in the corner's plane of a section that enters at lay 0 leaves at this lay. The plane swaps d1
 * with -d2, so that of a mirrored right-handed frame only a turn about the run is left.
 */
const turnThrough = ({ normal, right, left }: CornerFrames): Degrees => {
  const mirroredU = subtract3(
    right.u,
    scale3(normal, (2 * dot3(right.u, normal)) / dot3(normal, normal)),
  )
  return degrees(Math.atan2(dot3(mirroredU, left.v), dot3(mirroredU, left.u)))
}

/**
 * The lay in degrees at which the same profile on the other side of the corner is the mirror image
 * of this one in the corner's plane, so that the two close. `side` is the end of this piece that
 * lies in the corner: a right end enters, a left end leaves. Given back over -180 up to 180.
 *
 * Throws a RangeError as `cornerFrames`; a corner that turns straight back has no plane, and what
 * comes of it is NaN: ask `endProblems` first.
 */
export const matchingLay = (corner: Corner, side: Side, lay: Degrees): Degrees => {
  const turn = turnThrough(cornerFrames(corner))
  return withinTurn(side === 'right' ? lay + turn : lay - turn)
}
