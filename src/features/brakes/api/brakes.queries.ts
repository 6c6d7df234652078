import { queryOptions } from '@tanstack/react-query'
import { listBrakes } from '#shared/brakes/brakes.contract'
import { call } from '@/lib/api/call'

export const brakesQuery = () =>
  queryOptions({
    queryKey: ['brakes', 'list'],
    queryFn: ({ signal }) => call(listBrakes, { signal }),
    staleTime: 5 * 60_000,
  })
