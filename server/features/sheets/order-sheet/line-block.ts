import { drawDisplayList } from '#server/adapters/pdf/draw-display-list'
import { PAPER_INK as INK } from '#server/adapters/pdf/paper-ink'
import type { Box, Pdf } from '#server/adapters/pdf/pdf'
import { drawParagraph, drawText, widthOfText, wrapText } from '#server/adapters/pdf/pdf-text'
import { drawFacts, heightOfFacts } from '#server/features/sheets/order-sheet/fact-list'
import type { Part } from '#server/features/sheets/order-sheet/flow'
import { lineFacts } from '#server/features/sheets/order-sheet/line-facts'
import {
  hasWideStrip,
  sectionOfLine,
  stripHeight,
  stripOfLine,
} from '#server/features/sheets/order-sheet/line-figures'
import type { OrderSpeech } from '#server/features/sheets/order-sheet/order-speech'
import type { PrintedLine } from '#server/features/sheets/order-sheet/printed-order'
import { figureColors } from '#shared/drawing/figure-colors'

const FACTS_WIDTH = 200
const GAP = 14
/** A line of words over a figure. */
const CAPTION = 12
const NAME_LINE = 16
const LEAST_SECTION = 150
const ABOVE = 12
const MARK = { font: 'figuresBold', size: 15, color: INK.ink } as const
const NAME = { font: 'wordsBold', size: 12.5, color: INK.ink } as const
const NOTE = { font: 'words', size: 8.5, color: INK.quiet } as const
const NOTE_LINE = NOTE.size * 1.3

/**
 * A line of the order: mark and name, section and facts side by side, the strip below the section
 * or, where it has many creases, below both.
 */
export function lineBlock(
  pdf: Pdf,
  line: PrintedLine,
  speech: OrderSpeech,
  bodyWidth: number,
): Part {
  const { words, order } = speech
  const width = bodyWidth - FACTS_WIDTH - GAP
  const facts = lineFacts(line, speech)
  const factsHeight = heightOfFacts(pdf, facts, FACTS_WIDTH)
  const isWide = hasWideStrip(line)
  const stripPart = CAPTION + stripHeight(line)
  const beside = isWide ? 0 : stripPart
  const { display: section, missing } = sectionOfLine(line, speech, {
    width,
    least: Math.max(LEAST_SECTION, factsHeight - CAPTION - beside),
  })
  const strip = stripOfLine(line, speech, isWide ? bodyWidth : width)
  const note = missing.length === 0 ? '' : `${order.notInFigure}: ${missing.join(' · ')}`
  const noteHeight = wrapText(pdf, note, NOTE, width).length * NOTE_LINE
  const nameX = widthOfText(pdf, line.mark, MARK) + 10
  const heading = wrapText(pdf, line.name, NAME, bodyWidth - nameX).length * NAME_LINE + 8
  const left = CAPTION + section.height + noteHeight + beside
  const upper = Math.max(factsHeight, left)
  const colors = figureColors('light', line.stock.painted ? line.stock.colorHex : null)

  const draw = (on: Pdf, box: Box) => {
    drawHeading(on, line, box, nameX)
    const top = box.y + heading
    drawFacts(on, facts, { x: box.x + width + GAP, y: top, width: FACTS_WIDTH })
    caption(on, words.section, { x: box.x, y: top })
    drawDisplayList(
      on,
      section,
      { x: box.x, y: top + CAPTION, width: section.width, height: section.height },
      { colors, alt: words.figure.section(line.name) },
    )
    if (note !== '') {
      const baseline = top + CAPTION + section.height + NOTE.size
      on.element('P', () => drawParagraph(on, note, NOTE, { x: box.x, baseline, width }))
    }
    const stripY = isWide ? top + upper : top + left - stripPart
    caption(on, words.strip, { x: box.x, y: stripY })
    drawDisplayList(
      on,
      strip,
      { x: box.x, y: stripY + CAPTION, width: strip.width, height: strip.height },
      { colors, alt: words.figure.strip(line.name) },
    )
  }
  return { height: heading + upper + (isWide ? stripPart : 0), above: ABOVE, ruled: true, draw }
}

function drawHeading(pdf: Pdf, { mark, name }: PrintedLine, box: Box, nameX: number): void {
  const baseline = box.y + NAME_LINE
  pdf.element('H2', () => {
    drawText(pdf, mark, MARK, { x: box.x, baseline })
    for (const [index, text] of wrapText(pdf, name, NAME, box.width - nameX).entries()) {
      drawText(pdf, text, NAME, { x: box.x + nameX, baseline: baseline + index * NAME_LINE })
    }
  })
}

const caption = (pdf: Pdf, text: string, at: Pick<Box, 'x' | 'y'>): void =>
  pdf.element('P', () => drawText(pdf, text, NOTE, { x: at.x, baseline: at.y + CAPTION - 3 }))
