import { changedMeanwhile, wrongState, type ProblemError } from '#server/http/errors'
import type { Order, OrderEvent } from '#shared/orders/order.schema'

const ENDS: Partial<Record<OrderEvent['kind'], string>> = {
  released: 'released',
  withdrawn: 'withdrew',
}

/** Why a change of an order came too late: who ended it and when, or that its version is old. */
export function orderConflict(order: Order): ProblemError {
  const end = order.events.findLast(({ kind }) => ENDS[kind] !== undefined)
  if (!end) return changedMeanwhile(order)
  return wrongState(`${end.by} ${ENDS[end.kind]} this order at ${end.at}.`, order)
}
