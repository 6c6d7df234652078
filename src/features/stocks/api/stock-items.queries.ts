import { queryOptions } from '@tanstack/react-query'
import { listStockItems } from '#shared/stock/stock-items.contract'
import { call } from '@/lib/api/call'

export const stockItemsQuery = (stockId: string) =>
  queryOptions({
    queryKey: ['stocks', 'items', stockId],
    queryFn: ({ signal }) => call(listStockItems, { params: { stockId }, signal }),
  })
