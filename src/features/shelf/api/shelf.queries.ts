import { queryOptions } from '@tanstack/react-query'
import { listShelf } from '#shared/shelf/shelf.contract'
import { call } from '@/lib/api/call'

export const shelfQuery = () =>
  queryOptions({
    queryKey: ['shelf', 'list'],
    queryFn: ({ signal }) => call(listShelf, { signal }),
    staleTime: 60_000,
  })
