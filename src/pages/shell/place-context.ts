import { createContext, useContext } from 'react'
import type { Place } from '#shared/access/permissions'

export const PlaceContext = createContext<Place | null>(null)

/** The place that the person stands in. */
export function usePlace(): Place {
  const place = useContext(PlaceContext)
  if (!place) throw new Error('usePlace is for screens inside a place.')
  return place
}
