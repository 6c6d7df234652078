import { orderInputSchema, type Order, type OrderInput } from '#shared/orders/order.schema'
import type { OrderDraft } from '../draft/order-draft'

/** The draft as the API takes it. Throws ZodError while a field is missing: see `draftFaults`. */
export const orderBody = ({ poNumber, neededBy, notes, lines, goods }: OrderDraft): OrderInput =>
  orderInputSchema.parse({
    poNumber,
    neededBy,
    notes,
    lines: lines.map(({ key: _key, covers: _covers, ...line }) => line),
    goods: goods.map(({ key: _key, ...good }) => good),
  })

/** An order that came in, as a draft to amend it with. Lines keep their ids as keys. */
export const draftOfOrder = (order: Order, key: string): OrderDraft => ({
  key,
  poNumber: order.poNumber,
  neededBy: order.neededBy,
  notes: order.notes,
  sending: false,
  amends: { orderId: order.id, number: order.number, version: order.version, answer: '' },
  lines: order.lines.map((line) => ({
    key: line.id,
    mark: line.mark,
    name: line.name,
    profile: line.profile,
    stockId: line.stock.id,
    quantity: line.quantity,
    length: line.length,
    ends: line.ends,
    hands: line.hands,
    statedGirth: line.statedGirth,
    covers: null,
  })),
  goods: order.goods.map((good, index) => ({ ...good, key: `${order.id} ${index}` })),
})
