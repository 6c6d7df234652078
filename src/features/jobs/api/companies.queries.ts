import { queryOptions } from '@tanstack/react-query'
import { listCompanies } from '#shared/people/people.contract'
import { call } from '@/lib/api/call'

export const companiesQuery = () =>
  queryOptions({
    queryKey: ['people', 'companies'],
    queryFn: ({ signal }) => call(listCompanies, { signal }),
    staleTime: 5 * 60_000,
  })
