import type { StripLayout } from '#shared/ends/end-layout'
import type { Side } from '#shared/ends/end.schema'
import type { Bounds } from '#shared/geometry/bounds'
import type { Inches } from '#shared/units/brands'
import { depthOfEnd } from './outline-view'

/** Points of a full-size drawing for an inch of metal. */
export const POINTS_PER_INCH = 72

/** What neighboring tiles show of each other, in inches. */
export const TILE_OVERLAP: Inches = 0.5

/** Shown of the strip behind the deepest place of its end. */
const BEHIND: Inches = 1.5

/** Paper left free around the strip, for the letters of its edges. */
const AROUND: Inches = 0.5

/** The part of the blank that one tile shows: x along it, y from edge A; inches. */
export interface Tile {
  readonly column: number
  /** From 0 at edge B: the upper row comes first. */
  readonly row: number
  readonly window: Bounds
}

export interface Tiling {
  readonly columns: number
  readonly rows: number
  /** Row by row. */
  readonly tiles: readonly Tile[]
}

/** The end with what lies behind it, and paper around it. */
const regionOf = (layout: StripLayout, side: Side): Bounds => {
  const { blankLength, stripWidth } = layout
  const reach = Math.min(blankLength, depthOfEnd(layout, side) + BEHIND)
  return {
    minX: (side === 'left' ? 0 : blankLength - reach) - AROUND,
    maxX: (side === 'left' ? reach : blankLength) + AROUND,
    minY: 0 - AROUND,
    maxY: stripWidth + AROUND,
  }
}

/** Where each of the fewest windows of one size begins that cover a stretch and overlap. */
const startsOf = (from: Inches, to: Inches, size: Inches): Inches[] => {
  const step = size - TILE_OVERLAP
  const count = Math.max(1, Math.ceil((to - from - TILE_OVERLAP) / step - 1e-9))
  const begin = (from + to - (count * step + TILE_OVERLAP)) / 2
  return Array.from({ length: count }, (_, index) => begin + index * step)
}

/**
 * The fewest tiles of a size (inches) that together show an end; neighbors overlap by
 * `TILE_OVERLAP`, and the end lies in their middle.
 */
export const tilesOf = (
  layout: StripLayout,
  side: Side,
  tile: { readonly width: Inches; readonly height: Inches },
): Tiling => {
  const region = regionOf(layout, side)
  const along = startsOf(region.minX, region.maxX, tile.width)
  const across = startsOf(region.minY, region.maxY, tile.height).toReversed()
  return {
    columns: along.length,
    rows: across.length,
    tiles: across.flatMap((minY, row) =>
      along.map((minX, column) => ({
        column,
        row,
        window: { minX, maxX: minX + tile.width, minY, maxY: minY + tile.height },
      })),
    ),
  }
}
