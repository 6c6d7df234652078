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

interface Mark {
  readonly x: number
  readonly content: string
  readonly part: Part
}

/**
 * Moves marks along a row so that each keeps its width and its order, as near to its own place as
 * the others allow. Undefined when the row is too short for all of them.
 */
export const spreadAlong = (
  wanted: readonly number[],
  widths: readonly number[],
  from: number,
  to: number,
): number[] | undefined => {
  const needed = widths.reduce((sum, width) => sum + width, 0)
  if (needed > to - from) return undefined
  const placed: number[] = []
  let least = from
  wanted.forEach((x, index) => {
    const half = (widths[index] ?? 0) / 2
    const at = Math.max(x, least + half)
    placed.push(at)
    least = at + half
  })
  let most = to
  for (let index = placed.length - 1; index >= 0; index -= 1) {
    const half = (widths[index] ?? 0) / 2
    const at = Math.min(placed[index] ?? 0, most - half)
    placed[index] = at
    most = at - half
  }
  return placed
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
  for (const step of [1, 0.85, 0.7]) {
    const size = room.text * step
    for (const rotation of [0, -90]) {
      const lengths = marks.map((mark) => textWidth(mark.content, size))
      const thick = size * TEXT_HEIGHT
      const widths = lengths.map((length) => (rotation === 0 ? length + size : thick + 3))
      const tall = rotation === 0 ? thick : Math.max(...lengths)
      const textTop = room.top + size * 1.2
      const places = spreadAlong(wanted, widths, minX, maxX)
      if (places === undefined || textTop + tall > maxY) continue
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
