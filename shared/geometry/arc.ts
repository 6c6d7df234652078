import type { Degrees, Inches } from '#shared/units/brands'
import type { Vector } from './vector'
import { add, degrees, heading, scale } from './vector'

/** `start` is the direction from the center to the first point; a positive sweep turns left. */
export interface Arc {
  readonly center: Vector
  readonly radius: Inches
  readonly start: Degrees
  readonly sweep: Degrees
}

export const pointOnArc = (arc: Arc, part: number): Vector =>
  add(arc.center, scale(heading(arc.start + arc.sweep * part), arc.radius))

/**
 * Points along the arc, both ends included. A chord spans at most `maxStep` degrees and strays at
 * most `tolerance` from the arc (chord height r (1 - cos(step / 2))).
 */
export const flattenArc = (arc: Arc, maxStep: Degrees, tolerance: Inches): Vector[] => {
  const ratio = 1 - tolerance / Math.max(arc.radius, tolerance)
  const byHeight = 2 * degrees(Math.acos(Math.max(-1, ratio)))
  const step = Math.min(maxStep, byHeight)
  const count = Math.max(1, Math.ceil(Math.abs(arc.sweep) / step))
  const points: Vector[] = []
  for (let index = 0; index <= count; index += 1) points.push(pointOnArc(arc, index / count))
  return points
}
