import { between, cross, distance, subtract, vector } from '#shared/geometry/vector'
import type { Vector } from '#shared/geometry/vector'
import type { Inches } from '#shared/units/brands'
import type { Outline, OutlineSide } from '../collision/outline'

export interface Nearest {
  readonly distance: Inches
  /** On the first outline. */
  readonly at: Vector
}

const closestOn = ({ a, b }: OutlineSide, p: Vector): Vector => {
  const run = subtract(b, a)
  const square = run.x * run.x + run.y * run.y
  const t = square === 0 ? 0 : ((p.x - a.x) * run.x + (p.y - a.y) * run.y) / square
  return between(a, b, Math.min(1, Math.max(0, t)))
}

const crossing = (one: OutlineSide, other: OutlineSide): Vector | undefined => {
  const run = subtract(one.b, one.a)
  const way = subtract(other.b, other.a)
  const both = cross(run, way)
  if (both === 0) return undefined
  const apart = subtract(other.a, one.a)
  const t = cross(apart, way) / both
  const u = cross(apart, run) / both
  return t >= 0 && t <= 1 && u >= 0 && u <= 1 ? between(one.a, one.b, t) : undefined
}

const nearestOnSides = (one: OutlineSide, other: OutlineSide): Nearest => {
  const shared = crossing(one, other)
  if (shared !== undefined) return { distance: 0, at: shared }
  const pairs: readonly (readonly [Vector, Vector])[] = [
    [one.a, closestOn(other, one.a)],
    [one.b, closestOn(other, one.b)],
    [closestOn(one, other.a), other.a],
    [closestOn(one, other.b), other.b],
  ]
  return pairs
    .map(([at, there]) => ({ distance: distance(at, there), at }))
    .reduce((best, each) => (each.distance < best.distance ? each : best))
}

/**
 * Where two outlines are nearest; the first such place along the first one. With `skipFirst` the first
 * sides of both, which join at the bend line, are not compared.
 */
export const nearestPoints = (one: Outline, other: Outline, skipFirst = false): Nearest => {
  let best: Nearest = { distance: Infinity, at: vector(0, 0) }
  one.sides.forEach((side, i) => {
    other.sides.forEach((against, j) => {
      if (skipFirst && i === 0 && j === 0) return
      const found = nearestOnSides(side, against)
      if (found.distance < best.distance) best = found
    })
  })
  return best
}
