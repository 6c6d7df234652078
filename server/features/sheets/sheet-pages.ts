import { bodyOf, drawPageFrame, PAGE_SIZES, type PageHead } from '#server/adapters/pdf/page-frame'
import { Pdf, type Box } from '#server/adapters/pdf/pdf'
import type { SheetPiece } from '#server/features/sheets/sheet-line'
import type { SheetSpeech } from '#server/features/sheets/strip-sheet/sheet-speech'
import { orderNumber } from '#shared/orders/order.schema'
import type { Language } from '#shared/people/people.contract'
import { HAND_LETTERS } from '#shared/pieces/piece-mark'
import type { Paper } from '#shared/sheets/sheets.contract'

export interface SheetPaper {
  readonly paper: Paper
  readonly language: Language
  readonly at: Date
  /** The day it is printed, as the shop writes it. */
  readonly day: string
}

/** Draws what stands between head and foot of one page. */
export type SheetPage = (pdf: Pdf) => void

/** A PDF of pages with the same head, each told its number of all. `plan` may measure text. */
export async function drawSheetPages(
  piece: SheetPiece,
  speech: SheetSpeech,
  { paper, language, at, day, title }: SheetPaper & { readonly title: string },
  plan: (pdf: Pdf, body: Box) => readonly SheetPage[],
): Promise<Uint8Array<ArrayBuffer>> {
  const { line, hand } = piece
  const { words } = speech
  const size = PAGE_SIZES[paper]
  const order = orderNumber(line.orderNumber)
  const pdf = new Pdf({ title: `${title} ${order} ${line.mark}`, language, at })
  const pages = plan(pdf, bodyOf(size))
  const head: Omit<PageHead, 'page'> = {
    title,
    order,
    mark: line.mark,
    name: line.name,
    owner: `${line.job} · ${line.company}`,
    poNumber: line.poNumber === '' ? '' : words.poNumber(line.poNumber),
    hand: hand && { letter: HAND_LETTERS[hand], word: words.hand[hand] },
    foot: `Foldyard · ${words.printed(day)}`,
  }
  for (const [index, draw] of pages.entries()) {
    pdf.addPage(size)
    drawPageFrame(pdf, size, { ...head, page: words.page(index + 1, pages.length) })
    draw(pdf)
  }
  return pdf.finish()
}
