import type { StripLayout } from '#shared/ends/end-layout'
import type { Side } from '#shared/ends/end.schema'
import type { Strip } from '#shared/strip/strip.schema'
import { metalOf } from './clearance'
import type { DisplayItem, DisplayList, Part } from './display-list'
import { isSamePart } from './display-list'
import type { LabelSpace, PlacedLabel } from './label-space'
import type { Column, MarkFigures } from './outline-columns'
import { COLUMN_LEAD, columnOf, markFigures } from './outline-columns'
import type { DrawnCrease, DrawnOutline } from './outline-items'
import { drawnCreases, drawOutline } from './outline-items'
import type { OutlineLabel, OutlineNumber } from './outline-labels'
import {
  blankLabels,
  edgeLabels,
  endLabel,
  handLabel,
  turnLabels,
  workLabels,
} from './outline-labels'
import type { OutlineView, Room } from './outline-view'
import { endView, wholeView } from './outline-view'
import { penFor } from './pen'
import { placeLabels, streamOf } from './placement'
import { partOfCrease } from './strip-figure'
import { dashed } from './strip-items'
import { textWidth } from './text-box'

/** Words and numbers come from the caller, in the person's units and language. */
export interface OutlineLabels {
  /** A place on the strip, inches as text: a crease, a mark. */
  readonly length: (inches: number) => string
  /** The length of the blank as text. */
  readonly run: (inches: number) => string
  /** What stands over an end: `left end`, `right end, low`. */
  readonly end: (side: Side) => string
  /** The signed turn of a bend as text; without it creases carry a triangle alone. */
  readonly angle?: (turn: number) => string
  /** A tab's length as text, where it should say that it is a tab. */
  readonly tab?: (inches: number) => string
  /** The length over which a hem is opened as text, where it should say so. */
  readonly opening?: (inches: number) => string
}

export interface OutlineOptions {
  /** The frame in pixels (or points). */
  readonly width: number
  readonly height: number
  readonly labels: OutlineLabels
  /** One end enlarged, with the marking table's dimensions; absent: the whole strip. */
  readonly side?: Side
  /** The letter of the piece's hand. */
  readonly hand?: string
  readonly selected?: Part | null
  readonly textSize?: number
}

export interface OutlineFigure {
  readonly display: DisplayList
  /** Pixels an inch. */
  readonly scale: number
  /** What found no room; the caller prints it as a table. */
  readonly leftOut: readonly OutlineNumber[]
}

const within = (low: number, value: number, high: number): number =>
  Math.min(high, Math.max(low, value))

const sizeOf = ({ width, height, textSize }: OutlineOptions): number =>
  textSize ?? within(9, Math.min(width / 30, height / 16), 15)

const SMALLEST_TEXT = 7

/** Type sizes tried one after another until everything has room. */
const SIZES = [1, 0.85, 0.7]

/**
 * The strip as it is cut, to scale both ways: left side up, edge A below. The blank's border is
 * dotted where it is cut away, tabs and hems are hatched, opened hems strong along their edge,
 * creases dashed where they fold up and dashed and dotted where they fold down, with their turn on
 * the line. One end carries the marking table: distances from edge A beyond the break, distances
 * from the blank's square end beyond that. The whole strip is broken where it is long.
 *
 * No figure or word touches another, a line of the drawing or the frame, at any size; what finds no
 * room is named in `leftOut`. Same input, same list.
 */
export const outlineFigure = (
  layout: StripLayout,
  strip: Strip,
  options: OutlineOptions,
): OutlineFigure => {
  const wanted = sizeOf(options)
  const sizes = SIZES.map((part) => Math.max(Math.min(wanted, SMALLEST_TEXT), wanted * part))
  let best: OutlineFigure | undefined
  for (const size of sizes) {
    const figure = figureAt(layout, strip, options, size)
    if (best === undefined || figure.leftOut.length < best.leftOut.length) best = figure
    // Smaller type has no need to be tried for turns alone: the strip figure has them too.
    if (best.leftOut.every(({ of }) => of === 'turn')) break
  }
  if (best === undefined) throw new Error('No type size was tried.')
  return best
}

const figureAt = (
  layout: StripLayout,
  strip: Strip,
  options: OutlineOptions,
  size: number,
): OutlineFigure => {
  const { width, height, side } = options
  const view =
    side === undefined
      ? wholeView(layout, options, wholeRoom(layout, options, size), size)
      : endView(layout, side, options, endRoom(layout, side, options, size), size)
  const outline = drawOutline(layout, strip, view)
  const creases = drawnCreases(layout, strip, view)
  const figures =
    side === undefined
      ? undefined
      : markFigures(layout, side, view, strip.creases.map(partOfCrease), options.labels.length)
  const columns = figures && side ? columnsOf(figures, view, side, options) : []
  const labels = labelsOf(layout, view, outline, creases, options)
  const fixed = columns.map(({ column }) => ({ weight: 100, streams: [streamOf([column.taken])] }))
  const placed = placeLabels<PlacedLabel>([...fixed, ...labels]).slice(fixed.length)
  // A turn may be shown as a triangle without its text.
  const missing = labels.filter(
    ({ meaning }, index) => meaning.text !== '' && placed[index]?.text !== meaning.text,
  )
  const items: DisplayItem[] = [
    ...outline.under,
    ...drawCreases(creases, labels, placed),
    ...outline.over,
    ...(figures ? drawDots(figures, view) : []),
    ...columns.flatMap(({ column }) => column.items),
    ...labels.flatMap(({ draw }, index) => {
      const label = placed[index]
      return label ? draw(label) : []
    }),
  ]
  return {
    display: { width, height, items: markSelected(items, options.selected ?? null) },
    scale: view.scale,
    leftOut: [...columns.flatMap(leftOutOfColumn), ...missing.map(({ meaning }) => meaning)],
  }
}

/** What the dimensions of opened hems need above and below the strip. */
const openingRoom = (layout: StripLayout, sides: readonly Side[], size: number) => {
  const has = (edge: 'A' | 'B') =>
    sides.some((side) => layout[side].openings.some((opening) => opening.edge === edge))
  return { top: has('B') ? size * 1.6 : 0, bottom: has('A') ? size * 1.6 : 0 }
}

/** Letters at the left, the width at the right, words above, the length below. */
const wholeRoom = (layout: StripLayout, { labels }: OutlineOptions, size: number): Room => {
  const opened = openingRoom(layout, ['left', 'right'], size)
  return {
    left: size * 2.2,
    right: size * 2.2 + textWidth(labels.length(layout.stripWidth), size),
    top: size * 2 + opened.top,
    bottom: size * 2.8 + opened.bottom,
  }
}

const widest = (texts: readonly string[], size: number): number =>
  Math.max(0, ...texts.map((one) => textWidth(one, size)))

/** The depths beyond the blank's end, the distances from edge A beyond the break. */
const endRoom = (
  layout: StripLayout,
  side: Side,
  { labels }: OutlineOptions,
  size: number,
): Room => {
  const { marks } = layout[side]
  const lead = COLUMN_LEAD * size + 6
  const columnFor = (of: 'at' | 'along') => {
    const texts = marks.map((mark) => labels.length(mark[of]))
    return lead + widest(texts, size)
  }
  const [end, inner] = [columnFor('along'), columnFor('at')]
  const opened = openingRoom(layout, [side], size)
  return {
    left: side === 'left' ? end : inner,
    right: side === 'left' ? inner : end,
    top: size * 2 + opened.top,
    bottom: size * 2 + opened.bottom,
  }
}

interface NamedColumn {
  readonly of: 'at' | 'along'
  readonly column: Column
}

/** The columns that lie in the frame; one that would not is left out as a whole. */
const columnsOf = (
  figures: MarkFigures,
  view: OutlineView,
  side: Side,
  { width, height }: OutlineOptions,
): NamedColumn[] => {
  const out = side === 'left' ? -1 : 1
  const sides = [
    { of: 'along' as const, towards: out } as const,
    { of: 'at' as const, towards: out === 1 ? -1 : 1 } as const,
  ]
  return sides.map(({ of, towards }) => {
    const texts = figures[of].map(({ text }) => text)
    const reach = COLUMN_LEAD * view.text + widest(texts, view.text)
    const from = figures[of][0]?.from.x ?? 0
    const isIn = towards === 1 ? from + reach <= width - 1 : from - reach >= 1
    return { of, column: columnOf(figures[of], towards, view.text, isIn ? height : 0) }
  })
}

const leftOutOfColumn = ({ of, column }: NamedColumn): OutlineNumber[] =>
  column.leftOut.map(({ text, part }) => ({ of, text, part }))

/** A dot where each mark is pricked. */
const drawDots = ({ dots }: MarkFigures, view: OutlineView): DisplayItem[] =>
  dots.map(({ part, at }) => ({
    kind: 'circle',
    role: 'mark',
    part,
    center: at,
    radius: Math.min(2.4, view.text / 5),
    width: 0,
    filled: true,
  }))

const labelsOf = (
  layout: StripLayout,
  view: OutlineView,
  outline: DrawnOutline,
  creases: readonly DrawnCrease[],
  options: OutlineOptions,
): OutlineLabel[] => {
  const { width, height, labels, side, hand } = options
  const frame = { minX: 1, minY: 1, maxX: width - 1, maxY: height - 1 }
  const pen = penFor(width, height, view.text)
  const offCreases: LabelSpace = { metal: metalOf(outline.lines, 1), frame, pen }
  const space = { ...offCreases, bars: creases }
  const work = {
    tab: labels.tab ?? labels.length,
    opening: labels.opening ?? labels.length,
  }
  return [
    ...(side === undefined
      ? [
          ...blankLabels(layout, view, space, {
            length: labels.run(layout.blankLength),
            width: labels.length(layout.stripWidth),
          }),
          endLabel(view, space, 'left', labels.end('left')),
          endLabel(view, space, 'right', labels.end('right')),
        ]
      : [endLabel(view, space, side, labels.end(side))]),
    ...edgeLabels(layout, view, space, side),
    ...(hand === undefined ? [] : [handLabel(view, space, hand)]),
    ...workLabels(layout, view, space, work),
    ...turnLabels(creases, offCreases, view.text * 0.8, labels.angle ?? (() => '')),
  ]
}

const DASHES = { up: [6, 4], down: [9, 3, 2, 3] }

/** Creases as dashes, interrupted where their turn stands on them. */
const drawCreases = (
  creases: readonly DrawnCrease[],
  labels: readonly OutlineLabel[],
  placed: readonly (PlacedLabel | undefined)[],
): DisplayItem[] => {
  const turns = new Map(labels.map(({ crease }, index) => [crease, placed[index]]))
  return creases.flatMap(({ index, crease, part, y, from, to }) => {
    const dash = crease.turn > 0 ? DASHES.up : DASHES.down
    const [minX = to, , maxX = to] = turns.get(index)?.boxes ?? []
    const isHere = minX < to && maxX > from
    const pieces = isHere
      ? [
          [from, minX - 2],
          [maxX + 2, to],
        ]
      : [[from, to]]
    return pieces.map(([a = from, b = to]) => {
      const points = [
        { x: a, y },
        { x: b, y },
      ]
      return dashed('crease', points, 1.3, dash, part)
    })
  })
}

const markSelected = (items: readonly DisplayItem[], selected: Part | null): DisplayItem[] =>
  items.map((item) =>
    selected !== null && item.part && isSamePart(item.part, selected)
      ? { ...item, role: 'selected' as const }
      : item,
  )
