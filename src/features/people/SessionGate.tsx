import { useQuery, useQueryClient } from '@tanstack/react-query'
import { useEffect, type ReactNode } from 'react'
import type { Self } from '#shared/people/people.contract'
import { sessionKey, sessionQuery, type SignedIn } from '@/features/people/api/people.queries'
import { PersonContext } from '@/features/people/person-context'
import { onSessionEnd } from '@/lib/api/session-end'

interface Props {
  /** `holds` is false while an ended session waits for its person to sign in again. */
  readonly children: (holds: boolean) => ReactNode
  /** The sign-in page; with the person whose session ended by itself, if one did. */
  readonly signIn: (ended: Self | null) => ReactNode
  readonly loading: ReactNode
  readonly failed: (error: Error, retry: () => void) => ReactNode
  /** Told who is signed in, so that language and theme follow. */
  readonly onPerson: (person: Self) => void
}

/**
 * Lets signed-in people through and shows the sign-in page to others, at the address they are at.
 * When a session ends by itself what was on screen stays mounted beneath: nothing typed is lost,
 * and after signing in the person is where they were.
 */
export function SessionGate({ children, signIn, loading, failed, onPerson }: Props) {
  const client = useQueryClient()
  const session = useQuery(sessionQuery())
  const person = session.data?.person ?? null

  useEffect(
    () =>
      onSessionEnd(() => {
        client.setQueryData<SignedIn>(sessionKey, (before) => ({
          person: null,
          lastPerson: before?.lastPerson ?? null,
        }))
      }),
    [client],
  )

  useEffect(() => {
    if (person) onPerson(person)
  }, [person, onPerson])

  if (!session.data) {
    return session.error ? failed(session.error, () => void session.refetch()) : loading
  }
  const kept = person ?? session.data.lastPerson
  if (!kept) return signIn(null)
  const holds = person !== null
  return (
    <>
      {!holds && signIn(kept)}
      <div key={kept.id} hidden={!holds} inert={!holds}>
        <PersonContext value={kept}>{children(holds)}</PersonContext>
      </div>
    </>
  )
}
