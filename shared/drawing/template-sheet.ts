import type { StripLayout, StripPoint } from '#shared/ends/end-layout'
import type { Bounds } from '#shared/geometry/bounds'
import { grow } from '#shared/geometry/bounds'
import type { Segment } from '#shared/geometry/segment'
import { clipToBox, segment } from '#shared/geometry/segment'
import { clipBorder, clipPolygon } from './clip-polygon'
import type { DisplayItem, Point } from './display-list'
import { path } from './strip-items'
import type { Tile } from './template-tiles'
import { POINTS_PER_INCH } from './template-tiles'

/** A piece of paper with the part of the blank that lies under it; points. */
export interface Sheet {
  readonly tile: Tile
  /** The part of the paper that is drawn on. */
  readonly box: Bounds
  readonly place: (point: StripPoint) => Point
}

export const sheetOf = (tile: Tile, width: number, height: number): Sheet => ({
  tile,
  box: { minX: 0, minY: 0, maxX: width, maxY: height },
  place: ({ along, at }) => ({
    x: (along - tile.window.minX) * POINTS_PER_INCH,
    y: (tile.window.maxY - at) * POINTS_PER_INCH,
  }),
})

export const onPaper = (sheet: Sheet, points: readonly StripPoint[]): Point[] =>
  points.map(sheet.place)

export const showsMetal = (layout: StripLayout, sheet: Sheet): boolean =>
  clipPolygon(onPaper(sheet, layout.outline), sheet.box).length > 2

/** Lines of a weight are kept whole on the paper; a hundredth of a point is left to rounding. */
export const insidePaper = (sheet: Sheet, weight: number): Bounds =>
  grow(sheet.box, -0.01 - weight / 2)

/** The border of a polygon as far as it lies on the paper. */
export const bordersOn = (
  sheet: Sheet,
  polygon: readonly StripPoint[],
  weight: number,
): Point[][] => clipBorder(onPaper(sheet, polygon), insidePaper(sheet, weight))

/** A line as far as it lies on the paper. */
export const lineOn = (
  sheet: Sheet,
  from: StripPoint,
  to: StripPoint,
  weight: number,
): Segment | undefined =>
  clipToBox(segment(sheet.place(from), sheet.place(to)), insidePaper(sheet, weight))

/** A small upright cross; none where it would leave the paper. */
export const crossOn = (
  { box }: Sheet,
  role: 'mark' | 'dimension',
  { x, y }: Point,
  reach: number,
): DisplayItem[] => {
  const isOn =
    x - reach > box.minX && x + reach < box.maxX && y - reach > box.minY && y + reach < box.maxY
  if (!isOn) return []
  return [
    [
      { x: x - reach, y },
      { x: x + reach, y },
    ],
    [
      { x, y: y - reach },
      { x, y: y + reach },
    ],
  ].map((points) => path(role, points, 0.75))
}
