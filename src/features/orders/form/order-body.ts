import { orderInputSchema, type Order, type OrderInput } from '#shared/orders/order.schema'
import type { OrderDraft } from '../draft/order-draft'

/** The draft as the API takes it. Throws ZodError while a field is missing: see `draftFaults`. */
export const orderBody = ({ poNumber, neededBy, notes, lines }: OrderDraft): OrderInput =>
  orderInputSchema.parse({
    poNumber,
    neededBy,
    notes,
    lines: lines.map(({ mark, name, profile, stockId, quantity, length }) => ({
      mark,
      name,
      profile,
      stockId,
      quantity,
      length,
    })),
  })

/** An order that came in, as a draft to amend it with. Lines keep their ids as keys. */
export const draftOfOrder = (order: Order, key: string): OrderDraft => ({
  key,
  poNumber: order.poNumber,
  neededBy: order.neededBy,
  notes: order.notes,
  sending: false,
  amends: { orderId: order.id, number: order.number, version: order.version, answer: '' },
  lines: order.lines.map(({ id, mark, name, profile, stock, quantity, length }) => ({
    key: id,
    mark,
    name,
    profile,
    stockId: stock.id,
    quantity,
    length,
  })),
})
