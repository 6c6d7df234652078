import type { PlanCost } from '#shared/bend-plan/plan.schema'
import type { BrakePlan } from '#shared/plans/plans.contract'

const costOrder = (a: PlanCost, b: PlanCost): number =>
  a.handling - b.handling || a.wideFront - b.wideFront || a.faceGauge - b.faceGauge

/** The feasible plan that costs least; of equals the first, so the shop's order of brakes decides. */
export function findCheapestPlan(plans: readonly BrakePlan[]): BrakePlan | undefined {
  let best: { plan: BrakePlan; cost: PlanCost } | undefined
  for (const plan of plans) {
    const { feasible, cost } = plan.plan
    if (!feasible || cost === null) continue
    if (best === undefined || costOrder(cost, best.cost) < 0) best = { plan, cost }
  }
  return best?.plan
}
