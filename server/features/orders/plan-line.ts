import { brakesFor } from '#server/planning/brakes-for'
import type { PlannedBrake, Planner } from '#server/planning/planner'
import type { OrderLineInput } from '#shared/orders/order.schema'
import type { BrakePlan } from '#shared/plans/plans.contract'
import type { Stock } from '#shared/stock/stock.schema'

export interface LineToPlan {
  readonly line: Pick<OrderLineInput, 'profile' | 'length'>
  readonly stock: Stock
  readonly brakes: readonly PlannedBrake[]
  readonly planner: Planner
  readonly signal?: AbortSignal | undefined
}

/** A plan for every brake on which the stock leaves room for the line; it may be none. */
export async function planLine({
  line,
  stock,
  brakes,
  planner,
  signal,
}: LineToPlan): Promise<BrakePlan[]> {
  const able = brakesFor(line.profile, stock, brakes, '').brakes
  if (able.length === 0) return []
  return planner.planOnAll(line.profile, stock, line.length, able, {
    ...(signal && { signal }),
  })
}
