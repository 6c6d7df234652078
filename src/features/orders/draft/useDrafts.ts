import { useSyncExternalStore } from 'react'
import { usePerson } from '@/features/people/person-context'
import { draftsOf, followDrafts, type SlottedDraft } from './draft-store'

/** Everything this person has begun on this device and not sent yet. */
export function useDrafts(): readonly SlottedDraft[] {
  const { id } = usePerson()
  return useSyncExternalStore(followDrafts, () => draftsOf(id))
}
