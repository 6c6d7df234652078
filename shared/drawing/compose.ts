import type { DisplayItem, DisplayList, Point } from './display-list'

/** A place on a sheet: pixels (or points) from its top left corner, y down. */
export interface DrawingBox {
  readonly x: number
  readonly y: number
  readonly width: number
  readonly height: number
}

export interface PlacedDisplay {
  readonly display: DisplayList
  /** Where its top left corner lies. */
  readonly at: Point
}

const moved = (item: DisplayItem, { x, y }: Point): DisplayItem => {
  const shift = (point: Point): Point => ({ x: point.x + x, y: point.y + y })
  switch (item.kind) {
    case 'path':
      return { ...item, points: item.points.map(shift) }
    case 'circle':
      return { ...item, center: shift(item.center) }
    case 'text':
      return { ...item, at: shift(item.at) }
  }
}

/** Several drawings on one sheet, unscaled, those that come later on top. */
export const composeDisplays = (
  { width, height }: Pick<DisplayList, 'width' | 'height'>,
  placed: readonly PlacedDisplay[],
): DisplayList => ({
  width,
  height,
  items: placed.flatMap(({ display, at }) => display.items.map((item) => moved(item, at))),
})
