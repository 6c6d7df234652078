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

/** What stands at the head of all pages of a sheet; `title` is the file's. */
export interface SheetHead {
  readonly title: string
  readonly head: Omit<PageHead, 'page' | 'foot'>
}

/** A PDF of pages with the same head, each told its number of all. `plan` may measure text. */
export async function drawHeadedPages(
  { title, head }: SheetHead,
  { words }: Pick<SheetSpeech, 'words'>,
  { paper, language, at, day }: SheetPaper,
  plan: (pdf: Pdf, body: Box) => readonly SheetPage[],
): Promise<Uint8Array<ArrayBuffer>> {
  const size = PAGE_SIZES[paper]
  const pdf = new Pdf({ title, language, at })
  const pages = plan(pdf, bodyOf(size))
  const foot = `Foldyard · ${words.printed(day)}`
  for (const [index, draw] of pages.entries()) {
    pdf.addPage(size)
    drawPageFrame(pdf, size, { ...head, foot, page: words.page(index + 1, pages.length) })
    draw(pdf)
  }
  return pdf.finish()
}

/** The pages of a sheet of one piece. */
export function drawSheetPages(
  { line, hand }: SheetPiece,
  speech: SheetSpeech,
  { title, ...paper }: SheetPaper & { readonly title: string },
  plan: (pdf: Pdf, body: Box) => readonly SheetPage[],
): Promise<Uint8Array<ArrayBuffer>> {
  const { words } = speech
  const order = orderNumber(line.orderNumber)
  const head = {
    title,
    order,
    mark: line.mark,
    name: line.name,
    owner: `${line.job} · ${line.company}`,
    poNumber: line.poNumber === '' ? '' : words.poNumber(line.poNumber),
    hand: hand && { letter: HAND_LETTERS[hand], word: words.hand[hand] },
  }
  return drawHeadedPages({ title: `${title} ${order} ${line.mark}`, head }, speech, paper, plan)
}
