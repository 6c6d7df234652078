import { queryOptions } from '@tanstack/react-query'
import { listShelf, listShelfVersions } from '#shared/shelf/shelf.contract'
import { call } from '@/lib/api/call'

export const shelfQuery = () =>
  queryOptions({
    queryKey: ['shelf', 'list'],
    queryFn: ({ signal }) => call(listShelf, { signal }),
    staleTime: 60_000,
  })

export const shelfVersionsQuery = (profileId: string) =>
  queryOptions({
    queryKey: ['shelf', 'versions', profileId],
    queryFn: ({ signal }) => call(listShelfVersions, { params: { profileId }, signal }),
  })
