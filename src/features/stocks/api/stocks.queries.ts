import { queryOptions } from '@tanstack/react-query'
import { listStocks } from '#shared/stock/stock.contract'
import { call } from '@/lib/api/call'

export const stocksQuery = () =>
  queryOptions({
    queryKey: ['stocks', 'list'],
    queryFn: ({ signal }) => call(listStocks, { signal }),
    staleTime: 5 * 60_000,
  })
