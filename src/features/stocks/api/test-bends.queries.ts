import { queryOptions } from '@tanstack/react-query'
import { listTestBends } from '#shared/stock/stock.contract'
import { call } from '@/lib/api/call'

export const testBendsQuery = (stockId: string) =>
  queryOptions({
    queryKey: ['stocks', 'testBends', stockId],
    queryFn: ({ signal }) => call(listTestBends, { params: { stockId }, signal }),
  })
