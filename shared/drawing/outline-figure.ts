import type { Mark, StripLayout } from '#shared/ends/end-layout'
import type { Side } from '#shared/ends/end.schema'
import type { Bounds } from '#shared/geometry/bounds'
import type { Strip } from '#shared/strip/strip.schema'
import type { DisplayItem, DisplayList, Point } from './display-list'
import {
  drawBreaks,
  drawCreases,
  drawCutAways,
  drawOpenings,
  drawSheet,
  drawTabs,
} from './outline-parts'
import type { OutlinePlace } from './outline-place'
import { placeEnd, placeWhole } from './outline-place'
import { spread } from './spread'
import { letter, path, text } from './strip-items'
import { TEXT_HEIGHT, textWidth } from './text-box'

/** Words and numbers come from the caller, in the person's units and language. */
export interface OutlineLabels {
  /** A place on the strip, inches as text: a crease, a mark. */
  readonly length: (inches: number) => string
  /** The length of the blank as text. */
  readonly run: (inches: number) => string
  /** What stands over an end: `left end`, `right end, low`. */
  readonly end: (side: Side) => string
}

export interface OutlineOptions {
  /** The frame in pixels (or points). */
  readonly width: number
  readonly height: number
  readonly labels: OutlineLabels
  /** One end enlarged, with the marking table's dimensions; absent: the whole strip. */
  readonly side?: Side
  readonly textSize?: number
}

export interface OutlineFigure {
  readonly display: DisplayList
  /** Pixels an inch. */
  readonly scale: number
  /** Marks whose figures found no room; the marking table has them. */
  readonly leftOut: readonly Mark[]
}

const within = (low: number, value: number, high: number): number =>
  Math.min(high, Math.max(low, value))

const sizeOf = ({ width, height, textSize }: OutlineOptions): number =>
  textSize ?? within(9, Math.min(width / 30, height / 16), 15)

const drawStrip = (layout: StripLayout, strip: Strip, place: OutlinePlace): DisplayItem[] =>
  place.shown.flatMap((part) => {
    const ends = [
      ...(part.from === 0 ? [layout.left] : []),
      ...(part.to === layout.blankLength ? [layout.right] : []),
    ]
    return [
      ...drawSheet(layout, part),
      ...ends.flatMap((end) => [
        ...drawCutAways(end, layout, part),
        ...drawOpenings(end, layout, strip, part),
      ]),
      ...drawCreases(strip, layout, part),
      ...ends.flatMap((end) => drawTabs(end, part)),
      ...drawBreaks(layout, part),
    ]
  })

const arrowHead = (tip: Point, way: Point, size: number): DisplayItem => {
  const length = Math.hypot(way.x, way.y) || 1
  const [x, y] = [way.x / length, way.y / length]
  return {
    ...path(
      'dimension',
      [
        tip,
        { x: tip.x - x * size - y * size * 0.35, y: tip.y - y * size + x * size * 0.35 },
        { x: tip.x - x * size + y * size * 0.35, y: tip.y - y * size - x * size * 0.35 },
      ],
      0,
    ),
    closed: true,
    filled: true,
  }
}

/** A dimension line with its heads; too short for both, it is a bare line. */
const dimensionLine = (from: Point, to: Point, head: number): DisplayItem[] => {
  const length = Math.hypot(to.x - from.x, to.y - from.y)
  const way = { x: to.x - from.x, y: to.y - from.y }
  const heads =
    length < head * 2.5
      ? []
      : [arrowHead(to, way, head), arrowHead(from, { x: 0 - way.x, y: 0 - way.y }, head)]
  return [path('dimension', [from, to], 1), ...heads]
}

/** A text that fits into the room, smaller if it must be; undefined where it does not. */
const fitText = (content: string, room: number, size: number): number | undefined =>
  [1, 0.85, 0.7]
    .map((part) => size * part)
    .find((one) => one >= 7 && textWidth(content, one) <= room)

/**
 * The strip as it is cut, to scale both ways: left side up, edge A below. What is cut away is
 * dotted, tabs and opened hems are hatched, creases dashed with a triangle for their turn. Figures
 * stand outside the strip in rows and columns of their own, so that they never meet each other or
 * the drawing at any size; what finds no room there is left out and named in `leftOut`.
 */
export const outlineFigure = (
  layout: StripLayout,
  strip: Strip,
  options: OutlineOptions,
): OutlineFigure =>
  options.side === undefined
    ? wholeStrip(layout, strip, options)
    : oneEnd(layout, strip, options, options.side)

const wholeStrip = (layout: StripLayout, strip: Strip, options: OutlineOptions): OutlineFigure => {
  const { width, height, labels } = options
  const size = sizeOf(options)
  const row = size * 1.5
  const across = labels.length(layout.stripWidth)
  const column = textWidth(across, size) + size * 1.8
  const box = { minX: size * 2.2, maxX: width - column, minY: row, maxY: height - row * 1.5 }
  if (!isRoom(box)) return emptyFigure(options)
  const place = placeWhole(layout, box)
  const { sheet } = place
  const runSize = fitText(labels.run(layout.blankLength), sheet.maxX - sheet.minX - 8, size)
  const below = sheet.maxY + row * 0.45
  const beside = sheet.maxX + size * 0.6
  const middleY = (sheet.minY + sheet.maxY) / 2
  const items: DisplayItem[] = [
    ...drawStrip(layout, strip, place),
    ...dimensionLine({ x: sheet.minX, y: below }, { x: sheet.maxX, y: below }, size * 0.5),
    ...dimensionLine({ x: beside, y: sheet.maxY }, { x: beside, y: sheet.minY }, size * 0.5),
    text(
      'dimensionText',
      across,
      { x: beside + size * 0.5 + textWidth(across, size) / 2, y: middleY },
      size,
    ),
    ...(runSize === undefined
      ? []
      : [
          text(
            'dimensionText',
            labels.run(layout.blankLength),
            { x: (sheet.minX + sheet.maxX) / 2, y: below + runSize },
            runSize,
          ),
        ]),
    ...edgeLetters(sheet, sheet.minX - size * 1.1, size),
    ...endWords(sheet, labels, size),
  ]
  return { display: { width, height, items }, scale: place.scale, leftOut: [] }
}

/** A and B before their edges, where the strip is tall enough for both circles. */
const edgeLetters = ({ minY, maxY }: Bounds, x: number, size: number): DisplayItem[] => {
  const small = size * 0.85
  const apart = maxY - minY
  const y =
    apart >= small * 1.5
      ? [maxY, minY]
      : [(minY + maxY) / 2 + small * 0.75, (minY + maxY) / 2 - small * 0.75]
  return [
    ...letter('A', { x, y: y[0] ?? maxY }, small),
    ...letter('B', { x, y: y[1] ?? minY }, small),
  ]
}

/** What each end is, over it; both or neither, in one size. */
const endWords = (sheet: Bounds, labels: OutlineLabels, size: number): DisplayItem[] => {
  const [left, right] = [labels.end('left'), labels.end('right')]
  const room = sheet.maxX - sheet.minX
  const fitting = fitText(`${left}  ${right}`, room, size)
  if (fitting === undefined) return []
  const y = sheet.minY - size * 0.85
  return [
    text('edge', left, { x: sheet.minX + textWidth(left, fitting) / 2, y }, fitting),
    text('edge', right, { x: sheet.maxX - textWidth(right, fitting) / 2, y }, fitting),
  ]
}

const isRoom = (box: Bounds): boolean => box.maxX - box.minX >= 24 && box.maxY - box.minY >= 12

const emptyFigure = ({ width, height }: OutlineOptions, leftOut: readonly Mark[] = []) => ({
  display: { width, height, items: [] },
  scale: 0,
  leftOut,
})

/** A column of figures beside the strip, each tied to its height on the strip by a thin line. */
const figureColumn = (
  figures: readonly { readonly text: string; readonly y: number }[],
  column: { readonly x: number; readonly sheetX: number; readonly height: number },
  size: number,
): DisplayItem[] | undefined => {
  const step = size * TEXT_HEIGHT
  // Edge B is on top: heights rise from the last mark to the first.
  const rising = figures.toReversed()
  const places = spread(
    rising.map(({ y }) => y),
    step,
    step / 2,
    column.height - step / 2,
  )
  if (!places) return undefined
  const toStrip = Math.sign(column.sheetX - column.x)
  return rising.flatMap((figure, index): DisplayItem[] => {
    const y = places[index] ?? figure.y
    const half = textWidth(figure.text, size) / 2
    const tie = { x: column.x + toStrip * (half + 2), y }
    const knee = column.sheetX - toStrip * size * 0.4
    return [
      text('dimensionText', figure.text, { x: column.x, y }, size),
      path('dimension', [tie, { x: knee, y: figure.y }, { x: column.sheetX, y: figure.y }], 0.75),
    ]
  })
}

const oneEnd = (
  layout: StripLayout,
  strip: Strip,
  options: OutlineOptions,
  side: Side,
): OutlineFigure => {
  const { width, height, labels } = options
  const { marks } = layout[side]
  const wanted = sizeOf(options)
  for (const size of [wanted, wanted * 0.85, wanted * 0.7].filter((one) => one >= 7)) {
    const widest = (texts: readonly string[]): number =>
      Math.max(...texts.map((one) => textWidth(one, size)))
    const ats = marks.map(({ at }) => labels.length(at))
    const alongs = marks.map(({ along }) => labels.length(along))
    const gap = size * 1.6
    const [atWidth, alongWidth] = [widest(ats), widest(alongs)]
    const [before, after] = side === 'left' ? [alongWidth, atWidth] : [atWidth, alongWidth]
    // The letters stand beyond the column of the broken side.
    const letters = size * 1.9
    const box = {
      minX: before + gap + 4 + (side === 'right' ? letters : 0),
      maxX: width - after - gap - 4 - (side === 'left' ? letters : 0),
      minY: size * 1.8,
      maxY: height - size,
    }
    if (!isRoom(box)) continue
    const place = placeEnd(layout, side, box)
    const { sheet } = place
    const heights = marks.map(({ at }) => sheet.maxY - at * place.scale)
    const endX = side === 'left' ? sheet.minX : sheet.maxX
    const brokenX = side === 'left' ? sheet.maxX : sheet.minX
    const outward = side === 'left' ? -1 : 1
    const figuresOf = (texts: readonly string[]) =>
      texts.map((content, index) => ({ text: content, y: heights[index] ?? 0 }))
    const alongColumn = figureColumn(
      figuresOf(alongs),
      { x: endX + outward * (gap + alongWidth / 2), sheetX: endX + outward * 2, height },
      size,
    )
    const atColumn = figureColumn(
      figuresOf(ats),
      { x: brokenX - outward * (gap + atWidth / 2), sheetX: brokenX - outward * 5, height },
      size,
    )
    if (!alongColumn || !atColumn) continue
    const letterX =
      side === 'left' ? brokenX + gap + atWidth + size * 1.1 : brokenX - gap - atWidth - size * 1.1
    const title = labels.end(side)
    const titleSize = fitText(title, sheet.maxX - sheet.minX, size)
    return {
      display: {
        width,
        height,
        items: [
          ...drawStrip(layout, strip, place),
          ...blankEnd(endX, sheet),
          ...marks.flatMap((mark, index) =>
            depthLine(mark, heights[index] ?? 0, endX, outward, place),
          ),
          ...alongColumn,
          ...atColumn,
          ...edgeLetters(sheet, letterX, size),
          ...(titleSize === undefined
            ? []
            : [
                text(
                  'edge',
                  title,
                  {
                    x: (sheet.minX + sheet.maxX) / 2,
                    y: Math.max(size * 0.6, sheet.minY - size * 0.9),
                  },
                  titleSize,
                ),
              ]),
        ],
      },
      scale: place.scale,
      leftOut: [],
    }
  }
  return bareEnd(layout, strip, options, side)
}

/** The square end of the blank, from which the depths are measured. */
const blankEnd = (x: number, { minY, maxY }: Bounds): DisplayItem[] => [
  {
    ...path(
      'dimension',
      [
        { x, y: minY },
        { x, y: maxY },
      ],
      0.75,
    ),
    dash: [1, 3],
  },
]

/** From the blank's square end to a mark. */
const depthLine = (
  { along }: Mark,
  y: number,
  endX: number,
  outward: number,
  { scale }: OutlinePlace,
): DisplayItem[] => {
  const length = along * scale
  if (length < 1) return []
  return dimensionLine({ x: endX, y }, { x: endX - outward * length, y }, Math.min(6, length / 3))
}

/** Without its figures, where a frame is too small for them. */
const bareEnd = (
  layout: StripLayout,
  strip: Strip,
  options: OutlineOptions,
  side: Side,
): OutlineFigure => {
  const { width, height } = options
  const box = { minX: 4, maxX: width - 4, minY: 4, maxY: height - 4 }
  if (!isRoom(box)) return emptyFigure(options, layout[side].marks)
  const place = placeEnd(layout, side, box)
  return {
    display: { width, height, items: drawStrip(layout, strip, place) },
    scale: place.scale,
    leftOut: layout[side].marks,
  }
}
