import { grow } from '#shared/geometry/bounds'
import type { Segment } from '#shared/geometry/segment'
import { segment } from '#shared/geometry/segment'
import { between } from '#shared/geometry/vector'
import type { DisplayItem } from './display-list'
import { path } from './strip-items'
import type { Sheet } from './template-sheet'
import { crossOn } from './template-sheet'
import type { Tiling } from './template-tiles'
import { POINTS_PER_INCH, TILE_OVERLAP } from './template-tiles'

/** The border of the paper that is used. */
export const drawFrame = ({ box }: Sheet): DisplayItem => {
  const { minX, minY, maxX, maxY } = grow(box, -0.25)
  const corners = [
    { x: minX, y: minY },
    { x: maxX, y: minY },
    { x: maxX, y: maxY },
    { x: minX, y: maxY },
  ]
  return { ...path('dimension', corners, 0.5), closed: true }
}

/** Where a tile is joined to a neighbor. */
export interface Join {
  /** Both tiles have the same. */
  readonly letter: string
  /** The middle of the overlap. */
  readonly line: Segment
  readonly items: readonly DisplayItem[]
}

/** a, b, … z, aa, ab … */
const joinLetter = (index: number): string =>
  (index >= 26 ? joinLetter(Math.floor(index / 26) - 1) : '') +
  String.fromCharCode(97 + (index % 26))

/**
 * The joins of a tile to those beside it: the neighbor's frame dashed, and crosses in the middle of
 * the overlap that both tiles have at the same places of the strip.
 */
export const joinsOf = (
  sheet: Sheet,
  { columns, rows }: Tiling,
  has: (column: number, row: number) => boolean,
): Join[] => {
  const overlap = TILE_OVERLAP * POINTS_PER_INCH
  const { box } = sheet
  const { column, row } = sheet.tile
  // Every join of the tiling has a number: first those side by side, row by row, then those
  // between the rows.
  const sideways = (left: number) => row * (columns - 1) + left
  const downwards = (upper: number) => rows * (columns - 1) + upper * columns + column
  const upright = (x: number): Segment => segment({ x, y: box.minY }, { x, y: box.maxY })
  const level = (y: number): Segment => segment({ x: box.minX, y }, { x: box.maxX, y })
  const found: { index: number; line: Segment; frame: Segment }[] = []
  if (has(column - 1, row)) {
    found.push({ index: sideways(column - 1), line: upright(overlap / 2), frame: upright(overlap) })
  }
  if (has(column + 1, row)) {
    const x = box.maxX - overlap / 2
    found.push({ index: sideways(column), line: upright(x), frame: upright(box.maxX - overlap) })
  }
  if (has(column, row - 1)) {
    found.push({ index: downwards(row - 1), line: level(overlap / 2), frame: level(overlap) })
  }
  if (has(column, row + 1)) {
    const y = box.maxY - overlap / 2
    found.push({ index: downwards(row), line: level(y), frame: level(box.maxY - overlap) })
  }
  return found.map(({ index, line, frame }) => ({
    letter: joinLetter(index),
    line,
    items: [
      {
        ...path(
          'ghost',
          [between(frame.from, frame.to, 0.002), between(frame.from, frame.to, 0.998)],
          0.5,
        ),
        dash: [4, 4],
      },
      ...[0.2, 0.8].flatMap((part) =>
        crossOn(sheet, 'dimension', between(line.from, line.to, part), 8),
      ),
    ],
  }))
}
