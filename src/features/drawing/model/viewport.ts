import { vector, type Vector } from '#shared/geometry/vector'
import type { Point } from '#shared/drawing/display-list'

/** How the drawing sheet lies in the canvas: where its origin is (pixels) and pixels an inch. */
export interface Viewport {
  readonly origin: Point
  readonly scale: number
}

export interface Frame {
  readonly width: number
  readonly height: number
}

export const MIN_SCALE = 2
export const MAX_SCALE = 400

/** Room for dimensions and edge letters around the figure, in pixels. */
const MARGIN = 64

/** Inches shown across an empty board: wide enough for common trim, close enough for 1/8. */
const EMPTY_SPAN = 14

export const toFrame = (view: Viewport, point: Vector): Point => ({
  x: view.origin.x + point.x * view.scale,
  y: view.origin.y - point.y * view.scale,
})

export const toSheet = (view: Viewport, point: Point): Vector =>
  vector((point.x - view.origin.x) / view.scale, (view.origin.y - point.y) / view.scale)

/** Shows all the points, centred; a single point or none shows an empty board around it. */
export function fitViewport(points: readonly Vector[], frame: Frame): Viewport {
  const xs = points.map(({ x }) => x)
  const ys = points.map(({ y }) => y)
  const across = points.length > 1 ? Math.max(...xs) - Math.min(...xs) : 0
  const up = points.length > 1 ? Math.max(...ys) - Math.min(...ys) : 0
  const room = {
    width: Math.max(frame.width - 2 * MARGIN, 40),
    height: Math.max(frame.height - 2 * MARGIN, 40),
  }
  const scale =
    points.length > 1
      ? Math.min(room.width / Math.max(across, 1e-6), room.height / Math.max(up, 1e-6))
      : frame.width / EMPTY_SPAN
  const clear = Math.min(MAX_SCALE, Math.max(MIN_SCALE, scale))
  const middle =
    points.length > 0
      ? vector((Math.max(...xs) + Math.min(...xs)) / 2, (Math.max(...ys) + Math.min(...ys)) / 2)
      : vector(0, 0)
  return {
    scale: clear,
    origin: { x: frame.width / 2 - middle.x * clear, y: frame.height / 2 + middle.y * clear },
  }
}

/** Zooms about a point of the canvas, which stays where it is. */
export function zoomAbout(view: Viewport, at: Point, factor: number): Viewport {
  const scale = Math.min(MAX_SCALE, Math.max(MIN_SCALE, view.scale * factor))
  const ratio = scale / view.scale
  return {
    scale,
    origin: { x: at.x + (view.origin.x - at.x) * ratio, y: at.y + (view.origin.y - at.y) * ratio },
  }
}

export const panBy = (view: Viewport, dx: number, dy: number): Viewport => ({
  scale: view.scale,
  origin: { x: view.origin.x + dx, y: view.origin.y + dy },
})
