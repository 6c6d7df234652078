import { drawDisplayList } from '#server/adapters/pdf/draw-display-list'
import type { Box, Pdf } from '#server/adapters/pdf/pdf'
import type { SheetPiece } from '#server/features/sheets/sheet-line'
import { placeOnStrip, type SheetSpeech } from '#server/features/sheets/strip-sheet/sheet-speech'
import { figureColors } from '#shared/drawing/figure-colors'
import { outlineFigure } from '#shared/drawing/outline-figure'
import type { Side } from '#shared/ends/end.schema'

export const sheetColors = ({ line: { stock } }: SheetPiece) =>
  figureColors('light', stock.painted ? stock.colorHex : null)

/** Which end it is, and whether it lies low or high. */
export function endName({ ends }: SheetPiece, side: Side, { words }: SheetSpeech): string {
  const title = words.end.title[side]
  if (ends.lowEnd === null) return title
  return `${title} · ${ends.lowEnd === side ? words.end.low : words.end.high}`
}

export const outlineLabels = (piece: SheetPiece, speech: SheetSpeech) => ({
  length: placeOnStrip(speech, piece.line.strip),
  run: speech.run,
  end: (side: Side) => endName(piece, side, speech),
})

/** One end of the strip enlarged, with the distances of its marks. */
export function drawEndFigure(
  pdf: Pdf,
  piece: SheetPiece,
  side: Side,
  speech: SheetSpeech,
  box: Box,
): void {
  const { display } = outlineFigure(piece.layout, piece.line.strip, {
    width: box.width,
    height: box.height,
    labels: outlineLabels(piece, speech),
    side,
  })
  const { name } = piece.line
  const alt = speech.words.figure.end(name, endName(piece, side, speech))
  drawDisplayList(pdf, display, box, { colors: sheetColors(piece), alt })
}

/** The whole strip as it is cut, broken in its middle where it is long. */
export function drawWholeStrip(pdf: Pdf, piece: SheetPiece, speech: SheetSpeech, box: Box): void {
  const { display } = outlineFigure(piece.layout, piece.line.strip, {
    width: box.width,
    height: box.height,
    labels: outlineLabels(piece, speech),
  })
  const alt = speech.words.figure.wholeStrip(piece.line.name)
  drawDisplayList(pdf, display, box, { colors: sheetColors(piece), alt })
}
