import type { Order } from '#shared/orders/order.schema'
import { PriceTotal } from './PriceTotal'

/** What an order that is in costs: by the price book as it is now, as it was once it is released. */
export function OrderPriceTotal({
  order,
}: {
  readonly order: Pick<Order, 'lines' | 'priceCents'>
}) {
  return (
    <PriceTotal
      cents={order.priceCents}
      without={order.lines.filter(({ price }) => price === null).map(({ mark }) => mark)}
    />
  )
}
