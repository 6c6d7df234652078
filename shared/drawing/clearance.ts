import type { Segment } from '#shared/geometry/segment'
import type { Vector } from '#shared/geometry/vector'
import { lineNearBox, linesNear } from './flat-geometry'
import { Raster } from './raster'

/**
 * What labels keep clear of: the chords of drawn lines and how far these reach to either side. The
 * chords are sorted into square cells, so that a question looks only at those nearby.
 */
export interface Metal {
  readonly half: number
  /** x1, y1, x2, y2 of each chord in turn. */
  readonly chords: Float64Array
  readonly cells: Cells
  /** Undefined where there are no lines. */
  readonly raster: Raster | undefined
}

interface Cells {
  readonly minX: number
  readonly minY: number
  readonly size: number
  readonly columns: number
  readonly rows: number
  /** Row by row: where a cell's chords begin in `chords`; one more for the end of the last. */
  readonly begins: Int32Array
  /** Chords by their number. */
  readonly chords: Int32Array
}

/** Cells along the longer side of the drawing. */
const CELLS = 16

/** Calls `visit` with each cell that the box of a chord meets, and the chord's number. */
const eachCell = (
  chords: Float64Array,
  cells: Pick<Cells, 'minX' | 'minY' | 'size' | 'columns'>,
  visit: (cell: number, chord: number) => void,
): void => {
  const { minX, minY, size, columns } = cells
  for (let chord = 0; chord * 4 < chords.length; chord += 1) {
    const x1 = chords[chord * 4] ?? 0
    const y1 = chords[chord * 4 + 1] ?? 0
    const x2 = chords[chord * 4 + 2] ?? 0
    const y2 = chords[chord * 4 + 3] ?? 0
    const left = Math.floor((Math.min(x1, x2) - minX) / size)
    const right = Math.floor((Math.max(x1, x2) - minX) / size)
    const bottom = Math.floor((Math.max(y1, y2) - minY) / size)
    for (let row = Math.floor((Math.min(y1, y2) - minY) / size); row <= bottom; row += 1) {
      for (let column = left; column <= right; column += 1) visit(row * columns + column, chord)
    }
  }
}

const sortIntoCells = (chords: Float64Array): Cells => {
  let minX = Infinity
  let minY = Infinity
  let maxX = -Infinity
  let maxY = -Infinity
  for (let index = 0; index < chords.length; index += 2) {
    const x = chords[index] ?? 0
    const y = chords[index + 1] ?? 0
    if (x < minX) minX = x
    if (x > maxX) maxX = x
    if (y < minY) minY = y
    if (y > maxY) maxY = y
  }
  const size = Math.max(maxX - minX, maxY - minY, 1e-6) / CELLS
  const columns = Math.floor((maxX - minX) / size) + 1
  const rows = Math.floor((maxY - minY) / size) + 1
  const grid = { minX, minY, size, columns }
  const begins = new Int32Array(columns * rows + 1)
  eachCell(chords, grid, (cell) => {
    begins[cell + 1] = (begins[cell + 1] ?? 0) + 1
  })
  for (let cell = 1; cell < begins.length; cell += 1) {
    begins[cell] = (begins[cell] ?? 0) + (begins[cell - 1] ?? 0)
  }
  const sorted = new Int32Array(begins.at(-1) ?? 0)
  const filled = begins.slice()
  eachCell(chords, grid, (cell, chord) => {
    const at = filled[cell] ?? 0
    sorted[at] = chord
    filled[cell] = at + 1
  })
  return { ...grid, rows, begins, chords: sorted }
}

const NO_CELLS: Cells = {
  minX: 0,
  minY: 0,
  size: 1,
  columns: 0,
  rows: 0,
  begins: new Int32Array(1),
  chords: new Int32Array(0),
}

const metalOfChords = (chords: Float64Array, half: number): Metal => ({
  half,
  chords,
  cells: chords.length === 0 ? NO_CELLS : sortIntoCells(chords),
  raster: chords.length === 0 ? undefined : new Raster(chords),
})

/** Lines to keep clear of, drawn `half` pixels to either side. Without lines everything is clear. */
export const metalOf = (lines: readonly Segment[], half: number): Metal => {
  const chords = new Float64Array(lines.length * 4)
  for (let index = 0; index < lines.length; index += 1) {
    const line = lines[index]
    if (line === undefined) break
    chords[index * 4] = line.from.x
    chords[index * 4 + 1] = line.from.y
    chords[index * 4 + 2] = line.to.x
    chords[index * 4 + 3] = line.to.y
  }
  return metalOfChords(chords, half)
}

/** The same for one open chain, with some lines that lead off it. */
export const metalOfChain = (
  points: readonly Vector[],
  half: number,
  spurs: readonly Segment[] = [],
): Metal => {
  const count = Math.max(0, points.length - 1)
  const chords = new Float64Array((count + spurs.length) * 4)
  for (let index = 1; index < points.length; index += 1) {
    const from = points[index - 1]
    const to = points[index]
    if (from === undefined || to === undefined) break
    const at = (index - 1) * 4
    chords[at] = from.x
    chords[at + 1] = from.y
    chords[at + 2] = to.x
    chords[at + 3] = to.y
  }
  spurs.forEach(({ from, to }, index) => {
    chords.set([from.x, from.y, to.x, to.y], (count + index) * 4)
  })
  return metalOfChords(chords, half)
}

/** True when a whole box lies further than `reach` from the endless line of a chord. */
const isOffChord = (
  x1: number,
  y1: number,
  x2: number,
  y2: number,
  minX: number,
  minY: number,
  maxX: number,
  maxY: number,
  reach: number,
): boolean => {
  const dx = x2 - x1
  const dy = y2 - y1
  const aside = dx * ((minY + maxY) / 2 - y1) - dy * ((minX + maxX) / 2 - x1)
  const spread = (Math.abs(dy) * (maxX - minX) + Math.abs(dx) * (maxY - minY)) / 2
  const length = Math.sqrt(dx * dx + dy * dy)
  return length > 0 && Math.abs(aside) - spread >= reach * length
}

/** True when the box keeps `gap` away from the metal. */
export const isBoxClear = (
  { half, chords, cells, raster }: Metal,
  minX: number,
  minY: number,
  maxX: number,
  maxY: number,
  gap: number,
): boolean => {
  const reach = half + gap
  if (raster === undefined) return true
  if (raster.isSurelyClear(minX - reach, minY - reach, maxX + reach, maxY + reach)) return true
  if (
    raster.isSurelyMet(minX - reach, minY, maxX + reach, maxY) ||
    raster.isSurelyMet(minX, minY - reach, maxX, maxY + reach)
  ) {
    return false
  }
  const left = Math.max(0, Math.floor((minX - reach - cells.minX) / cells.size))
  const right = Math.min(cells.columns - 1, Math.floor((maxX + reach - cells.minX) / cells.size))
  const top = Math.max(0, Math.floor((minY - reach - cells.minY) / cells.size))
  const bottom = Math.min(cells.rows - 1, Math.floor((maxY + reach - cells.minY) / cells.size))
  for (let row = top; row <= bottom; row += 1) {
    const first = cells.begins[row * cells.columns + left] ?? 0
    const last = cells.begins[row * cells.columns + right + 1] ?? 0
    for (let index = first; index < last; index += 1) {
      const at = (cells.chords[index] ?? 0) * 4
      const x1 = chords[at] ?? 0
      const x2 = chords[at + 2] ?? 0
      if ((x1 <= minX - reach && x2 <= minX - reach) || (x1 >= maxX + reach && x2 >= maxX + reach))
        continue
      const y1 = chords[at + 1] ?? 0
      const y2 = chords[at + 3] ?? 0
      if ((y1 <= minY - reach && y2 <= minY - reach) || (y1 >= maxY + reach && y2 >= maxY + reach))
        continue
      if (isOffChord(x1, y1, x2, y2, minX, minY, maxX, maxY, reach)) continue
      if (lineNearBox(x1, y1, x2, y2, minX, minY, maxX, maxY, reach)) return false
    }
  }
  return true
}

/** True when the line from (ax, ay) to (bx, by) keeps `gap` away from the metal. */
export const isLineClear = (
  { half, chords, cells, raster }: Metal,
  ax: number,
  ay: number,
  bx: number,
  by: number,
  gap: number,
): boolean => {
  const reach = half + gap
  const minX = Math.min(ax, bx) - reach
  const maxX = Math.max(ax, bx) + reach
  const minY = Math.min(ay, by) - reach
  const maxY = Math.max(ay, by) + reach
  if (raster === undefined || raster.isSurelyClear(minX, minY, maxX, maxY)) return true
  const ux = bx - ax
  const uy = by - ay
  const away = reach * Math.sqrt(ux * ux + uy * uy)
  const left = Math.max(0, Math.floor((minX - cells.minX) / cells.size))
  const right = Math.min(cells.columns - 1, Math.floor((maxX - cells.minX) / cells.size))
  const top = Math.max(0, Math.floor((minY - cells.minY) / cells.size))
  const bottom = Math.min(cells.rows - 1, Math.floor((maxY - cells.minY) / cells.size))
  for (let row = top; row <= bottom; row += 1) {
    const first = cells.begins[row * cells.columns + left] ?? 0
    const last = cells.begins[row * cells.columns + right + 1] ?? 0
    for (let index = first; index < last; index += 1) {
      const at = (cells.chords[index] ?? 0) * 4
      const x1 = chords[at] ?? 0
      const x2 = chords[at + 2] ?? 0
      if ((x1 <= minX && x2 <= minX) || (x1 >= maxX && x2 >= maxX)) continue
      const y1 = chords[at + 1] ?? 0
      const y2 = chords[at + 3] ?? 0
      if ((y1 <= minY && y2 <= minY) || (y1 >= maxY && y2 >= maxY)) continue
      // Most chords lie on one side of the line, out of its reach.
      const first = ux * (y1 - ay) - uy * (x1 - ax)
      const last = ux * (y2 - ay) - uy * (x2 - ax)
      if (away > 0 && ((first >= away && last >= away) || (first <= -away && last <= -away)))
        continue
      if (linesNear(ax, ay, bx, by, x1, y1, x2, y2, reach)) return false
    }
  }
  return true
}

/** Where a ray from (x, y) along the unit (ux, uy) first comes within `reach` of (cx, cy). */
const meetCircle = (
  x: number,
  y: number,
  ux: number,
  uy: number,
  cx: number,
  cy: number,
  reach: number,
): number => {
  const dx = x - cx
  const dy = y - cy
  const b = dx * ux + dy * uy
  const c = dx * dx + dy * dy - reach * reach
  if (c <= 0) return 0
  const root = b * b - c
  return root < 0 || b > 0 ? Infinity : -b - Math.sqrt(root)
}

/** Where the ray first comes within `reach` of a segment. */
const meetChord = (
  x: number,
  y: number,
  ux: number,
  uy: number,
  x1: number,
  y1: number,
  x2: number,
  y2: number,
  reach: number,
): number => {
  const ends = Math.min(
    meetCircle(x, y, ux, uy, x1, y1, reach),
    meetCircle(x, y, ux, uy, x2, y2, reach),
  )
  const length = Math.sqrt((x2 - x1) * (x2 - x1) + (y2 - y1) * (y2 - y1))
  if (length === 0) return ends
  const cx = (x2 - x1) / length
  const cy = (y2 - y1) / length
  const aside = cx * (y - y1) - cy * (x - x1)
  const inside = cx * (x - x1) + cy * (y - y1)
  if (Math.abs(aside) <= reach) return inside >= 0 && inside <= length ? 0 : ends
  const closing = cx * uy - cy * ux
  if (closing === 0) return ends
  const t = (Math.sign(aside) * reach - aside) / closing
  const at = inside + t * (cx * ux + cy * uy)
  return t >= 0 && at >= 0 && at <= length ? Math.min(ends, t) : ends
}

/**
 * How far a ray from (x, y) along the unit (ux, uy) runs before it is `gap` from the metal;
 * Infinity if it never is.
 */
export const runToMetal = (
  { half, chords }: Metal,
  x: number,
  y: number,
  ux: number,
  uy: number,
  gap: number,
): number => {
  const reach = half + gap
  let run = Infinity
  for (let at = 0; at < chords.length; at += 4) {
    const x1 = chords[at] ?? 0
    const y1 = chords[at + 1] ?? 0
    const x2 = chords[at + 2] ?? 0
    const y2 = chords[at + 3] ?? 0
    // Most chords lie to one side of the ray, or behind it.
    const a = ux * (y1 - y) - uy * (x1 - x)
    const b = ux * (y2 - y) - uy * (x2 - x)
    if ((a > reach && b > reach) || (a < -reach && b < -reach)) continue
    if (ux * (x1 - x) + uy * (y1 - y) < -reach && ux * (x2 - x) + uy * (y2 - y) < -reach) continue
    run = Math.min(run, meetChord(x, y, ux, uy, x1, y1, x2, y2, reach))
  }
  return run
}

/** How far the metal's middle reaches beyond (x, y) along the unit (ux, uy); 0 if it does not. */
export const reachOfMetal = (
  { chords }: Metal,
  x: number,
  y: number,
  ux: number,
  uy: number,
): number => {
  let reach = 0
  for (let at = 0; at < chords.length; at += 2) {
    reach = Math.max(reach, ((chords[at] ?? 0) - x) * ux + ((chords[at + 1] ?? 0) - y) * uy)
  }
  return reach
}
