import type { StripLayout, StripPoint } from '#shared/ends/end-layout'
import type { Side } from '#shared/ends/end.schema'
import type { Bounds } from '#shared/geometry/bounds'
import type { Inches } from '#shared/units/brands'
import type { Point } from './display-list'

/**
 * Where a strip's outline lies in its frame: t to the right, edge A below, edge B above, so that it
 * lies as on the bench. A strip too long for the frame is broken in its middle; both parts keep the
 * scale.
 */
export interface OutlinePlace {
  /** Pixels an inch, both ways. */
  readonly scale: number
  /** The parts that are shown; one where nothing is left out. */
  readonly shown: readonly OutlinePart[]
  /** The blank in the frame, break included. */
  readonly sheet: Bounds
}

/** A part of the blank that is shown. */
export interface OutlinePart {
  /** In inches along the blank. */
  readonly from: Inches
  readonly to: Inches
  readonly toFrame: (point: StripPoint) => Point
}

/** How far a dressed end reaches into the piece: its cut, its tabs and what is opened of a hem. */
export const depthOfEnd = (layout: StripLayout, side: Side): Inches => {
  const end = layout[side]
  const fromEnd = ({ along }: StripPoint): Inches =>
    side === 'left' ? along : layout.blankLength - along
  return Math.max(
    0,
    ...end.marks.map(({ along }) => along),
    ...end.tabs.flatMap(({ polygon }) => polygon.map(fromEnd)),
    ...end.cutAways.flatMap((polygon) => polygon.map(fromEnd)),
    ...end.slits.flatMap(({ from, to }) => [fromEnd(from), fromEnd(to)]),
    ...end.openings.map(({ length }) => length),
  )
}

/** Shown behind the deepest place of an end, at least, in parts of the strip's width. */
const BEHIND = 0.35
/** The white between two broken parts, in pixels. */
export const BREAK_GAP = 26

/** The whole strip in a box, broken where it is too long to be shown to scale. */
export const placeWhole = (layout: StripLayout, box: Bounds): OutlinePlace => {
  const { blankLength, stripWidth } = layout
  const [wide, tall] = [box.maxX - box.minX, box.maxY - box.minY]
  const behind = BEHIND * stripWidth
  const left = Math.min(blankLength / 2, depthOfEnd(layout, 'left') + behind)
  const right = Math.min(blankLength / 2, depthOfEnd(layout, 'right') + behind)
  const scale = Math.min(
    tall / stripWidth,
    Math.max(wide / blankLength, (wide - BREAK_GAP) / (left + right)),
  )
  const isWhole = blankLength * scale <= wide + 1e-6
  const width = isWhole ? blankLength * scale : wide
  // What room the scale leaves over shows more of both parts.
  const room = isWhole ? 0 : (wide - BREAK_GAP) / scale
  const leftTo = isWhole ? blankLength : (room * left) / (left + right)
  const rightFrom = blankLength - (room - leftTo)
  const minX = (box.minX + box.maxX - width) / 2
  const minY = (box.minY + box.maxY - stripWidth * scale) / 2
  const sheet = { minX, maxX: minX + width, minY, maxY: minY + stripWidth * scale }
  const fromLeft = (point: StripPoint): Point => ({
    x: sheet.minX + point.along * scale,
    y: sheet.maxY - point.at * scale,
  })
  const fromRight = (point: StripPoint): Point => ({
    x: sheet.maxX - (blankLength - point.along) * scale,
    y: sheet.maxY - point.at * scale,
  })
  return {
    scale,
    sheet,
    shown: isWhole
      ? [{ from: 0, to: blankLength, toFrame: fromLeft }]
      : [
          { from: 0, to: leftTo, toFrame: fromLeft },
          { from: rightFrom, to: blankLength, toFrame: fromRight },
        ],
  }
}

/** One end as large as the box allows, broken off behind its deepest place. */
export const placeEnd = (layout: StripLayout, side: Side, box: Bounds): OutlinePlace => {
  const { blankLength, stripWidth } = layout
  const [wide, tall] = [box.maxX - box.minX, box.maxY - box.minY]
  const least = Math.min(blankLength, depthOfEnd(layout, side) + BEHIND * stripWidth)
  const scale = Math.min(tall / stripWidth, wide / least)
  const shown = Math.min(blankLength, wide / scale)
  const minY = (box.minY + box.maxY - stripWidth * scale) / 2
  const sheet = {
    minX: side === 'left' ? box.minX : box.maxX - shown * scale,
    maxX: side === 'left' ? box.minX + shown * scale : box.maxX,
    minY,
    maxY: minY + stripWidth * scale,
  }
  const from = side === 'left' ? 0 : blankLength - shown
  return {
    scale,
    sheet,
    shown: [
      {
        from,
        to: from + shown,
        toFrame: ({ along, at }) => ({
          x: sheet.minX + (along - from) * scale,
          y: sheet.maxY - at * scale,
        }),
      },
    ],
  }
}
