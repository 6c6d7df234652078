/** Pixels a cell: fine enough to settle most questions, coarse enough to be made for each drawing. */
const CELL = 4

/** No more cells along an axis than this, whatever the size of the drawing. */
const MOST_CELLS = 220

/**
 * Which cells of a grid lines pass through, as a table of sums (Crow 1984): how many of the cells in
 * a box are taken is four readings, whatever the box.
 */
export class Raster {
  private readonly minX: number
  private readonly minY: number
  private readonly size: number
  private readonly columns: number
  private readonly rows: number
  /** Sums over all cells above and to the left, with a row and a column of zeros before the first. */
  private readonly sums: Int32Array

  /** `chords`: x1, y1, x2, y2 of each line in turn; at least one. */
  constructor(chords: Float64Array) {
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
    this.minX = minX
    this.minY = minY
    this.size = Math.max(CELL, Math.max(maxX - minX, maxY - minY) / MOST_CELLS)
    this.columns = Math.floor((maxX - minX) / this.size) + 1
    this.rows = Math.floor((maxY - minY) / this.size) + 1
    this.sums = new Int32Array((this.columns + 1) * (this.rows + 1))
    for (let at = 0; at < chords.length; at += 4) {
      this.mark(chords[at] ?? 0, chords[at + 1] ?? 0, chords[at + 2] ?? 0, chords[at + 3] ?? 0)
    }
    this.sumUp()
  }

  /** Marks the cells at points along a line, half a cell apart at most. */
  private mark(x1: number, y1: number, x2: number, y2: number): void {
    const { size, sums, columns, rows } = this
    const width = columns + 1
    const steps = Math.ceil((2 * Math.max(Math.abs(x2 - x1), Math.abs(y2 - y1))) / size) + 1
    for (let step = 0; step <= steps; step += 1) {
      const column = Math.floor((x1 + ((x2 - x1) * step) / steps - this.minX) / size)
      const row = Math.floor((y1 + ((y2 - y1) * step) / steps - this.minY) / size)
      // Rounding may set a point a hair outside.
      const x = column < 0 ? 0 : column >= columns ? columns - 1 : column
      const y = row < 0 ? 0 : row >= rows ? rows - 1 : row
      sums[(y + 1) * width + x + 1] = 1
    }
  }

  private sumUp(): void {
    const { sums } = this
    const width = this.columns + 1
    for (let row = 1; row <= this.rows; row += 1) {
      let along = 0
      for (let at = row * width + 1; at < (row + 1) * width; at += 1) {
        along += sums[at] ?? 0
        sums[at] = along + (sums[at - width] ?? 0)
      }
    }
  }

  private count(left: number, top: number, right: number, bottom: number): number {
    const { sums, columns, rows } = this
    const width = columns + 1
    const from = left < 0 ? 0 : left
    const to = right >= columns ? columns : right + 1
    const first = top < 0 ? 0 : top
    const last = bottom >= rows ? rows : bottom + 1
    if (to <= from || last <= first) return 0
    return (
      (sums[last * width + to] ?? 0) -
      (sums[first * width + to] ?? 0) -
      (sums[last * width + from] ?? 0) +
      (sums[first * width + from] ?? 0)
    )
  }

  /** True when no line comes into the box; false says nothing. */
  isSurelyClear(minX: number, minY: number, maxX: number, maxY: number): boolean {
    // A line may cut the corner of a cell between two marked points.
    const { size } = this
    const slack = size / 2
    return (
      this.count(
        Math.floor((minX - slack - this.minX) / size),
        Math.floor((minY - slack - this.minY) / size),
        Math.floor((maxX + slack - this.minX) / size),
        Math.floor((maxY + slack - this.minY) / size),
      ) === 0
    )
  }

  /** True when a line has a point in the box; false says nothing. */
  isSurelyMet(minX: number, minY: number, maxX: number, maxY: number): boolean {
    const { size } = this
    return (
      this.count(
        Math.ceil((minX - this.minX) / size),
        Math.ceil((minY - this.minY) / size),
        Math.floor((maxX - this.minX) / size) - 1,
        Math.floor((maxY - this.minY) / size) - 1,
      ) > 0
    )
  }
}
