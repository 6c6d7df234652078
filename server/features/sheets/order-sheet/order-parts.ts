import { PAPER_INK as INK } from '#server/adapters/pdf/paper-ink'
import type { Pdf } from '#server/adapters/pdf/pdf'
import { drawText, wrapText } from '#server/adapters/pdf/pdf-text'
import {
  drawFacts,
  figure,
  heightOfFacts,
  said,
  type Fact,
} from '#server/features/sheets/order-sheet/fact-list'
import type { Part } from '#server/features/sheets/order-sheet/flow'
import type { OrderSpeech } from '#server/features/sheets/order-sheet/order-speech'
import type { PrintedGood, PrintedOrder } from '#server/features/sheets/order-sheet/printed-order'
import { drawCautions, heightOfCautions } from '#server/features/sheets/strip-sheet/cautions'

const COLUMN_GAP = 20
const ABOVE = 12
const LINE = 12.5
const TEXT = { font: 'words', size: 9.5, color: INK.ink } as const
const TITLE = { font: 'wordsBold', size: 10.5, color: INK.ink } as const

/** Whose order it is and when it is needed, in two columns. */
export function headPart(
  pdf: Pdf,
  order: PrintedOrder,
  speech: OrderSpeech,
  bodyWidth: number,
): Part {
  const words = speech.order
  const columns: readonly (readonly Fact[])[] = [
    [
      said(words.company, order.company.name),
      said(words.job, order.job.name),
      figure(words.pitch, `${order.job.pitchRise}/12`),
      said(words.orderedBy, order.orderedBy),
    ],
    [
      { ...said(words.state, words.states[order.state]), odd: order.state === 'withdrawn' },
      said(words.neededBy, speech.day(order.neededBy)),
      said(words.ordered, speech.moment(order.submittedAt)),
      ...(order.poNumber === '' ? [] : [figure(words.poNumber, order.poNumber)]),
    ],
  ]
  const width = (bodyWidth - COLUMN_GAP) / 2
  return {
    height: Math.max(...columns.map((facts) => heightOfFacts(pdf, facts, width))),
    above: 0,
    draw: (on, box) => {
      for (const [index, facts] of columns.entries()) {
        drawFacts(on, facts, { x: box.x + index * (width + COLUMN_GAP), y: box.y, width })
      }
    },
  }
}

/** Lines of text below a title; each line may go to the next page, the title never alone. */
function textParts(title: string, lines: readonly string[]): Part[] {
  return lines.map((line, index) => {
    const isFirst = index === 0
    const titleHeight = isFirst ? 16 : 0
    return {
      height: LINE + titleHeight,
      above: isFirst ? ABOVE : 0,
      draw: (on, { x, y }) => {
        if (isFirst) {
          on.element('H2', () => drawText(on, title, TITLE, { x, baseline: y + LINE - 1 }))
        }
        if (line === '') return
        const baseline = y + titleHeight + LINE - 3
        on.element('P', () => drawText(on, line, TEXT, { x, baseline }))
      },
    }
  })
}

/** What the crew wrote to the shop, line by line as it was written. */
export function notesParts(pdf: Pdf, notes: string, title: string, width: number): Part[] {
  if (notes === '') return []
  const lines = notes
    .split(/\r?\n/)
    .flatMap((line) => (line.trim() === '' ? [''] : wrapText(pdf, line, TEXT, width)))
  return textParts(title, lines)
}

/** The small goods: amount, name, note. */
export function goodsParts(
  pdf: Pdf,
  goods: readonly PrintedGood[],
  speech: OrderSpeech,
  width: number,
): Part[] {
  const words = speech.order.goods
  const lines = goods.flatMap(({ kind, quantity, unit, note, colorName }) => {
    const name = colorName === null ? words.kind[kind] : words.inColor(words.kind[kind], colorName)
    const amount = words.amount[unit](quantity, speech.count(quantity))
    const text = `${amount} · ${name}${note === '' ? '' : ` · ${note}`}`
    return wrapText(pdf, text, TEXT, width)
  })
  return textParts(words.title, lines)
}

/** Pieces, weight and price of all lines. */
export function totalsPart(
  pdf: Pdf,
  order: PrintedOrder,
  speech: OrderSpeech,
  bodyWidth: number,
): Part {
  const { totals } = speech.order
  const weight = order.lines.reduce((sum, line) => sum + line.pieceWeight * line.quantity, 0)
  const facts = [
    figure(totals.pieces, speech.count(order.pieceCount)),
    figure(totals.weight, speech.weight(weight)),
    ...(order.priceCents === null
      ? []
      : [figure(totals.price, speech.money(order.priceCents)), said('', totals.priceMeaning)]),
  ]
  const width = (bodyWidth - COLUMN_GAP) / 2
  const titleHeight = 18
  return {
    height: titleHeight + heightOfFacts(pdf, facts, width),
    above: ABOVE,
    draw: (on, { x, y }) => {
      on.element('H2', () => drawText(on, totals.title, TITLE, { x, baseline: y + LINE - 1 }))
      drawFacts(on, facts, { x, y: y + titleHeight, width })
    },
  }
}

/** What cuts, and what the shop does not vouch for. */
export function cautionPart(pdf: Pdf, { words, order }: OrderSpeech, width: number): Part {
  const { title, edges } = words.caution
  const cautions = [edges, order.wind]
  return {
    height: heightOfCautions(pdf, cautions, width),
    above: ABOVE,
    draw: (on, box) => drawCautions(on, cautions, title, box),
  }
}
