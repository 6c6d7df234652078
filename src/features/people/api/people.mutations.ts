import { useMutation, useQueryClient } from '@tanstack/react-query'
import {
  signIn,
  signOut,
  signOutEverywhere,
  updateSelf,
  type Session,
} from '#shared/people/people.contract'
import type { BodyInputOf } from '#shared/http/endpoint'
import { sessionKey, type SignedIn } from '@/features/people/api/people.queries'
import { call } from '@/lib/api/call'
import { holdCsrfToken } from '@/lib/api/csrf-token'

export type Credentials = BodyInputOf<typeof signIn>
export type SelfChange = BodyInputOf<typeof updateSelf>

/** A sign-in begins a new session, with a CSRF token of its own; all that was read may be stale. */
export function useSignIn() {
  const client = useQueryClient()
  return useMutation({
    mutationFn: (body: Credentials) => call(signIn, { body }),
    // Somebody stands at the door and waits: they are told at once.
    retry: false,
    onSuccess: async (session: Session) => {
      holdCsrfToken(session.csrfToken)
      const before = client.getQueryData<SignedIn>(sessionKey)
      // Another person on the same device must not see what the first one had on screen.
      if (before?.lastPerson?.id !== session.person?.id) {
        client.removeQueries({ predicate: (query) => query.queryKey[1] !== sessionKey[1] })
      }
      client.setQueryData<SignedIn>(sessionKey, {
        person: session.person,
        lastPerson: session.person,
      })
      await client.invalidateQueries({ predicate: (query) => query.queryKey[1] !== sessionKey[1] })
    },
  })
}

function useLeave(leave: () => Promise<undefined>) {
  const client = useQueryClient()
  return useMutation({
    mutationFn: leave,
    onSuccess: () => {
      holdCsrfToken(null)
      client.setQueryData<SignedIn>(sessionKey, { person: null, lastPerson: null })
      client.removeQueries({ predicate: (query) => query.queryKey[1] !== sessionKey[1] })
    },
  })
}

export const useSignOut = () => useLeave(() => call(signOut))

export const useSignOutEverywhere = () => useLeave(() => call(signOutEverywhere))

export function useUpdateSelf() {
  const client = useQueryClient()
  return useMutation({
    mutationFn: (body: SelfChange) => call(updateSelf, { body }),
    onSuccess: (person) => {
      client.setQueryData<SignedIn>(sessionKey, { person, lastPerson: person })
    },
  })
}
