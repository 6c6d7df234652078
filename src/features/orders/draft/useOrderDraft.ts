import { useMemo, useSyncExternalStore } from 'react'
import { usePerson } from '@/features/people/person-context'
import {
  amendSlot,
  changeSlot,
  clearSlot,
  dropBroken,
  followDrafts,
  newOrderSlot,
  readSlot,
  type KeptDraft,
  type Slot,
} from './draft-store'
import {
  withGoods,
  withLine,
  withLinePatch,
  withLines,
  withoutLine,
  type DraftFields,
  type DraftGood,
  type DraftLine,
  type LinePatch,
  type OrderDraft,
} from './order-draft'

export interface OrderDraftHandle extends KeptDraft {
  readonly slot: Slot
  /** At the end unless a place is named. */
  readonly addLine: (line: DraftLine, at?: number) => void
  readonly updateLine: (key: string, patch: LinePatch) => void
  readonly removeLine: (key: string) => void
  readonly setLines: (lines: readonly DraftLine[]) => void
  readonly setGoods: (goods: readonly DraftGood[]) => void
  readonly setFields: (patch: DraftFields) => void
  readonly replace: (draft: OrderDraft) => void
  readonly clear: () => void
  readonly dismissBroken: () => void
}

/** The draft kept in a slot, and its changes; every change is on the device before it is on screen. */
export function useDraftSlot(slot: Slot): OrderDraftHandle {
  const kept = useSyncExternalStore(followDrafts, () => readSlot(slot))
  return useMemo(
    () => ({
      ...kept,
      slot,
      addLine: (line, at) => changeSlot(slot, (draft) => withLine(draft, line, at)),
      updateLine: (key, patch) => changeSlot(slot, (draft) => withLinePatch(draft, key, patch)),
      removeLine: (key) => changeSlot(slot, (draft) => withoutLine(draft, key)),
      setLines: (lines) => changeSlot(slot, (draft) => withLines(draft, lines)),
      setGoods: (goods) => changeSlot(slot, (draft) => withGoods(draft, goods)),
      setFields: (patch) => changeSlot(slot, (draft) => ({ ...draft, ...patch })),
      replace: (next) => changeSlot(slot, () => next),
      clear: () => clearSlot(slot),
      dismissBroken: () => dropBroken(slot),
    }),
    [kept, slot],
  )
}

/**
 * The order a person is writing for a job, kept on the device: a reload, a dead battery or no signal
 * loses nothing. With `orderId` it is the amendment of that order instead.
 *
 *     const { draft, addLine } = useOrderDraft(jobId)
 *     addLine({ ...PLAIN_LINE, key: newKey(), mark: nextMark(draft), name, profile, stockId, length: 120 })
 */
export function useOrderDraft(jobId: string, orderId: string | null = null): OrderDraftHandle {
  const { id } = usePerson()
  return useDraftSlot(orderId === null ? newOrderSlot(id, jobId) : amendSlot(id, orderId))
}
