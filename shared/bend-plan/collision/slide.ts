import { TOLERANCE } from '#shared/geometry/tolerance'
import { vector } from '#shared/geometry/vector'
import type { Inches } from '#shared/units/brands'
import { boxesMeet } from './outline'
import type { Outline } from './outline'
import { areFarApart, segmentToSegment } from './segment-distance'
import { meetsStill } from './still'

const pointsEnter = (
  points: Outline,
  sides: Outline,
  dx: Inches,
  dy: Inches,
  clearance: Inches,
): boolean =>
  points.points.some((point) => {
    const end = vector(point.x + dx, point.y + dy)
    return sides.sides.some(
      ({ a, b }) =>
        !areFarApart(point, end, a, b, clearance) &&
        segmentToSegment(point, end, a, b) < clearance - TOLERANCE,
    )
  })

/**
 * Whether an outline moved straight by (dx, dy) meets a still one: within the clearance at the start,
 * or nearer than it on the way. Exact, as for a swing; a point's path is a segment.
 */
export const meetsSliding = (
  moving: Outline,
  still: Outline,
  dx: Inches,
  dy: Inches,
  clearance: Inches,
): boolean =>
  boxesMeet(moving.box, still.box, clearance, dx, dy) &&
  (meetsStill(moving, still, clearance) ||
    pointsEnter(moving, still, dx, dy, clearance) ||
    pointsEnter(still, moving, 0 - dx, 0 - dy, clearance))
