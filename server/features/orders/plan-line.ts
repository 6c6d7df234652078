import type { PlannedBrake, Planner } from '#server/planning/planner'
import { profileErrors } from '#server/planning/profile-errors'
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

/** A plan a brake; none where the stock has changed so that the line cannot be made of it. */
export async function planLine({
  line,
  stock,
  brakes,
  planner,
  signal,
}: LineToPlan): Promise<BrakePlan[]> {
  if (profileErrors(line.profile, stock, '').length > 0) return []
  return planner.planOnAll(line.profile, stock.sheet, line.length, brakes, {
    ...(signal && { signal }),
  })
}
