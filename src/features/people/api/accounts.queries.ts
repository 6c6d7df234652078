import { queryOptions } from '@tanstack/react-query'
import { listCrew, readPasswordLink } from '#shared/people/accounts.contract'
import { call } from '@/lib/api/call'

/** Whose password a link sets; fails with `not-found` when it holds no more. */
export const passwordLinkQuery = (token: string) =>
  queryOptions({
    queryKey: ['people', 'password-link', token],
    queryFn: ({ signal }) => call(readPasswordLink, { body: { token }, signal }),
    staleTime: Infinity,
  })

export const crewQuery = () =>
  queryOptions({
    queryKey: ['people', 'crew'],
    queryFn: ({ signal }) => call(listCrew, { signal }),
  })
