import { useState } from 'react'
import { isLess } from '#shared/geometry/tolerance'
import { hasErrors } from '#shared/profile/problem'
import { ApiProblem } from '@/lib/api/api-errors'
import type { OrderDraft } from '../draft/order-draft'
import { useDeliveryState } from '../draft/useDelivery'
import type { OrderDraftHandle } from '../draft/useOrderDraft'
import { checkLine, type LineGround } from './check-line'
import { draftFaults, faultsOfErrors, stillStands, type Fault } from './order-faults'
import { dayOf } from './today'

const partFaults = (draft: OrderDraft, ground: LineGround): Fault[] =>
  draft.lines.flatMap((line, index): Fault[] => {
    const { check, ends, stock } = checkLine(line, ground)
    if (hasErrors(check?.problems ?? []))
      return [{ path: `lines.${index}.profile`, code: 'profile' }]
    const path = `lines.${index}.ends`
    if (ends && ends.problems.length > 0) return [{ path, code: 'endsFaulty' }]
    const blank = ends?.layout?.blankLength ?? 0
    // A piece that is too long by itself is a fault of its length.
    return stock &&
      line.length !== null &&
      isLess(stock.longestPiece, blank) &&
      line.length <= stock.longestPiece
      ? [{ path, code: 'blankBeyondStock', limit: stock.longestPiece }]
      : []
  })

/** The faults of the last answer, until their fields are changed. */
function useServerFaults(draft: OrderDraft, error: Error | null): Fault[] {
  const [seen, setSeen] = useState({ error, draft })
  if (seen.error !== error) setSeen({ error, draft })
  if (!(seen.error instanceof ApiProblem)) return []
  return faultsOfErrors(seen.error.fieldErrors()).filter((fault) =>
    stillStands(fault, seen.draft, draft),
  )
}

/**
 * Checking and submitting of an order that is being written. Faults are shown from the first press
 * of "submit" on.
 */
export function useOrderForm(
  { draft, setFields }: OrderDraftHandle,
  ground: LineGround,
  mayStay?: string,
) {
  const [today] = useState(() => dayOf(new Date()))
  const [presses, setPresses] = useState(0)
  const delivery = useDeliveryState(draft.key)
  const serverFaults = useServerFaults(draft, delivery.error)
  const own = [
    ...draftFaults(draft, { stocks: ground.stocks, today, ...(mayStay ? { mayStay } : {}) }),
    ...partFaults(draft, ground),
  ]
  const shown = presses > 0 ? own : []
  const faults = [
    ...shown,
    ...serverFaults.filter(({ path }) => shown.every((fault) => fault.path !== path)),
  ]

  /** Sends it, unless something is missing. `fields` are set with it. */
  function submit(fields: Partial<Pick<OrderDraft, 'amends'>> = {}) {
    if (own.length > 0) {
      setFields(fields)
      setPresses(presses + 1)
    } else {
      setFields({ ...fields, sending: true })
    }
  }

  return {
    today,
    faults,
    delivery,
    /** Presses of submit that found faults. */
    presses,
    submit,
    stop: () => setFields({ sending: false }),
  }
}

export type OrderFormState = ReturnType<typeof useOrderForm>
