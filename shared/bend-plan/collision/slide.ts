import { TOLERANCE } from '#shared/geometry/tolerance'
import type { Inches } from '#shared/units/brands'
import type { Outline } from './outline'
import { areFarApart, segmentSquare } from './segment-distance'
import { meetsStill } from './still'

/** Whether the points of one outline, set off by (atX, atY) and moved by (dx, dy), come near the other's sides. */
const pointsEnter = (
  points: Outline,
  sides: Outline,
  atX: Inches,
  atY: Inches,
  dx: Inches,
  dy: Inches,
  clearance: Inches,
): boolean => {
  const near = clearance - TOLERANCE
  const square = near * near
  const { box } = sides
  for (let i = 0; i < points.xs.length; i++) {
    const px = (points.xs[i] ?? NaN) + atX
    const py = (points.ys[i] ?? NaN) + atY
    const qx = px + dx
    const qy = py + dy
    if (areFarApart(px, py, qx, qy, box.left, box.bottom, box.right, box.top, clearance)) continue
    for (let j = 0; j < sides.sideCount; j++) {
      const after = j + 1 === sides.xs.length ? 0 : j + 1
      const cx = sides.xs[j] ?? NaN
      const cy = sides.ys[j] ?? NaN
      const ex = sides.xs[after] ?? NaN
      const ey = sides.ys[after] ?? NaN
      if (areFarApart(px, py, qx, qy, cx, cy, ex, ey, clearance)) continue
      if (segmentSquare(px, py, qx, qy, cx, cy, ex, ey) < square) return true
    }
  }
  return false
}

/**
 * Whether an outline, set off by (atX, atY) and then moved straight by (dx, dy), meets a still one:
 * within the clearance at the start, or nearer than it on the way. Exact, as for a swing; a point's
 * path is a segment.
 */
export const meetsSliding = (
  moving: Outline,
  still: Outline,
  dx: Inches,
  dy: Inches,
  clearance: Inches,
  atX: Inches = 0,
  atY: Inches = 0,
): boolean => {
  const a = moving.box
  const b = still.box
  const isApart =
    a.left + atX + Math.min(0, dx) > b.right + clearance ||
    a.right + atX + Math.max(0, dx) < b.left - clearance ||
    a.bottom + atY + Math.min(0, dy) > b.top + clearance ||
    a.top + atY + Math.max(0, dy) < b.bottom - clearance
  if (isApart) return false
  return (
    meetsStill(moving, still, clearance, false, atX, atY) ||
    pointsEnter(moving, still, atX, atY, dx, dy, clearance) ||
    pointsEnter(still, moving, 0 - atX, 0 - atY, 0 - dx, 0 - dy, clearance)
  )
}
