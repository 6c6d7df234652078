import { paths } from '@/app/paths'
import { slotTarget } from '@/features/orders/draft/deliver-draft'
import type { Slot } from '@/features/orders/draft/draft-store'

/** Where the draft of a slot is written. */
export function draftPath(slot: Slot): string {
  const { kind, id } = slotTarget(slot)
  return kind === 'new' ? paths.roof.newOrder(id) : paths.roof.amendOrder(id)
}
