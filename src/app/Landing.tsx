import { Navigate } from 'react-router-dom'
import { PLACES_OF } from '#shared/access/permissions'
import { paths } from '@/app/paths'
import { usePerson } from '@/features/people/person-context'

/** Nobody stays at the door: on to the first place of the role. */
export function Landing() {
  const [first] = PLACES_OF[usePerson().role]
  return <Navigate to={paths.place(first)} replace />
}
