import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query'
import type { OrderState } from '#shared/orders/order.schema'
import { getOrder, listOrders } from '#shared/orders/orders.contract'
import { call } from '@/lib/api/call'

export interface OrderFilter {
  readonly states?: readonly OrderState[]
  readonly jobId?: string
  readonly search?: string
}

const queryOf = ({ states, jobId, search }: OrderFilter) => ({
  ...(states && states.length > 0 ? { states: states.join(',') } : {}),
  ...(jobId === undefined ? {} : { jobId }),
  ...(search === undefined || search === '' ? {} : { search }),
})

export const ordersQuery = (filter: OrderFilter = {}) =>
  infiniteQueryOptions({
    queryKey: ['orders', 'list', filter],
    queryFn: ({ pageParam, signal }) =>
      call(listOrders, {
        query: { ...queryOf(filter), ...(pageParam === null ? {} : { after: pageParam }) },
        signal,
      }),
    initialPageParam: null as string | null,
    getNextPageParam: (page) => page.next,
  })

export const orderQuery = (orderId: string) =>
  queryOptions({
    queryKey: ['orders', 'one', orderId],
    queryFn: ({ signal }) => call(getOrder, { params: { orderId }, signal }),
  })
