import type { OrderState } from '#shared/orders/order.schema'

/** A view: nothing is written here. */
export const ORDER_STATES_VIEW = 'order_states'

export interface OrderStateRow {
  order_id: string
  piece_count: number
  queued: number
  bent: number
  bundled: number
  picked_up: number
  scrapped: number
  withdrawn: number
  state: OrderState
}
