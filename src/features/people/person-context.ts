import { createContext, useContext } from 'react'
import { may, type Permission } from '#shared/access/permissions'
import type { Self } from '#shared/people/people.contract'

export const PersonContext = createContext<Self | null>(null)

/** The person who is signed in. Throws outside the signed-in part of the product. */
export function usePerson(): Self {
  const person = useContext(PersonContext)
  if (!person) throw new Error('usePerson is for screens of a person who is signed in.')
  return person
}

/** Whether the person may do it: the same table that guards the route on the server. */
export function useMay(permission: Permission): boolean {
  return may(usePerson().role, permission)
}
