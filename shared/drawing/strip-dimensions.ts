import type { Bounds } from '#shared/geometry/bounds'
import type { Strip } from '#shared/strip/strip.schema'
import type { Inches } from '#shared/units/brands'
import type { DisplayItem, Part } from './display-list'
import { path, text } from './strip-items'
import { TEXT_HEIGHT, textWidth } from './text-box'

interface DimensionRoom {
  readonly toX: (at: number) => number
  /** Where the first mark may begin, below the strip. */
  readonly top: number
  readonly frame: Bounds
  readonly text: number
  readonly length: (inches: number) => string
}

/** Smallest type of a running dimension, pixels. */
const SMALLEST = 8

/** A place to be marked: its distance from edge A. */
export interface RunningMark {
  readonly part: Part
  readonly at: Inches
}

interface Mark extends RunningMark {
  readonly x: number
  readonly content: string
}

/**
 * Moves marks along a row so that each keeps its width and its order, and together they move as
 * little as can be (least squares, by pooling neighbors that push each other: isotonic
 * regression). Undefined when the row is too short for all of them.
 */
export const spreadAlong = (
  wanted: readonly number[],
  widths: readonly number[],
  from: number,
  to: number,
): number[] | undefined => {
  const total = widths.reduce((sum, width) => sum + width, 0)
  if (total > to - from) return undefined
  // Without their widths the marks only have to stay in order.
  const before: number[] = []
  widths.reduce((sum, width) => {
    before.push(sum + width / 2)
    return sum + width
  }, 0)
  const pools: { sum: number; count: number }[] = []
  wanted.forEach((x, index) => {
    let pool = { sum: x - (before[index] ?? 0), count: 1 }
    for (let last = pools.at(-1); last !== undefined; last = pools.at(-1)) {
      if (last.sum / last.count <= pool.sum / pool.count) break
      pools.pop()
      pool = { sum: last.sum + pool.sum, count: last.count + pool.count }
    }
    pools.push(pool)
  })
  const bases = pools.flatMap(({ sum, count }) => Array.from({ length: count }, () => sum / count))
  return bases.map((base, index) => {
    const kept = Math.min(Math.max(base, from), to - total)
    return kept + (before[index] ?? 0)
  })
}

const marksOf = (strip: Strip, room: DimensionRoom): Mark[] => {
  const mark = (at: Inches, part: Part): Mark => ({
    part,
    at,
    x: room.toX(at),
    content: room.length(at),
  })
  return [
    ...strip.creases.map(({ at, fold }) =>
      mark(
        at,
        fold === 'hemA'
          ? { kind: 'hem', edge: 'A' }
          : fold === 'hemB'
            ? { kind: 'hem', edge: 'B' }
            : { kind: 'bend', bend: fold },
      ),
    ),
    mark(strip.stripWidth, { kind: 'edge', edge: 'B' }),
  ]
}

/** Marks laid out in one row, all turned alike. */
interface Row {
  readonly marks: readonly Mark[]
  readonly places: readonly number[]
  readonly size: number
  readonly rotation: 0 | -90
}

/** Where the numbers of a row begin, and how tall they are. */
const heightOf = (marks: readonly Mark[], size: number, rotation: 0 | -90): number =>
  rotation === 0
    ? size * TEXT_HEIGHT
    : Math.max(0, ...marks.map((mark) => textWidth(mark.content, size)))

const textTopOf = (room: DimensionRoom, size: number): number => room.top + size * 1.2

const rowOf = (
  marks: readonly Mark[],
  room: DimensionRoom,
  size: number,
  rotation: 0 | -90,
): Row | undefined => {
  const { minX, maxX, maxY } = room.frame
  if (textTopOf(room, size) + heightOf(marks, size, rotation) > maxY) return undefined
  const widths = marks.map(({ content }) =>
    rotation === 0 ? textWidth(content, size) + 1.6 * size : size * TEXT_HEIGHT + 3,
  )
  const wanted = marks.map((mark) => mark.x)
  const places = spreadAlong(wanted, widths, minX, maxX)
  if (places === undefined) return undefined
  const shift = Math.max(0, ...places.map((x, index) => Math.abs(x - (wanted[index] ?? x))))
  // A number far from its crease is read against the wrong one.
  return rotation === 0 && shift > 3 * size ? undefined : { marks, places, size, rotation }
}

/** The marks without the one that stands closest between two others; edge B goes last. */
const withoutClosest = (marks: readonly Mark[]): readonly Mark[] => {
  const gaps = marks.map((_, index) => {
    const after = marks[index + 1]
    return after ? after.x - (marks[index - 1]?.x ?? 0) : Infinity
  })
  const closest = gaps.indexOf(Math.min(...gaps))
  return marks.filter((_, index) => index !== closest)
}

const drawRow = ({ marks, places, size, rotation }: Row, room: DimensionRoom): DisplayItem[] => {
  const textTop = textTopOf(room, size)
  return marks.flatMap((mark, index) => {
    const x = places[index] ?? mark.x
    const at = { x, y: textTop + heightOf(marks, size, rotation) / 2 }
    return [
      path(
        'dimension',
        [
          { x: mark.x, y: room.top },
          { x: mark.x, y: room.top + 3 },
          { x, y: textTop - 3 },
        ],
        1,
        mark.part,
      ),
      text('dimensionText', mark.content, at, size, mark.part, false, rotation),
    ]
  })
}

/** A type size that all numbers of a row may have, in parts of the one that is wanted. */
const sizeAt = (room: DimensionRoom, step: number): number =>
  Math.max(Math.min(room.text, SMALLEST), room.text * step)

/**
 * Distances from edge A under the strip, each with a line to its crease, at a type size of `step`
 * parts of the wanted one. The numbers lie where they all fit in one row and stand upright where
 * they do not; their lines never cross. Undefined where they do not fit.
 */
export const runningDimensions = (
  strip: Strip,
  room: DimensionRoom,
  step: number,
): DisplayItem[] | undefined => {
  const marks = marksOf(strip, room)
  const size = sizeAt(room, step)
  const row = rowOf(marks, room, size, 0) ?? rowOf(marks, room, size, -90)
  return row && drawRow(row, room)
}

/** As many of the running dimensions as fit upright at the smallest size, and those that do not. */
export const someRunningDimensions = (
  strip: Strip,
  room: DimensionRoom,
): { readonly items: DisplayItem[]; readonly leftOut: readonly RunningMark[] } => {
  const all = marksOf(strip, room)
  const size = sizeAt(room, 0)
  let marks: readonly Mark[] = all
  let row = rowOf(marks, room, size, -90)
  while (row === undefined && marks.length > 0) {
    marks = withoutClosest(marks)
    row = rowOf(marks, room, size, -90)
  }
  const shown = row?.marks ?? []
  return {
    items: row ? drawRow(row, room) : [],
    leftOut: all.filter((mark) => !shown.includes(mark)).map(({ part, at }) => ({ part, at })),
  }
}
