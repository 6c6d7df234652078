import type { Order } from '#shared/orders/order.schema'
import type { Slot } from '../draft/draft-store'
import { useDelivery } from '../draft/useDelivery'
import { useDrafts } from '../draft/useDrafts'

interface Props {
  /** Told when an order has arrived, with the slot it was written in. */
  readonly onDelivered: (slot: Slot, order: Order) => void
}

/** Sends every submitted order of this device, whichever screen is open, after a reload too. */
export function Deliveries({ onDelivered }: Props) {
  return useDrafts()
    .filter(({ draft }) => draft.sending)
    .map(({ slot, draft }) => (
      <Delivery key={draft.key} slot={slot} draftKey={draft.key} onDelivered={onDelivered} />
    ))
}

function Delivery({
  slot,
  draftKey,
  onDelivered,
}: Props & { readonly slot: Slot; readonly draftKey: string }) {
  useDelivery(slot, draftKey, (order) => onDelivered(slot, order))
  return null
}
