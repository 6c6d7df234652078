import { useLayoutEffect } from 'react'
import { Outlet } from 'react-router-dom'
import { PLACES_OF, type Place } from '#shared/access/permissions'
import { usePerson } from '@/features/people/person-context'
import { PlaceContext } from '@/pages/shell/place-context'
import { RefusalPage } from '@/pages/shell/RefusalPage'

/**
 * The door of a place: sets the sizes of the place (`data-place`) and keeps those out who do not
 * work there. Without a place it is the first one of the person's role.
 */
export function PlaceRoute({ place }: { readonly place?: Place }) {
  const places = PLACES_OF[usePerson().role]
  const here = place ?? places[0]

  useLayoutEffect(() => {
    document.documentElement.dataset.place = here
  }, [here])

  if (!places.includes(here)) return <RefusalPage place={here} />
  return (
    <PlaceContext value={here}>
      <Outlet />
    </PlaceContext>
  )
}
