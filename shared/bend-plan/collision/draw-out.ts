import { isAtMost } from '#shared/geometry/tolerance'
import type { Inches } from '#shared/units/brands'
import type { OpenTools } from './open-tools'
import { movedOutline } from './outline'
import type { Outline } from './outline'
import { meetsSliding } from './slide'

/** Forward slides tried before the clamp opens. Inches. */
const SLIDES = [0, 0.25, 0.5, 1, 2, 4]

/** The piece is out when its rear is this far in front of the bend line. Inches. */
const OUT = 2

/**
 * Whether a piece lying in the clamp can be drawn out to the front (and so, backwards, put in):
 * forward a little, the clamp opens by the rear's height above and depth below the sheet, then all
 * the way out. Moves are swept against inner and outer tool.
 */
export const canDrawOut = (
  rear: Outline,
  front: Outline | undefined,
  { inner, outer }: OpenTools,
  opening: Inches,
  clearance: Inches,
): boolean => {
  const height = Math.max(0, rear.box.top)
  const depth = Math.max(0, 0 - rear.box.bottom)
  if (!isAtMost(height + depth, opening)) return false
  const parts = front === undefined ? [rear] : [rear, front]
  const raised = movedOutline(inner, 0, height)
  const lowered = movedOutline(outer, 0, 0 - depth)

  for (const slide of SLIDES) {
    if (
      parts.some(
        (part) =>
          meetsSliding(part, inner, slide, 0, clearance) ||
          meetsSliding(part, outer, slide, 0, clearance),
      )
    ) {
      return false
    }
    const moved = parts.map((part) => movedOutline(part, slide, 0))
    const further = Math.max(0, OUT - rear.box.left - slide)
    const isFree = moved.every(
      (part) =>
        // Seen from the tool, the piece goes down as the inner tool lifts, and up as the outer drops.
        !meetsSliding(part, inner, 0, 0 - height, clearance) &&
        !meetsSliding(part, outer, 0, depth, clearance) &&
        !meetsSliding(part, raised, further, 0, clearance) &&
        !meetsSliding(part, lowered, further, 0, clearance),
    )
    if (isFree) return true
  }
  return false
}
