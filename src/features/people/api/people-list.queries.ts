import { queryOptions } from '@tanstack/react-query'
import { listPeople } from '#shared/people/people.contract'
import { call } from '@/lib/api/call'

export const peopleQuery = () =>
  queryOptions({
    queryKey: ['people', 'list'],
    queryFn: ({ signal }) => call(listPeople, { signal }),
  })
