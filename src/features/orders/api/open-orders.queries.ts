import { queryOptions } from '@tanstack/react-query'
import type { OrderSummary } from '#shared/orders/order.schema'
import { listOrders } from '#shared/orders/orders.contract'
import { call } from '@/lib/api/call'
import { bySoonest, OPEN_STATES } from '../open-orders'

const PAGE = 100

/**
 * Every order the shop still owes something, soonest needed first. The counts beside the words of
 * the navigation and the lists below them are read from this one answer, so that they agree.
 */
export const openOrdersQuery = () =>
  queryOptions({
    queryKey: ['orders', 'list', 'open'],
    queryFn: async ({ signal }) => {
      const orders: OrderSummary[] = []
      let after: string | null = null
      do {
        const page: { items: OrderSummary[]; next: string | null } = await call(listOrders, {
          query: {
            states: OPEN_STATES.join(','),
            limit: PAGE,
            ...(after === null ? {} : { after }),
          },
          signal,
        })
        orders.push(...page.items)
        after = page.next
      } while (after !== null)
      return orders.sort(bySoonest)
    },
  })
