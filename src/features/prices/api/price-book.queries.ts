import { queryOptions } from '@tanstack/react-query'
import { getPriceBook } from '#shared/pricing/pricing.contract'
import { call } from '@/lib/api/call'

export const priceBookQuery = () =>
  queryOptions({
    queryKey: ['prices', 'book'],
    queryFn: ({ signal }) => call(getPriceBook, { signal }),
    staleTime: 5 * 60_000,
  })
