import type { Plan, PlanCost, PlanCure } from '../plan.schema'

const costOrder = (a: PlanCost, b: PlanCost): number =>
  a.handling - b.handling || a.wideFront - b.wideFront || a.faceGauge - b.faceGauge

/**
 * The cure "another brake" for a piece that one brake does not bend, with the plan that bears it out:
 * the cheapest feasible one, of equals the first. Undefined where no brake bends the piece.
 */
export const cureByOtherBrake = <Offer extends { readonly plan: Plan }>(
  offers: readonly Offer[],
): { readonly cure: PlanCure; readonly offer: Offer } | undefined => {
  let best: { readonly offer: Offer; readonly cost: PlanCost } | undefined
  for (const offer of offers) {
    const { feasible, cost } = offer.plan
    if (!feasible || cost === null) continue
    if (best === undefined || costOrder(cost, best.cost) < 0) best = { offer, cost }
  }
  return (
    best && {
      cure: { code: 'anotherBrake', bend: null, leg: null, value: null, edit: null },
      offer: best.offer,
    }
  )
}
