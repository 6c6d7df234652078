import type { Vector } from './vector'
import { vector } from './vector'

/** A box with its sides along the axes, closed: a point on its border lies in it. */
export interface Bounds {
  readonly minX: number
  readonly minY: number
  readonly maxX: number
  readonly maxY: number
}

/** The smallest box around the points. Throws a RangeError when there are none. */
export const boundsOf = (points: readonly Vector[]): Bounds => {
  if (points.length === 0) throw new RangeError('No points to put a box around.')
  let minX = Infinity
  let minY = Infinity
  let maxX = -Infinity
  let maxY = -Infinity
  for (const { x, y } of points) {
    minX = Math.min(minX, x)
    minY = Math.min(minY, y)
    maxX = Math.max(maxX, x)
    maxY = Math.max(maxY, y)
  }
  return { minX, minY, maxX, maxY }
}

export const boxAround = (center: Vector, width: number, height: number): Bounds => ({
  minX: center.x - width / 2,
  minY: center.y - height / 2,
  maxX: center.x + width / 2,
  maxY: center.y + height / 2,
})

export const widthOf = (box: Bounds): number => box.maxX - box.minX

export const heightOf = (box: Bounds): number => box.maxY - box.minY

export const middleOf = (box: Bounds): Vector =>
  vector((box.minX + box.maxX) / 2, (box.minY + box.maxY) / 2)

export const union = (a: Bounds, b: Bounds): Bounds => ({
  minX: Math.min(a.minX, b.minX),
  minY: Math.min(a.minY, b.minY),
  maxX: Math.max(a.maxX, b.maxX),
  maxY: Math.max(a.maxY, b.maxY),
})

/** Grown on every side; a negative margin shrinks. */
export const grow = (box: Bounds, margin: number): Bounds => ({
  minX: box.minX - margin,
  minY: box.minY - margin,
  maxX: box.maxX + margin,
  maxY: box.maxY + margin,
})

/** True when the insides overlap; boxes that only touch do not. */
export const overlap = (a: Bounds, b: Bounds): boolean =>
  a.minX < b.maxX && b.minX < a.maxX && a.minY < b.maxY && b.minY < a.maxY

export const holds = (outer: Bounds, inner: Bounds): boolean =>
  inner.minX >= outer.minX &&
  inner.minY >= outer.minY &&
  inner.maxX <= outer.maxX &&
  inner.maxY <= outer.maxY

export const contains = (box: Bounds, point: Vector): boolean =>
  point.x >= box.minX && point.x <= box.maxX && point.y >= box.minY && point.y <= box.maxY
