import type { PlanCost } from '#shared/bend-plan/plan.schema'
import type { BrakePlan } from '#shared/plans/plans.contract'

/** What waits at a brake. */
export interface BrakeLoad {
  /** Somebody holds a run there that is not all bent. */
  readonly busy: boolean
  /** Pieces still to be bent. */
  readonly queued: number
}

const NO_LOAD: BrakeLoad = { busy: false, queued: 0 }

const costOrder = (a: PlanCost, b: PlanCost): number =>
  a.handling - b.handling || a.wideFront - b.wideFront || a.faceGauge - b.faceGauge

/** The plans that bend it and cost least, in the order given; none where no brake bends it. */
export function listCheapest(plans: readonly BrakePlan[]): BrakePlan[] {
  let least: PlanCost | undefined
  let cheapest: BrakePlan[] = []
  for (const plan of plans) {
    const { feasible, cost } = plan.plan
    if (!feasible || cost === null) continue
    const order = least === undefined ? -1 : costOrder(cost, least)
    if (order > 0) continue
    cheapest = order < 0 ? [plan] : [...cheapest, plan]
    least = cost
  }
  return cheapest
}

/** Of equals a free brake before a busy one, then the least queued, then the first. */
export function findFreest(
  plans: readonly BrakePlan[],
  loads: ReadonlyMap<string, BrakeLoad>,
): BrakePlan | undefined {
  const loadOf = ({ brakeId }: BrakePlan) => loads.get(brakeId) ?? NO_LOAD
  return plans.toSorted((a, b) => {
    const [one, two] = [loadOf(a), loadOf(b)]
    return Number(one.busy) - Number(two.busy) || one.queued - two.queued
  })[0]
}
