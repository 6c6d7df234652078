import type { LineToPrice } from '#shared/pricing/price-line'
import type { DraftLine } from '../draft/order-draft'
import type { LineCheck } from './check-line'

/** A line of an order being written, to be priced; null while something that its price hangs on is missing. */
export function lineToPrice(
  { stockId, quantity, length }: DraftLine,
  { profile, check, ends }: LineCheck,
): LineToPrice | null {
  const isCounted = quantity !== null && Number.isInteger(quantity) && quantity > 0
  if (stockId === null || !isCounted || length === null || length <= 0) return null
  if (!check?.strip || !ends?.ends) return null
  return { profile, stockId, quantity, length, ends: ends.ends }
}
