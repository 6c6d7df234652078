import type { Bounds } from '#shared/geometry/bounds'
import type { Strip } from '#shared/strip/strip.schema'
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

interface Mark {
  readonly x: number
  readonly content: string
  readonly part: Part
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

const marksOf = (strip: Strip, room: DimensionRoom): Mark[] => [
  ...strip.creases.map((crease): Mark => ({
    x: room.toX(crease.at),
    content: room.length(crease.at),
    part:
      crease.fold === 'hemA'
        ? { kind: 'hem', edge: 'A' }
        : crease.fold === 'hemB'
          ? { kind: 'hem', edge: 'B' }
          : { kind: 'bend', bend: crease.fold },
  })),
  {
    x: room.toX(strip.stripWidth),
    content: room.length(strip.stripWidth),
    part: { kind: 'edge', edge: 'B' },
  },
]

/**
 * Distances from edge A under the strip, each with a line to its crease. The numbers lie where
 * they all fit in one row, stand upright where they do not, and shrink as the last resort; their
 * lines never cross. Nothing is drawn where even that does not fit.
 */
export const runningDimensions = (strip: Strip, room: DimensionRoom): DisplayItem[] => {
  const marks = marksOf(strip, room)
  const { minX, maxX, maxY } = room.frame
  const wanted = marks.map((mark) => mark.x)
  for (const step of [1, 0.85, 0.7, 0.55]) {
    const size = Math.max(Math.min(room.text, SMALLEST), room.text * step)
    for (const rotation of [0, -90]) {
      const lengths = marks.map((mark) => textWidth(mark.content, size))
      const thick = size * TEXT_HEIGHT
      const widths = lengths.map((length) => (rotation === 0 ? length + 1.6 * size : thick + 3))
      const tall = rotation === 0 ? thick : Math.max(...lengths)
      const textTop = room.top + size * 1.2
      const places = spreadAlong(wanted, widths, minX, maxX)
      if (places === undefined || textTop + tall > maxY) continue
      const shift = Math.max(...places.map((x, index) => Math.abs(x - (wanted[index] ?? x))))
      // A number far from its crease is read against the wrong one.
      if (rotation === 0 && shift > 3 * size) continue
      return marks.flatMap((mark, index) => {
        const x = places[index] ?? mark.x
        const at = { x, y: textTop + tall / 2 }
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
          { ...text('dimensionText', mark.content, at, size, mark.part), rotation },
        ]
      })
    }
  }
  return []
}
