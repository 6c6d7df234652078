import type { StripLayout } from '#shared/ends/end-layout'
import type { Side } from '#shared/ends/end.schema'
import type { Strip } from '#shared/strip/strip.schema'
import type { DisplayItem, DisplayList } from './display-list'
import { drawFrame, joinsOf } from './template-joins'
import { drawTemplateMetal } from './template-metal'
import type { Sheet } from './template-sheet'
import { sheetOf, showsMetal } from './template-sheet'
import { POINTS_PER_INCH, tilesOf } from './template-tiles'
import { CHECKS_HEIGHT, drawChecks, drawTemplateWords } from './template-words'

/** Words come from the caller, in the person's language. */
export interface TemplateWords {
  /** What the piece is called, with its hand; it stands on every tile. */
  readonly mark: string
  /** The signed turn of a bend as text. */
  readonly angle: (turn: number) => string
  /** What to measure before the paper is used; `length` is the line's, `6 in.` or `150 mm`. */
  readonly check: (length: string) => string
}

export interface TemplateOptions {
  readonly side: Side
  /** Of one tile in points: what a page has room for. At least 6 1/4 in. wide and 3 in. high. */
  readonly width: number
  readonly height: number
  readonly words: TemplateWords
}

export interface TemplateTile {
  /** In points, to be printed 1:1. */
  readonly display: DisplayList
  /** From 0: from left to right, and from edge B to edge A. */
  readonly column: number
  readonly row: number
}

export interface EndTemplate {
  readonly columns: number
  readonly rows: number
  /** Row by row; tiles that would show nothing are left out. */
  readonly tiles: readonly TemplateTile[]
}

const shows = (layout: StripLayout) => (sheet: Sheet) => showsMetal(layout, sheet)

/** Without the sheets that no line crosses, as long as those that are left can be joined. */
const neededSheets = (
  sheets: readonly Sheet[],
  hasLines: (sheet: Sheet) => boolean,
): readonly Sheet[] => {
  const needed = sheets.filter(hasLines)
  const joined = needed.slice(0, 1)
  for (const { tile } of joined) {
    for (const other of needed) {
      const apart = Math.abs(other.tile.column - tile.column) + Math.abs(other.tile.row - tile.row)
      if (apart === 1 && !joined.includes(other)) joined.push(other)
    }
  }
  return joined.length === needed.length ? needed : sheets
}

const LEAST_WIDTH = 6.25 * POINTS_PER_INCH
const LEAST_HEIGHT = 3 * POINTS_PER_INCH

/**
 * One end of a strip at full size, in tiles of a page, to be laid on the metal and pricked through:
 * 72 points are one inch of metal. Left side up, edge A below, as on the bench. Neighboring tiles
 * overlap by half an inch; their frames, crosses in the overlap and a letter for each join show how
 * they belong together. Below every tile stand lines of 6 in. and of 150 mm to check the print.
 *
 * Throws a RangeError for tiles smaller than `TemplateOptions` says.
 */
export const endTemplate = (
  layout: StripLayout,
  strip: Strip,
  options: TemplateOptions,
): EndTemplate => {
  const { width, height, side, words } = options
  if (!(width >= LEAST_WIDTH && height >= LEAST_HEIGHT)) {
    throw new RangeError(
      `A tile of ${width} by ${height} points is too small: give at least ${LEAST_WIDTH} by ${LEAST_HEIGHT}.`,
    )
  }
  const paper = height - CHECKS_HEIGHT
  const tiling = tilesOf(layout, side, {
    width: width / POINTS_PER_INCH,
    height: paper / POINTS_PER_INCH,
  })
  const sheets = neededSheets(
    tiling.tiles.map((tile) => sheetOf(tile, width, paper)).filter(shows(layout)),
    (sheet) => drawTemplateMetal(layout, strip, side, sheet).length > 0,
  )
  const isThere = (column: number, row: number): boolean =>
    sheets.some(({ tile }) => tile.column === column && tile.row === row)
  const draw = (sheet: Sheet): DisplayItem[] => {
    const metal = drawTemplateMetal(layout, strip, side, sheet)
    const joins = joinsOf(sheet, tiling, isThere)
    const lines = [...metal, drawFrame(sheet), ...joins.flatMap(({ items }) => items)]
    return [
      ...lines,
      ...drawTemplateWords(layout, strip, words, sheet, joins, lines),
      ...drawChecks(words, paper, width),
    ]
  }
  return {
    columns: tiling.columns,
    rows: tiling.rows,
    tiles: sheets.map((sheet) => ({
      display: { width, height, items: draw(sheet) },
      column: sheet.tile.column,
      row: sheet.tile.row,
    })),
  }
}
