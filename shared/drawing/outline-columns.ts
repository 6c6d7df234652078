import type { Mark, StripLayout } from '#shared/ends/end-layout'
import type { Side } from '#shared/ends/end.schema'
import { isEqual } from '#shared/geometry/tolerance'
import { metalReach } from './crease-spans'
import type { DisplayItem, Part, Point } from './display-list'
import type { PlacedLabel } from './label-space'
import type { OutlineView } from './outline-view'
import { windowOf, xIn, yOf } from './outline-view'
import { spreadAlong } from './strip-dimensions'
import { path, text } from './strip-items'
import { TEXT_HEIGHT, textWidth } from './text-box'

/** One figure of the marking table on its way into a column beside the strip. */
export interface ColumnFigure {
  readonly mark: Mark
  readonly part: Part
  readonly text: string
  /** Where its line leaves the strip, or the blank's square end. */
  readonly from: Point
  /** What is drawn from the mark to there. */
  readonly lead: readonly Point[]
}

export interface Column {
  readonly items: readonly DisplayItem[]
  /** Its texts and lines, for other labels to keep clear of. */
  readonly taken: PlacedLabel
  /** Figures that found no room. */
  readonly leftOut: readonly ColumnFigure[]
}

/** From the strip to the figures, in parts of the type size. */
export const COLUMN_LEAD = 2.2

/** Room between a line of figures and the next, in pixels. */
const LINE_GAP = 1.5

/** The figures that fit below each other: those nearest to their neighbors give way, edges last. */
const fitting = (figures: readonly ColumnFigure[], most: number): ColumnFigure[] => {
  const kept = [...figures]
  while (kept.length > Math.max(0, most)) {
    const gaps = kept.map((_, index) => {
      const [before, after] = [kept[index - 1], kept[index + 1]]
      return before && after ? after.from.y - before.from.y : Infinity
    })
    const nearest = Math.min(...gaps)
    kept.splice(nearest === Infinity ? kept.length - 1 : gaps.indexOf(nearest), 1)
  }
  return kept
}

/**
 * Figures in a column `towards` (-1: to the left, 1: to the right of) the strip, each tied to its
 * height on the strip; moved apart as little as may be. From the top of the frame to its bottom.
 */
export const columnOf = (
  figures: readonly ColumnFigure[],
  towards: 1 | -1,
  size: number,
  height: number,
): Column => {
  const step = size * TEXT_HEIGHT + LINE_GAP
  const falling = figures.toSorted((a, b) => a.from.y - b.from.y)
  const shown = fitting(falling, Math.floor((height - 4) / step))
  const places = spreadAlong(
    shown.map(({ from }) => from.y),
    shown.map(() => step),
    2,
    height - 2,
  )
  const items: DisplayItem[] = []
  const boxes: number[] = []
  const lines: number[] = []
  shown.forEach((figure, index) => {
    const { from, lead, part } = figure
    const y = places?.[index] ?? from.y
    const end = from.x + towards * (COLUMN_LEAD * size - size * 0.35)
    const knee = from.x + towards * size * 0.5
    const chain = [...lead, from, { x: knee, y: from.y }, { x: end, y }]
    const width = textWidth(figure.text, size)
    const x = from.x + towards * (COLUMN_LEAD * size + width / 2)
    const half = (size * TEXT_HEIGHT) / 2
    items.push(
      path('dimension', chain, 1, part),
      text('dimensionText', figure.text, { x, y }, size, part),
    )
    boxes.push(x - width / 2, y - half, x + width / 2, y + half)
    chain.slice(1).forEach((point, at) => {
      const before = chain[at] ?? point
      lines.push(before.x, before.y, point.x, point.y)
    })
  })
  return {
    items,
    taken: { text: '', size, radius: undefined, isDimension: false, boxes, lines, cost: 0 },
    leftOut: figures.filter((figure) => !shown.includes(figure)),
  }
}

const partOfMark = ({ of, crease }: Mark, parts: readonly Part[]): Part =>
  of === 'edgeA'
    ? { kind: 'edge', edge: 'A' }
    : of === 'edgeB'
      ? { kind: 'edge', edge: 'B' }
      : (parts[crease ?? 0] ?? { kind: 'edge', edge: 'A' })

export interface MarkFigures {
  /** Distances from edge A, beyond the break. */
  readonly at: readonly ColumnFigure[]
  /** Distances from the blank's square end, beyond that. */
  readonly along: readonly ColumnFigure[]
  /** The marks themselves. */
  readonly dots: readonly { readonly part: Part; readonly at: Point }[]
}

/**
 * The marks of an end with both their distances. The line of a depth runs from its mark to the
 * blank's square end; where a tab stands in its way, from the tab.
 */
export const markFigures = (
  layout: StripLayout,
  side: Side,
  view: OutlineView,
  parts: readonly Part[],
  length: (inches: number) => string,
): MarkFigures => {
  const window = windowOf(view, side)
  const out = side === 'left' ? -1 : 1
  const xEnd = xIn(view, window, side === 'left' ? 0 : layout.blankLength)
  const xInner = xIn(view, window, side === 'left' ? window.to : window.from)
  const figures = layout[side].marks.map((mark) => {
    const y = yOf(view, mark.at)
    const along = side === 'left' ? mark.along : layout.blankLength - mark.along
    const reach = metalReach(layout.outline, mark.at)
    const outermost = reach === undefined ? along : side === 'left' ? reach.from : reach.to
    const isFree = isEqual(outermost, along)
    const x = xIn(view, window, along)
    const xMetal = isFree ? x : xIn(view, window, outermost)
    return {
      mark,
      part: partOfMark(mark, parts),
      at: { x, y },
      // A mark at the blank's own end has nothing to measure.
      lead: Math.abs(xEnd - xMetal) > 3 ? [{ x: xMetal + out * (isFree ? 0 : 2), y }] : [],
      y,
    }
  })
  return {
    at: figures.map(({ mark, part, y }) => ({
      mark,
      part,
      text: length(mark.at),
      from: { x: xInner - out * 3, y },
      lead: [],
    })),
    along: figures.map(({ mark, part, y, lead }) => ({
      mark,
      part,
      text: length(mark.along),
      from: { x: xEnd + out * 2, y },
      lead,
    })),
    dots: figures.map(({ part, at }) => ({ part, at })),
  }
}
