import type { Vector } from '#shared/geometry/vector'
import type { Point } from '#shared/drawing/display-list'
import type { FrameView } from '#shared/drawing/section-view'
import type { Placement } from '../model/board-document'
import { toFrame, type Viewport } from '../model/viewport'

/** How a figure must lie in the frame so that its piece is placed on the sheet as drawn. */
export const figureView = (viewport: Viewport, placement: Placement): FrameView => ({
  origin: toFrame(viewport, placement.origin),
  scale: viewport.scale,
  rotation: placement.heading,
})

/** The viewport of the sheet in which a figure was fitted. */
export const viewportOf = (view: FrameView, placement: Placement): Viewport => ({
  scale: view.scale,
  origin: {
    x: view.origin.x - placement.origin.x * view.scale,
    y: view.origin.y + placement.origin.y * view.scale,
  },
})

/** The corner nearest to a point of the canvas, if within reach. */
export function findCorner(
  corners: readonly Vector[],
  viewport: Viewport,
  at: Point,
  reach: number,
): number | null {
  const distances = corners.map((corner) => {
    const point = toFrame(viewport, corner)
    return Math.hypot(point.x - at.x, point.y - at.y)
  })
  const nearest = Math.min(...distances)
  return nearest <= reach ? distances.indexOf(nearest) : null
}
