import type { FigureLabels } from '#shared/drawing/section-figure'
import { isEqual } from '#shared/geometry/tolerance'
import type { Units } from '#shared/people/people.contract'
import type { SheetWords } from '#shared/sheets/words/sheet-words'
import type { Strip } from '#shared/strip/strip.schema'
import { printBend } from '#shared/units/angle'
import { printRun, printSize } from '#shared/units/print-length'
import { printWeight } from '#shared/units/weight'

/** How a sheet says things to the person who prints it. */
export interface SheetSpeech {
  readonly words: SheetWords
  /** A dimension of the profile or an end, to 1/16 in. */
  readonly size: (inches: number) => string
  /** What is sheared, to 1/32 in. */
  readonly sheared: (inches: number) => string
  /** A length along the piece. */
  readonly run: (inches: number) => string
  readonly weight: (pounds: number) => string
  /** The angle between the faces of a bend. */
  readonly angle: (turn: number) => string
}

export const sheetSpeech = (words: SheetWords, units: Units): SheetSpeech => ({
  words,
  size: (inches) => printSize(inches, units),
  sheared: (inches) => printSize(inches, units, 32),
  run: (inches) => printRun(inches, units),
  weight: (pounds) => printWeight(pounds, units),
  angle: (turn) => printBend(turn, 'included'),
})

export const figureLabels = ({ size, angle }: SheetSpeech): FigureLabels => ({
  length: size,
  angle,
})

/**
 * A place on the strip, from edge A. Edge B is the strip's width and is told as it is sheared, so
 * that one sheet never gives two figures for it.
 */
export const placeOnStrip =
  ({ size, sheared }: SheetSpeech, { stripWidth }: Pick<Strip, 'stripWidth'>) =>
  (inches: number): string =>
    isEqual(inches, stripWidth) ? sheared(inches) : size(inches)
