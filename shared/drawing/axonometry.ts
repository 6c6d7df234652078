import type { Vector3 } from '#shared/geometry/vector3'
import { add3, cross3, dot3, scale3, subtract3, vector3 } from '#shared/geometry/vector3'
import { radians } from '#shared/geometry/vector'
import type { Degrees } from '#shared/units/brands'
import type { Point } from './display-list'

/** Where a scene is looked at from: unit vectors of the world (z up). */
export interface View {
  /** From the scene to the eye. */
  readonly toEye: Vector3
  readonly right: Vector3
  readonly up: Vector3
}

/**
 * Parallel projection: `azimuth` turns the eye about the plumb line, 0 looking against +x and
 * counter-clockwise seen from above; `elevation` lifts it above the level, under 90.
 */
export const viewFrom = (azimuth: Degrees, elevation: Degrees): View => {
  const level = Math.cos(radians(elevation))
  const toEye = vector3(
    level * Math.cos(radians(azimuth)),
    level * Math.sin(radians(azimuth)),
    Math.sin(radians(elevation)),
  )
  const right = vector3(0 - Math.sin(radians(azimuth)), Math.cos(radians(azimuth)), 0)
  return { toEye, right, up: cross3(toEye, right) }
}

/** On the plane of the picture, y up. */
export const project = (point: Vector3, { right, up }: View): Point => ({
  x: dot3(point, right),
  y: dot3(point, up),
})

/** A flat convex polygon of space. */
export interface Face {
  readonly corners: readonly Vector3[]
  /** Of its plane; its length is twice the area. */
  readonly normal: Vector3
}

/** The normal by Newell's sum: right also where three corners lie on a line. */
export const faceOf = (corners: readonly Vector3[]): Face => ({
  corners,
  normal: corners.reduce(
    (sum, corner, index) => {
      const next = corners[(index + 1) % corners.length] ?? corner
      return add3(sum, cross3(corner, next))
    },
    vector3(0, 0, 0),
  ),
})

const middleOf = ({ corners }: Face): Vector3 =>
  scale3(corners.reduce(add3, vector3(0, 0, 0)), 1 / corners.length)

/** Inches within which a corner counts as lying in a plane. */
const IN_PLANE = 1e-6

/** Whether all of a face lies on the eye's side of another's plane, on the far side, or neither. */
const sideOf = (face: Face, plane: Face, view: View): 'near' | 'far' | 'both' => {
  const length = Math.sqrt(dot3(plane.normal, plane.normal))
  const [first] = plane.corners
  if (first === undefined || length === 0) return 'both'
  const facing = dot3(plane.normal, view.toEye) >= 0 ? 1 : -1
  const heights = face.corners.map(
    (corner) => (facing * dot3(subtract3(corner, first), plane.normal)) / length,
  )
  if (heights.every((height) => height >= 0 - IN_PLANE)) return 'near'
  return heights.every((height) => height <= IN_PLANE) ? 'far' : 'both'
}

const axesOf = (polygon: readonly Point[]): Point[] =>
  polygon.map(({ x, y }, index) => {
    const next = polygon[(index + 1) % polygon.length] ?? { x, y }
    return { x: y - next.y, y: next.x - x }
  })

const reach = (polygon: readonly Point[], axis: Point): [number, number] => {
  const along = polygon.map(({ x, y }) => x * axis.x + y * axis.y)
  return [Math.min(...along), Math.max(...along)]
}

/** Whether two convex polygons share more than a border: no axis tells them apart. */
export const overlap = (a: readonly Point[], b: readonly Point[]): boolean =>
  [...axesOf(a), ...axesOf(b)].every((axis) => {
    const size = Math.hypot(axis.x, axis.y)
    if (size === 0) return true
    const [fromA, toA] = reach(a, axis)
    const [fromB, toB] = reach(b, axis)
    return Math.min(toA, toB) - Math.max(fromA, fromB) > 1e-6 * size
  })

/** True where `a` must be drawn before `b`, which hides part of it. */
const isBehind = (a: Face, b: Face, view: View): boolean => {
  const aToB = sideOf(a, b, view)
  const bToA = sideOf(b, a, view)
  if (aToB === 'far' && bToA !== 'far') return true
  if (bToA === 'near' && aToB !== 'near') return true
  if (aToB === 'near' || bToA === 'far') return false
  return dot3(middleOf(a), view.toEye) < dot3(middleOf(b), view.toEye)
}

/**
 * The faces from the farthest to the nearest, so that each may be painted over those before it:
 * what lies behind another's plane goes first, and only where two planes cut each other does the
 * middle decide. Faces may touch along edges but not run through each other. Deterministic.
 */
export const paintersOrder = <F extends Face>(faces: readonly F[], view: View): F[] => {
  const flat = faces.map(({ corners }) => corners.map((corner) => project(corner, view)))
  const behind = faces.map((face, index) =>
    faces.flatMap((other, at) => {
      const [mine, theirs] = [flat[index], flat[at]]
      const hides = at !== index && mine && theirs && overlap(mine, theirs)
      return hides && isBehind(other, face, view) ? [at] : []
    }),
  )
  const order: F[] = []
  const asked = new Set<number>()
  const place = (index: number): void => {
    if (asked.has(index)) return
    asked.add(index)
    for (const first of behind[index] ?? []) place(first)
    const face = faces[index]
    if (face !== undefined) order.push(face)
  }
  const byDepth = faces
    .map((face, index) => ({ index, depth: dot3(middleOf(face), view.toEye) }))
    .sort((a, b) => a.depth - b.depth || a.index - b.index)
  for (const { index } of byDepth) place(index)
  return order
}
