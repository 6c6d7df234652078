import type { Vector } from '#shared/geometry/vector'
import type { Inches } from '#shared/units/brands'
import type { OutlineSide } from './outline'
import { pointToSegment } from './segment-distance'

/** A point seen from the bend line at the origin: distance, and direction in radians. */
export interface PolarPoint {
  readonly radius: Inches
  readonly towards: number
}

/** A side seen from the origin. */
export interface PolarSide extends OutlineSide {
  readonly radiusA: Inches
  readonly towardsA: number
  readonly radiusB: Inches
  readonly towardsB: number
  /** Direction of the normal, and the distance of the side's line along it. */
  readonly normalTowards: number
  readonly offset: Inches
  readonly near: Inches
  readonly far: Inches
}

export const polarPoint = ({ x, y }: Vector): PolarPoint => ({
  radius: Math.sqrt(x * x + y * y),
  towards: Math.atan2(y, x),
})

export const polarSide = ({ a, b }: OutlineSide): PolarSide => {
  const length = Math.sqrt((b.x - a.x) ** 2 + (b.y - a.y) ** 2)
  const normalX = (a.y - b.y) / length
  const normalY = (b.x - a.x) / length
  const radiusA = Math.sqrt(a.x * a.x + a.y * a.y)
  const radiusB = Math.sqrt(b.x * b.x + b.y * b.y)
  return {
    a,
    b,
    radiusA,
    towardsA: Math.atan2(a.y, a.x),
    radiusB,
    towardsB: Math.atan2(b.y, b.x),
    normalTowards: Math.atan2(normalY, normalX),
    offset: normalX * a.x + normalY * a.y,
    near: pointToSegment(0, 0, a, b),
    far: Math.max(radiusA, radiusB),
  }
}
