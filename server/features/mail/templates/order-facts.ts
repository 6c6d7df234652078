import type { MailBlock } from '#server/features/mail/templates/mail-words'
import type { Language } from '#shared/people/people.contract'

/** What every mail about an order shows of it. */
export interface OrderMailData {
  /** As printed, `F-2047`. */
  readonly number: string
  readonly name: string
  readonly job: string
  readonly company: string
  /** Empty: none was given. */
  readonly poNumber: string
  /** The day in the reader's language. */
  readonly neededBy: string
  readonly lines: readonly OrderMailLine[]
  /** The order on screen. */
  readonly url: string
}

export interface OrderMailLine {
  readonly mark: string
  readonly name: string
  readonly quantity: number
  /** In the reader's units. */
  readonly length: string
  readonly stock: string
}

const LABELS: Record<Language, Record<'number' | 'job' | 'company' | 'po' | 'neededBy', string>> = {
  en: { number: 'Order', job: 'Job', company: 'Company', po: 'PO number', neededBy: 'Needed by' },
  es: {
    number: 'Pedido',
    job: 'Obra',
    company: 'Empresa',
    po: 'Orden de compra',
    neededBy: 'Se necesita el',
  },
}

const HEADS: Record<Language, readonly string[]> = {
  en: ['Mark', 'Piece', 'Pieces', 'Length', 'Stock'],
  es: ['Marca', 'Pieza', 'Cantidad', 'Largo', 'Material'],
}

/** Which order it is. */
export function orderFacts(language: Language, order: OrderMailData): MailBlock {
  const label = LABELS[language]
  return {
    kind: 'facts',
    rows: [
      [label.number, order.number],
      [label.job, order.job],
      [label.company, order.company],
      ...(order.poNumber === '' ? [] : [[label.po, order.poNumber] as const]),
      [label.neededBy, order.neededBy],
    ],
  }
}

/** What is ordered, a row each line. */
export const orderLines = (language: Language, { lines }: OrderMailData): MailBlock => ({
  kind: 'table',
  head: HEADS[language],
  rows: lines.map(({ mark, name, quantity, length, stock }) => [
    mark,
    name,
    String(quantity),
    length,
    stock,
  ]),
})
