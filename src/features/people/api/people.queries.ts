import { queryOptions } from '@tanstack/react-query'
import { getSession, type Self } from '#shared/people/people.contract'
import { call } from '@/lib/api/call'
import { holdCsrfToken } from '@/lib/api/csrf-token'

/** Who is signed in, and who was until the session ended by itself. */
export interface SignedIn {
  readonly person: Self | null
  /**
   * The person of this tab: stays when a session ends by itself, so that the work on screen is kept
   * under the sign-in page; null after signing out.
   */
  readonly lastPerson: Self | null
}

export const sessionKey = ['people', 'session'] as const

export const sessionQuery = () =>
  queryOptions({
    queryKey: sessionKey,
    queryFn: async ({ signal, client }): Promise<SignedIn> => {
      const session = await call(getSession, { signal })
      holdCsrfToken(session.csrfToken)
      const before = client.getQueryData<SignedIn>(sessionKey)
      return { person: session.person, lastPerson: session.person ?? before?.lastPerson ?? null }
    },
    staleTime: 60_000,
  })
