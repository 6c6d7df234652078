import { drawCode128, widthOfCode128 } from '#server/adapters/pdf/draw-code128'
import { drawDisplayList } from '#server/adapters/pdf/draw-display-list'
import type { Box, Pdf } from '#server/adapters/pdf/pdf'
import type { PdfFont } from '#server/adapters/pdf/pdf-fonts'
import { drawText, drawTextBlock, fitText, widthOfText } from '#server/adapters/pdf/pdf-text'
import { drawArrow, drawPointer } from '#server/features/labels/label-signs'
import {
  LABEL_COLORS,
  SECTION_SIZE,
  type LabelContent,
} from '#server/features/labels/label-content'
import { HAND_LETTERS } from '#shared/pieces/piece-mark'
import type { LabelWords } from '#shared/labels/words/label-words'

/** 4 x 2 in., in points. */
export const LABEL_SIZE = { width: 288, height: 144 }

const BLACK = '#000000'
const WHITE = '#FFFFFF'

/** Two columns: words over the symbol at the left, mark over the section at the right. Points. */
const LEFT = { x: 9, width: 158 }
const RIGHT = { x: 175, width: SECTION_SIZE.width }

const AT = {
  mark: { ...RIGHT, y: 6, height: 25 },
  count: { ...RIGHT, y: 32, height: 14 },
  section: { ...RIGHT, y: 48, height: SECTION_SIZE.height },
  lift: { ...RIGHT, y: 114, height: 22 },
  name: { ...LEFT, y: 6, height: 25 },
  job: { ...LEFT, y: 32, height: 16 },
  make: { ...LEFT, y: 49, height: 17 },
  order: { ...LEFT, y: 67, height: 15 },
  lay: { ...LEFT, y: 83, height: 10 },
}
/** What the length may take of its row; the rest is the stock's. */
const LENGTH_WIDTH = 92
const CODE_FOOT = 135
const BARS_FOOT = 126
/** The larger of 6.5 mm and 15 % of a symbol's length is 7 mm, 20 points; these are taller. */
const BARS_TOP = 85
const BARS_TOP_BELOW_LAY = 95

interface Draw {
  readonly pdf: Pdf
  readonly label: LabelContent
  readonly words: LabelWords
  readonly onPage: (box: Box) => Box
}

/** Draws one label with its upper left corner at a place of the page. */
export function drawLabel(
  pdf: Pdf,
  label: LabelContent,
  words: LabelWords,
  at: { readonly x: number; readonly y: number },
): void {
  const onPage = (box: Box): Box => ({ ...box, x: at.x + box.x, y: at.y + box.y })
  const draw: Draw = { pdf, label, words, onPage }
  pdf.group('Sect', () => {
    drawWords(draw)
    drawCount(draw)
    drawLay(draw)
    drawSymbol(draw)
    drawLift(draw)
    drawDisplayList(pdf, label.section, onPage(AT.section), {
      colors: LABEL_COLORS,
      alt: words.section(label.name),
    })
  })
}

/** Text as large as it fits into a box of the label. */
function write(
  { pdf, onPage }: Draw,
  text: string,
  box: Box,
  face: { readonly font: PdfFont; readonly size: number; readonly smallest: number },
  align: 'left' | 'right' = 'left',
): void {
  if (text === '') return
  const style = { font: face.font, size: face.size, color: BLACK }
  pdf.element('P', () =>
    drawTextBlock(pdf, text, style, onPage(box), { smallest: face.smallest, align }),
  )
}

/** Where the line breaks, the dot stays behind. */
const joined = (...parts: readonly string[]): string => parts.filter(Boolean).join('\u00a0· ')

function drawWords(draw: Draw): void {
  const { pdf, label, words } = draw
  write(draw, label.mark, AT.mark, { font: 'figuresBold', size: 27, smallest: 7 }, 'right')
  write(draw, label.name, AT.name, { font: 'wordsBold', size: 16, smallest: 8 })
  write(draw, joined(label.job, label.company), AT.job, { font: 'words', size: 9, smallest: 7 })
  const face = { font: 'figuresBold', size: 15, color: BLACK } as const
  const length = fitText(pdf, label.length, face, LENGTH_WIDTH, 9)
  write(draw, length.text, AT.make, { ...face, size: length.size, smallest: length.size })
  const used = 8 + widthOfText(pdf, length.text, { ...face, size: length.size })
  write(
    draw,
    joined(label.thickness, label.color),
    { ...AT.make, x: AT.make.x + used, width: AT.make.width - used },
    { font: 'figures', size: 10, smallest: 6.5 },
  )
  const po = label.poNumber === '' ? '' : words.poNumber(label.poNumber)
  write(draw, joined(label.order, po), AT.order, { font: 'figures', size: 9.5, smallest: 6.5 })
}

/** The number of the piece, and its hand white on black. */
function drawCount(draw: Draw): void {
  const { pdf, label, words, onPage } = draw
  const count = words.pieceOf(label.sequence, label.quantity)
  write(draw, count, AT.count, { font: 'figures', size: 10, smallest: 8 }, 'right')
  if (label.hand === null) return
  const style = { font: 'figuresBold', size: 14, color: WHITE } as const
  const hand = HAND_LETTERS[label.hand]
  const { x, y, width, height } = onPage({
    ...AT.count,
    width: widthOfText(pdf, hand, style) + 8,
  })
  pdf.artifact(() => pdf.document.rect(x, y, width, height).fill(BLACK))
  pdf.element('P', () =>
    drawText(pdf, hand, style, { x: x + width / 2, baseline: y + height - 1.9, align: 'center' }),
  )
}

/** The arrow along the piece to its low end, and which edge lies at the label's lower border. */
function drawLay(draw: Draw): void {
  const { pdf, label, words, onPage } = draw
  if (label.lowEnd === null) return
  const style = { font: 'wordsBold', size: 8.5, color: BLACK } as const
  const { x, y, width, height } = onPage(AT.lay)
  const middle = y + height / 2
  const isLeft = label.lowEnd === 'left'
  const [first, last] = isLeft ? [words.lowEnd, words.highEnd] : [words.highEnd, words.lowEnd]
  const baseline = middle + 2.8
  let from = x
  let to = x + width
  pdf.element('P', () => {
    from += 4 + drawText(pdf, first, style, { x, baseline })
  })
  pdf.element('P', () => {
    to -= 4 + drawText(pdf, last, style, { x: x + width, baseline, align: 'right' })
  })
  pdf.artifact(() => drawArrow(pdf, isLeft ? { from: to, to: from } : { from, to }, middle))
  const foot = onPage({ ...AT.lay, y: CODE_FOOT, height: 0 })
  const small = { ...style, size: 7.5 }
  pdf.element('P', () =>
    drawText(pdf, words.edgeA, small, {
      x: foot.x + foot.width - 8,
      baseline: foot.y,
      align: 'right',
    }),
  )
  pdf.artifact(() => drawPointer(pdf, { x: foot.x + foot.width - 3, y: foot.y }))
}

function drawSymbol({ pdf, label, onPage }: Draw): void {
  const top = label.lowEnd === null ? BARS_TOP : BARS_TOP_BELOW_LAY
  const { x, y, height } = onPage({ ...LEFT, y: top, height: BARS_FOOT - top })
  pdf.element('Figure', () => drawCode128(pdf, label.code, { x, y, height }), label.code)
  const style = { font: 'figures', size: 9, color: BLACK } as const
  pdf.element('P', () =>
    drawText(pdf, label.code, style, {
      x: x + widthOfCode128(label.code) / 2,
      baseline: y + height + CODE_FOOT - BARS_FOOT,
      align: 'center',
      spacing: 1.5,
    }),
  )
}

/** What it weighs, and who lifts it. */
function drawLift(draw: Draw): void {
  const { label, words } = draw
  const caution = label.lift === 'onePerson' ? '' : words.lift[label.lift]
  const half = AT.lift.height / 2
  const upper = { ...AT.lift, height: half }
  write(draw, label.weight, upper, { font: 'figures', size: 9.5, smallest: 8 }, 'right')
  const lower = { ...upper, y: AT.lift.y + half }
  write(draw, caution, lower, { font: 'wordsBold', size: 9.5, smallest: 7 }, 'right')
}
