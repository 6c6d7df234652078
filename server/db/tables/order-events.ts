import type { OrderEvent } from '#shared/orders/order.schema'

export const ORDER_EVENTS = 'order_events'

export interface OrderEventRow {
  id: number
  order_id: string
  kind: OrderEvent['kind']
  person_id: string
  text: string
  at: Date
}
export type OrderEventInsert = Pick<OrderEventRow, 'order_id' | 'kind' | 'person_id'> &
  Partial<OrderEventRow>
