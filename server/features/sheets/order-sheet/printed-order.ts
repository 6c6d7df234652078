import type { Order, OrderLine } from '#shared/orders/order.schema'
import type { Good } from '#shared/roof-line/goods.schema'

/** What of an order line is printed. */
export type PrintedLine = Pick<
  OrderLine,
  | 'mark'
  | 'name'
  | 'profile'
  | 'stock'
  | 'quantity'
  | 'length'
  | 'ends'
  | 'hands'
  | 'statedGirth'
  | 'strip'
  | 'pieceWeight'
  | 'price'
>

/** Small goods with the color that they must match. */
export interface PrintedGood extends Pick<Good, 'kind' | 'quantity' | 'unit' | 'note'> {
  /** Null where any will do, or where the shop no longer has the stock. */
  readonly colorName: string | null
}

/** An order as its sheet shows it. */
export interface PrintedOrder extends Pick<
  Order,
  | 'number'
  | 'company'
  | 'job'
  | 'orderedBy'
  | 'poNumber'
  | 'neededBy'
  | 'submittedAt'
  | 'state'
  | 'pieceCount'
  | 'notes'
  | 'priceCents'
> {
  readonly lines: readonly PrintedLine[]
  readonly goods: readonly PrintedGood[]
}
