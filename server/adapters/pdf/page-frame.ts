import { PAPER_INK as INK } from '#server/adapters/pdf/paper-ink'
import type { Box, PageSize, Pdf } from '#server/adapters/pdf/pdf'
import { drawText, drawTextBlock, widthOfText, type TextStyle } from '#server/adapters/pdf/pdf-text'

/** Points. */
export const PAGE_SIZES = {
  letter: { width: 612, height: 792 },
  a4: { width: 595.28, height: 841.89 },
} as const satisfies Record<string, PageSize>

/** What stands at the head of every page of a sheet. */
export interface PageHead {
  /** What the paper is: `Strip sheet`. */
  readonly title: string
  /** Of the line; empty where the sheet is of more than one. */
  readonly mark: string
  readonly name: string
  /** Whose it is. */
  readonly owner: string
  readonly order: string
  /** Empty where there is none. */
  readonly poNumber: string
  /** The letter of its hand, and in words; null where it has none. */
  readonly hand: { readonly letter: string; readonly word: string } | null
  readonly page: string
  /** When it was printed. */
  readonly foot: string
}

const MARGIN = 36
const HEAD_HEIGHT = 54
const FOOT_HEIGHT = 12
const GAP = 10

/** The part of a page that head and foot leave free. */
export function bodyOf({ width, height }: PageSize): Box {
  const top = MARGIN + HEAD_HEIGHT + GAP
  return {
    x: MARGIN,
    y: top,
    width: width - 2 * MARGIN,
    height: height - MARGIN - FOOT_HEIGHT - top,
  }
}

/** Mark and name at the left, hand and order at the right, a rule below; the page's number at the foot. */
export function drawPageFrame(pdf: Pdf, size: PageSize, head: PageHead): void {
  const right = size.width - MARGIN
  drawOrder(pdf, head, right)
  const handLeft = drawHand(pdf, head, right - ORDER_WIDTH)
  const x = head.mark === '' ? MARGIN : MARGIN + drawMark(pdf, head) + GAP
  const width = handLeft - GAP - x
  const nameStyle = { font: 'wordsBold', size: 17, color: INK.ink } as const
  pdf.element('H1', () =>
    drawTextBlock(pdf, head.name, nameStyle, { x, y: MARGIN, width, height: 30 }, { smallest: 8 }),
  )
  const ownerStyle = { font: 'words', size: 10, color: INK.quiet } as const
  pdf.element('P', () =>
    drawTextBlock(
      pdf,
      head.owner,
      ownerStyle,
      { x, y: MARGIN + 30, width, height: 18 },
      { smallest: 7 },
    ),
  )
  drawRule(pdf, MARGIN, right, MARGIN + HEAD_HEIGHT)
  drawFoot(pdf, size, head)
}

const ORDER_WIDTH = 160
const MARK_WIDTH = 110

/** The mark as large as it fits; gives the width that it took. */
function drawMark(pdf: Pdf, { mark }: PageHead): number {
  const style = { font: 'figuresBold', size: 38, color: INK.ink } as const
  const width = Math.min(MARK_WIDTH, widthOfText(pdf, mark, style) + 1)
  const box = { x: MARGIN, y: MARGIN, width, height: HEAD_HEIGHT - 8 }
  pdf.element('P', () => drawTextBlock(pdf, mark, style, box, { smallest: 8 }))
  return width
}

/** The hand white on black, its word below; gives the left border of what it took. */
function drawHand(pdf: Pdf, { hand }: PageHead, right: number): number {
  if (hand === null) return right
  const side = 34
  const width = 64
  const left = right - width
  const middle = left + width / 2
  pdf.artifact(() => pdf.document.rect(middle - side / 2, MARGIN, side, side).fill(INK.ink))
  const letter = { font: 'figuresBold', size: 30, color: INK.paper } as const
  const word = { font: 'wordsBold', size: 9, color: INK.ink } as const
  pdf.element('P', () => {
    drawText(pdf, hand.letter, letter, { x: middle, baseline: MARGIN + 28, align: 'center' })
    drawText(pdf, hand.word, word, {
      x: middle,
      baseline: MARGIN + 46,
      align: 'center',
      width: width + 6,
      smallest: 7,
    })
  })
  return left
}

function drawOrder(pdf: Pdf, { title, order, poNumber }: PageHead, right: number): void {
  const column = { x: right - ORDER_WIDTH + GAP, width: ORDER_WIDTH - GAP }
  const block = (text: string, style: TextStyle, y: number, height: number) =>
    pdf.element('P', () =>
      drawTextBlock(
        pdf,
        text,
        style,
        { ...column, y: MARGIN + y, height },
        { smallest: 6, align: 'right' },
      ),
    )
  block(title, { font: 'words', size: 10, color: INK.quiet }, 0, 12)
  block(order, { font: 'figuresBold', size: 16, color: INK.ink }, 13, 18)
  if (poNumber !== '') block(poNumber, { font: 'figures', size: 9, color: INK.quiet }, 32, 18)
}

function drawFoot(pdf: Pdf, { width, height }: PageSize, { page, foot }: PageHead): void {
  const style = { font: 'words', size: 8.5, color: INK.quiet } as const
  const baseline = height - MARGIN + 4
  pdf.element('P', () => drawText(pdf, foot, style, { x: MARGIN, baseline }))
  pdf.element('P', () =>
    drawText(pdf, page, style, { x: width - MARGIN, baseline, align: 'right' }),
  )
}

/** A thin rule across the page. */
export function drawRule(pdf: Pdf, from: number, to: number, y: number): void {
  pdf.artifact(() =>
    pdf.document.lineWidth(1).undash().moveTo(from, y).lineTo(to, y).stroke(INK.ink),
  )
}
