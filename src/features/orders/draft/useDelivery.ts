import { useMutation, useMutationState, useQueryClient } from '@tanstack/react-query'
import { useEffect, useRef } from 'react'
import type { Order } from '#shared/orders/order.schema'
import { mayPass } from '@/lib/api/api-errors'
import { retryDelay } from '@/lib/api/retry'
import { useStoreOrder } from '../api/orders.mutations'
import { orderQuery } from '../api/orders.queries'
import { deliverDraft, slotTarget } from './deliver-draft'
import { changeSlot, clearSlot, readSlot, type Slot } from './draft-store'

const deliveryKey = (draftKey: string) => ['orders', 'deliver', draftKey] as const

/** The person took the order back before an answer came, to write on. */
class DeliveryStopped extends Error {
  override readonly name = 'DeliveryStopped'
}

const isWanted = (slot: Slot, draftKey: string): boolean => {
  const { draft } = readSlot(slot)
  return draft.sending && draft.key === draftKey
}

/**
 * Sends the draft of a slot once it is mounted, and again for as long as no answer comes: the draft
 * waits on the device, its key makes it one order. Any other answer ends the sending.
 */
export function useDelivery(
  slot: Slot,
  draftKey: string,
  onDelivered: (order: Order) => void,
): void {
  const client = useQueryClient()
  const storeOrder = useStoreOrder()
  const started = useRef(false)
  const { mutate } = useMutation({
    mutationKey: deliveryKey(draftKey),
    mutationFn: () => {
      if (!isWanted(slot, draftKey)) throw new DeliveryStopped('The order was taken back.')
      return deliverDraft(slot, readSlot(slot).draft)
    },
    retry: (_failures, error) => mayPass(error),
    retryDelay,
    onSuccess: async (order) => {
      const stored = storeOrder(order)
      // Taken back while the answer was on its way: what was written since stays, and sending it
      // is answered with "that key was used", which the form explains.
      if (isWanted(slot, draftKey)) {
        clearSlot(slot)
        onDelivered(order)
      }
      await stored
    },
    onError: async () => {
      if (isWanted(slot, draftKey)) {
        changeSlot(slot, (draft) => ({ ...draft, sending: false }))
      }
      // Refused because somebody was faster: the form compares with what is there now.
      const { kind, id } = slotTarget(slot)
      if (kind === 'amend') {
        await client.invalidateQueries({ queryKey: orderQuery(id).queryKey })
      }
    },
  })

  useEffect(() => {
    if (started.current) return
    started.current = true
    mutate()
  }, [mutate])
}

export interface DeliveryState {
  /** The last attempt got no answer: it waits for a signal. */
  readonly waiting: boolean
  /** Why the last sending ended without an order; null while none did. */
  readonly error: Error | null
}

/** How the sending of a draft stands, on whatever screen it was begun. */
export function useDeliveryState(draftKey: string): DeliveryState {
  const last = useMutationState({
    filters: { mutationKey: deliveryKey(draftKey) },
    select: ({ state }) => state,
  }).at(-1)
  const ended = last?.status === 'error' && !(last.error instanceof DeliveryStopped)
  return {
    waiting: last?.status === 'pending' && (last.failureCount > 0 || last.isPaused),
    error: ended ? last.error : null,
  }
}
