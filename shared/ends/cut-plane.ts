import type { CutPlane, Side } from '#shared/ends/end.schema'
import { cornerFrames } from '#shared/ends/run-frame'
import { degrees, radians } from '#shared/geometry/vector'
import type { Vector3 } from '#shared/geometry/vector3'
import { dot3, lengthOf3, scale3, vector3 } from '#shared/geometry/vector3'
import type { Degrees } from '#shared/units/brands'

/** How much t grows along the cut for an inch of u and an inch of v. */
export interface CutSlope {
  readonly u: number
  readonly v: number
}

/** The cut of a square end. */
export const SQUARE_CUT: CutSlope = { u: 0, v: 0 }

/** Scaled so that its greatest part is 1: no square of it can overflow. */
const tame = (normal: Vector3): Vector3 => {
  const greatest = Math.max(Math.abs(normal.x), Math.abs(normal.y), Math.abs(normal.z))
  return greatest > 0 && Number.isFinite(greatest)
    ? scale3(scale3(normal, 0.5 / greatest), 2)
    : normal
}

/**
 * The plane's normal in the piece's frame (x = t, y = u, z = v). A plumb cut on slope s is
 * (cos s, 0, -sin s); of a corner the sum of the run directions, seen from the piece that enters
 * (right end) or leaves (left end).
 */
export const planeNormal = (plane: CutPlane, side: Side): Vector3 => {
  if ('plumb' in plane) {
    return vector3(Math.cos(radians(plane.plumb)), 0, -Math.sin(radians(plane.plumb)))
  }
  if ('normal' in plane) return tame(vector3(...plane.normal))
  const frames = cornerFrames(plane.corner)
  const { t, u, v } = frames[side]
  return vector3(dot3(frames.normal, t), dot3(frames.normal, u), dot3(frames.normal, v))
}

/** Degrees between a plane of this normal and the piece's length; 90 is a square cut. */
export const angleToPiece = (normal: Vector3): Degrees => {
  const length = lengthOf3(normal)
  return length > 0 ? degrees(Math.asin(Math.min(1, Math.abs(normal.x) / length))) : 0
}

/** The cut of a plane through the corner: t = -(nu u + nv v) / nt. */
export const cutSlope = (plane: CutPlane, side: Side): CutSlope => {
  const { x, y, z } = planeNormal(plane, side)
  return { u: 0 - y / x, v: 0 - z / x }
}
