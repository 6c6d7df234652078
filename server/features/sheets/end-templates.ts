import { drawDisplayList } from '#server/adapters/pdf/draw-display-list'
import { PAPER_INK as INK } from '#server/adapters/pdf/paper-ink'
import type { Box, Pdf } from '#server/adapters/pdf/pdf'
import { drawParagraph, drawText } from '#server/adapters/pdf/pdf-text'
import { isDressed, type SheetPiece } from '#server/features/sheets/sheet-line'
import {
  drawSheetPages,
  type SheetPage,
  type SheetPaper,
} from '#server/features/sheets/sheet-pages'
import { endName, sheetColors } from '#server/features/sheets/strip-sheet/outline-figures'
import type { SheetSpeech } from '#server/features/sheets/strip-sheet/sheet-speech'
import { endTemplate } from '#shared/drawing/end-template'
import type { DisplayList } from '#shared/drawing/display-list'
import type { Side } from '#shared/ends/end.schema'
import { HAND_LETTERS } from '#shared/pieces/piece-mark'

/** Room for the end's name and how the paper is used. */
const CAPTION_HEIGHT = 30

const SIDES = ['left', 'right'] as const

/**
 * The dressed ends of a piece at full size, a page for each tile: 72 points of paper are one inch of
 * metal. A piece whose ends are both square gets a page that says so.
 */
export function drawEndTemplates(
  piece: SheetPiece,
  speech: SheetSpeech,
  paper: SheetPaper,
): Promise<Uint8Array<ArrayBuffer>> {
  const title = speech.words.endTemplates
  return drawSheetPages(piece, speech, { ...paper, title }, (_pdf, body) => {
    const pages = SIDES.filter((side) => isDressed(piece.ends, side)).flatMap((side) =>
      pagesOf(piece, side, speech, body),
    )
    return pages.length > 0 ? pages : [(pdf) => drawNothingToLay(pdf, speech, body)]
  })
}

function pagesOf(piece: SheetPiece, side: Side, speech: SheetSpeech, body: Box): SheetPage[] {
  const { words, angle } = speech
  const { line, hand, layout } = piece
  const tile: Box = {
    ...body,
    y: body.y + CAPTION_HEIGHT,
    height: body.height - CAPTION_HEIGHT,
  }
  const { tiles } = endTemplate(layout, line.strip, {
    side,
    width: tile.width,
    height: tile.height,
    words: {
      mark: hand === null ? line.mark : `${line.mark} ${HAND_LETTERS[hand]}`,
      angle,
      check: words.template.check,
    },
  })
  const isSeveral = tiles.length > 1
  return tiles.map(({ display }) => (pdf) => {
    drawCaption(pdf, endName(piece, side, speech), speech, isSeveral, body)
    drawFullSize(pdf, display, tile, piece, words.figure.end(line.name, words.end.title[side]))
  })
}

/** Never scaled: the tile was made for this box. */
function drawFullSize(
  pdf: Pdf,
  display: DisplayList,
  box: Box,
  piece: SheetPiece,
  alt: string,
): void {
  const { width, height } = display
  drawDisplayList(
    pdf,
    display,
    { x: box.x, y: box.y, width, height },
    { colors: sheetColors(piece), alt },
  )
}

function drawCaption(
  pdf: Pdf,
  title: string,
  { words }: SheetSpeech,
  isSeveral: boolean,
  { x, y, width }: Box,
): void {
  const style = { font: 'wordsBold', size: 13, color: INK.ink } as const
  pdf.element('H2', () => drawText(pdf, title, style, { x, baseline: y + 9 }))
  const how = isSeveral ? `${words.template.full} ${words.template.join}` : words.template.full
  pdf.element('P', () =>
    drawText(
      pdf,
      how,
      { font: 'words', size: 9.5, color: INK.ink },
      { x, baseline: y + 23, width, smallest: 7 },
    ),
  )
}

function drawNothingToLay(pdf: Pdf, { words }: SheetSpeech, { x, y, width }: Box): void {
  const style = { font: 'words', size: 12, color: INK.ink } as const
  pdf.element('P', () => {
    drawParagraph(pdf, words.template.noDressedEnd, style, { x, baseline: y + 12, width })
  })
}
