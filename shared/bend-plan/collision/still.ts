import type { Inches } from '#shared/units/brands'
import type { Outline } from './outline'
import { areFarApart, segmentSquare } from './segment-distance'

/** Whether a point lies inside by the number of sides that a ray to the right crosses. */
const isInside = (x: number, y: number, { xs, ys, sideCount }: Outline): boolean => {
  let inside = false
  for (let i = 0; i < sideCount; i++) {
    const j = i + 1 === xs.length ? 0 : i + 1
    const ax = xs[i] ?? NaN
    const ay = ys[i] ?? NaN
    const bx = xs[j] ?? NaN
    const by = ys[j] ?? NaN
    if (ay > y !== by > y && x < ax + ((y - ay) / (by - ay)) * (bx - ax)) inside = !inside
  }
  return inside
}

/**
 * Whether two outlines, the first moved by (dx, dy), lie within a clearance of each other, or one
 * inside the other. With `skipFirst` the first sides of both, which join at the bend line, are not
 * compared.
 */
export const meetsStill = (
  one: Outline,
  other: Outline,
  clearance: Inches,
  skipFirst = false,
  dx: Inches = 0,
  dy: Inches = 0,
): boolean => {
  const a = one.box
  const b = other.box
  const isApart =
    a.left + dx > b.right + clearance ||
    a.right + dx < b.left - clearance ||
    a.bottom + dy > b.top + clearance ||
    a.top + dy < b.bottom - clearance
  if (isApart) return false
  const { xs, ys } = one
  const square = clearance * clearance
  for (let i = 0; i < one.sideCount; i++) {
    const next = i + 1 === xs.length ? 0 : i + 1
    const px = (xs[i] ?? NaN) + dx
    const py = (ys[i] ?? NaN) + dy
    const qx = (xs[next] ?? NaN) + dx
    const qy = (ys[next] ?? NaN) + dy
    if (areFarApart(px, py, qx, qy, b.left, b.bottom, b.right, b.top, clearance)) continue
    for (let j = skipFirst && i === 0 ? 1 : 0; j < other.sideCount; j++) {
      const after = j + 1 === other.xs.length ? 0 : j + 1
      const cx = other.xs[j] ?? NaN
      const cy = other.ys[j] ?? NaN
      const ex = other.xs[after] ?? NaN
      const ey = other.ys[after] ?? NaN
      if (areFarApart(px, py, qx, qy, cx, cy, ex, ey, clearance)) continue
      if (segmentSquare(px, py, qx, qy, cx, cy, ex, ey) <= square) return true
    }
  }
  return (
    (other.isSolid && isInside((xs[0] ?? NaN) + dx, (ys[0] ?? NaN) + dy, other)) ||
    (one.isSolid && isInside((other.xs[0] ?? NaN) - dx, (other.ys[0] ?? NaN) - dy, one))
  )
}
