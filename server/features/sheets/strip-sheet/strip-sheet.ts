import { drawDisplayList } from '#server/adapters/pdf/draw-display-list'
import { PAPER_INK as INK } from '#server/adapters/pdf/paper-ink'
import type { Box, Pdf } from '#server/adapters/pdf/pdf'
import { drawText } from '#server/adapters/pdf/pdf-text'
import { isDressed, type SheetPiece } from '#server/features/sheets/sheet-line'
import {
  drawSheetPages,
  type SheetPage,
  type SheetPaper,
} from '#server/features/sheets/sheet-pages'
import {
  cautionsOf,
  drawCautions,
  heightOfCautions,
} from '#server/features/sheets/strip-sheet/cautions'
import { drawCreases, heightOfCreases } from '#server/features/sheets/strip-sheet/creases'
import { drawEnd, heightOfEnd } from '#server/features/sheets/strip-sheet/end-section'
import { drawFacts } from '#server/features/sheets/strip-sheet/facts'
import { drawWholeStrip, sheetColors } from '#server/features/sheets/strip-sheet/outline-figures'
import {
  figureLabels,
  placeOnStrip,
  type SheetSpeech,
} from '#server/features/sheets/strip-sheet/sheet-speech'
import { sectionFigure } from '#shared/drawing/section-figure'
import { stripFigure } from '#shared/drawing/strip-figure'

const SECTION_HEIGHT = 236
const FACTS_WIDTH = 186
const STRIP_HEIGHT = 112
/** Small enough for the distances of many creases side by side, points. */
const STRIP_TEXT = 10
const OUTLINE_HEIGHT = 100
/** A line of words over a figure. */
const CAPTION = 14
const GAP = 10

/**
 * The strip sheet of a piece: how it is folded, the strip with its creases, and each dressed end with
 * its marks. One page where both ends are square, else two; more where the marks need them.
 */
export function drawStripSheet(
  piece: SheetPiece,
  speech: SheetSpeech,
  paper: SheetPaper,
): Promise<Uint8Array<ArrayBuffer>> {
  const title = speech.words.stripSheet
  return drawSheetPages(piece, speech, { ...paper, title }, (pdf, body) =>
    planPages(pdf, piece, speech, body),
  )
}

/** What is drawn on each page; what finds no room goes to the next one. */
function planPages(pdf: Pdf, piece: SheetPiece, speech: SheetSpeech, body: Box): SheetPage[] {
  const sides = (['left', 'right'] as const).filter((side) => isDressed(piece.ends, side))
  const parts: Part[] = sides.map((side) => ({
    height: heightOfEnd(pdf, piece, side, speech, body.width),
    draw: (on, box) => drawEnd(on, piece, side, speech, box),
  }))
  const cautions = cautionsOf(piece, speech)
  const cautionsHeight = heightOfCautions(pdf, cautions, body.width)
  const used =
    SECTION_HEIGHT + STRIP_HEIGHT + 2 * CAPTION + heightOfCreases(piece.line.strip) + 3 * GAP
  const left = body.height - used - cautionsHeight - GAP
  const outlineFits = sides.length > 0 && left >= OUTLINE_HEIGHT + CAPTION + GAP
  if (sides.length > 0 && !outlineFits) {
    parts.unshift({
      height: OUTLINE_HEIGHT + CAPTION,
      draw: (on, box) => drawOutline(on, piece, speech, box),
    })
  }
  const first: SheetPage = (on) => {
    const y = drawFolded(on, piece, speech, body)
    if (outlineFits) {
      drawOutline(on, piece, speech, { ...body, y, height: OUTLINE_HEIGHT + CAPTION })
    }
    drawCautions(on, cautions, speech.words.caution.title, {
      ...body,
      y: body.y + body.height - cautionsHeight,
    })
  }
  return [first, ...stack(parts, body)]
}

interface Part {
  readonly height: number
  readonly draw: (pdf: Pdf, box: Box) => void
}

/** Parts one below the other, as many to a page as fit. */
function stack(parts: readonly Part[], body: Box): SheetPage[] {
  const pages: { part: Part; y: number }[][] = []
  let y = Infinity
  for (const part of parts) {
    if (y + part.height > body.y + body.height) {
      pages.push([])
      ;({ y } = body)
    }
    pages.at(-1)?.push({ part, y })
    y += part.height + 2 * GAP
  }
  return pages.map((page) => (pdf: Pdf) => {
    for (const { part, y: top } of page) part.draw(pdf, { ...body, y: top, height: part.height })
  })
}

const caption = (pdf: Pdf, text: string, box: Pick<Box, 'x' | 'y'>): void =>
  pdf.element('H2', () =>
    drawText(
      pdf,
      text,
      { font: 'wordsBold', size: 10, color: INK.ink },
      { x: box.x, baseline: box.y + CAPTION - 4 },
    ),
  )

/** Section and facts, the strip and its creases; gives where there is room again. */
function drawFolded(pdf: Pdf, piece: SheetPiece, speech: SheetSpeech, body: Box): number {
  const { line } = piece
  const { words } = speech
  const colors = sheetColors(piece)
  const labels = figureLabels(speech)
  const sectionWidth = body.width - FACTS_WIDTH - 2 * GAP
  caption(pdf, words.section, body)
  const section: Box = { ...body, y: body.y + CAPTION, width: sectionWidth, height: SECTION_HEIGHT }
  const sectionList = sectionFigure(line.profile, line.stock.sheet, {
    width: section.width,
    height: section.height,
    labels,
  }).display
  drawDisplayList(pdf, sectionList, section, { colors, alt: words.figure.section(line.name) })
  drawFacts(pdf, piece, speech, {
    x: body.x + body.width - FACTS_WIDTH,
    y: body.y,
    width: FACTS_WIDTH,
    height: SECTION_HEIGHT + CAPTION,
  })
  let y = section.y + SECTION_HEIGHT + GAP
  caption(pdf, words.strip, { x: body.x, y })
  y += CAPTION
  const strip: Box = { x: body.x, y, width: body.width, height: STRIP_HEIGHT }
  const stripList = stripFigure(line.profile, line.strip, {
    width: strip.width,
    height: strip.height,
    labels: { ...labels, length: placeOnStrip(speech, line.strip) },
    mode: 'layout',
    textSize: STRIP_TEXT,
  }).display
  drawDisplayList(pdf, stripList, strip, { colors, alt: words.figure.strip(line.name) })
  y += STRIP_HEIGHT + GAP
  drawCreases(pdf, line.strip, speech, { x: body.x, y, width: body.width })
  return y + heightOfCreases(line.strip) + GAP
}

function drawOutline(pdf: Pdf, piece: SheetPiece, speech: SheetSpeech, box: Box): void {
  caption(pdf, speech.words.wholeStrip, box)
  drawWholeStrip(pdf, piece, speech, { ...box, y: box.y + CAPTION, height: box.height - CAPTION })
}
