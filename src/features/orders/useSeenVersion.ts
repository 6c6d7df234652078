import { useState } from 'react'
import type { Order, OrderEvent } from '#shared/orders/order.schema'

/**
 * The version that the person has looked at. Live events put a newer one on screen by themselves:
 * until it is looked at, nobody should release what they have not seen. `own` are the answers to
 * the person's own changes.
 */
export function useSeenVersion(
  { version, events }: Order,
  own: readonly (Pick<Order, 'version'> | undefined)[],
): { readonly unseen: OrderEvent | null; readonly look: (version: number) => void } {
  const [looked, look] = useState(version)
  const seen = Math.max(looked, ...own.map((answer) => answer?.version ?? 0))
  return { unseen: version > seen ? (events.at(-1) ?? null) : null, look }
}
