import type { Order } from '#shared/orders/order.schema'
import { amendOrder, submitOrder } from '#shared/orders/orders.contract'
import { call } from '@/lib/api/call'
import { orderBody } from '../form/order-body'
import type { Slot } from './draft-store'
import type { OrderDraft } from './order-draft'

/** What a slot is about: a job's new order, or an order being amended. */
export function slotTarget(slot: Slot): { kind: 'new' | 'amend'; id: string } {
  const [, kind, id] = slot.split('.')
  if ((kind !== 'new' && kind !== 'amend') || id === undefined) {
    throw new RangeError(`Not a slot of a draft: ${slot}`)
  }
  return { kind, id }
}

/** Sends a draft under its own key. Throws what `call` throws, and ZodError for an unfinished one. */
export function deliverDraft(slot: Slot, draft: OrderDraft): Promise<Order> {
  const { kind, id } = slotTarget(slot)
  const body = orderBody(draft)
  if (kind === 'new') {
    return call(submitOrder, { body: { ...body, jobId: id }, idempotencyKey: draft.key })
  }
  if (!draft.amends) throw new RangeError(`The draft of order ${id} names no version.`)
  const { version, answer } = draft.amends
  return call(amendOrder, {
    params: { orderId: id },
    body: { ...body, version, ...(answer.trim() === '' ? {} : { answer }) },
    idempotencyKey: draft.key,
  })
}
