import { AheadOutdated } from '#server/http/ahead-outdated'
import { planKey } from '#server/planning/plan-key'
import type { Planner } from '#server/planning/planner'
import type { Plan } from '#shared/bend-plan/plan.schema'
import { sheetOn } from '#shared/stock/sheet-on'

export interface PlannedAhead {
  /** Plans, and remembers. */
  readonly planner: Planner
  /**
   * Knows what the first one planned and plans nothing itself: for use in a transaction. Throws
   * AheadOutdated where drawing, stock or brakes are others by now.
   */
  readonly known: Planner
}

/** Planning for one request, before its transaction begins. */
export function planAhead(planner: Planner): PlannedAhead {
  const plans = new Map<string, Plan>()
  return {
    planner: {
      planOnAll: async (profile, stock, pieceLength, brakes, options) => {
        const made = await planner.planOnAll(profile, stock, pieceLength, brakes, options)
        const planOf = new Map(made.map(({ brakeId, plan }) => [brakeId, plan]))
        for (const { id, brake } of brakes) {
          const plan = planOf.get(id)
          const sheet = sheetOn(stock, id)
          if (plan) plans.set(planKey({ profile, sheet, brake, pieceLength }), plan)
        }
        return made
      },
    },
    known: {
      planOnAll: (profile, stock, pieceLength, brakes) =>
        Promise.resolve().then(() =>
          brakes.map(({ id, brake }) => {
            const sheet = sheetOn(stock, id)
            const plan = plans.get(planKey({ profile, sheet, brake, pieceLength }))
            if (!plan) throw new AheadOutdated()
            return { brakeId: id, brakeName: brake.name, plan }
          }),
        ),
    },
  }
}
