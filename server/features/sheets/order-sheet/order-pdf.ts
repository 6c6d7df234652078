import type { Box, Pdf } from '#server/adapters/pdf/pdf'
import { flowPages, type Part } from '#server/features/sheets/order-sheet/flow'
import { lineBlock } from '#server/features/sheets/order-sheet/line-block'
import {
  cautionPart,
  goodsParts,
  headPart,
  notesParts,
  totalsPart,
} from '#server/features/sheets/order-sheet/order-parts'
import type { OrderSpeech } from '#server/features/sheets/order-sheet/order-speech'
import type { PrintedOrder } from '#server/features/sheets/order-sheet/printed-order'
import { drawHeadedPages, type SheetPaper } from '#server/features/sheets/sheet-pages'
import { orderNumber } from '#shared/orders/order.schema'

/**
 * The order sheet: what the crew ordered, each line drawn and dimensioned, the small goods, the
 * totals and the cautions. A line is never broken over two pages.
 *
 *     const bytes = await orderPdf(order, orderSpeech(person, timeZone), { paper: 'letter', … })
 */
export function orderPdf(
  order: PrintedOrder,
  speech: OrderSpeech,
  paper: SheetPaper,
): Promise<Uint8Array<ArrayBuffer>> {
  const number = orderNumber(order.number)
  const { title } = speech.order
  const head = {
    title,
    mark: '',
    name: order.job.name,
    owner: order.company.name,
    order: number,
    poNumber: order.poNumber === '' ? '' : speech.words.poNumber(order.poNumber),
    hand: null,
  }
  return drawHeadedPages({ title: `${title} ${number}`, head }, speech, paper, (pdf, body) =>
    flowPages(partsOf(pdf, order, speech, body), body),
  )
}

const partsOf = (pdf: Pdf, order: PrintedOrder, speech: OrderSpeech, { width }: Box): Part[] => [
  headPart(pdf, order, speech, width),
  ...notesParts(pdf, order.notes, speech.order.notes, width),
  ...order.lines.map((line) => lineBlock(pdf, line, speech, width)),
  ...goodsParts(pdf, order.goods, speech, width),
  totalsPart(pdf, order, speech, width),
  cautionPart(pdf, speech, width),
]
