import { KeptValues } from '#server/planning/kept-values'
import { planKey } from '#server/planning/plan-key'
import type { PlanTask } from '#server/planning/plan-task'
import type { Planner } from '#server/planning/planner'
import { planProfile } from '#shared/bend-plan/plan-profile'
import type { Plan } from '#shared/bend-plan/plan.schema'
import { sheetOn } from '#shared/stock/sheet-on'

const MOST_PLANS = 1000

/** Plans in this thread, without a limit on time: for commands that have nothing else to do. */
export function createLocalPlanner(): Planner {
  const kept = new KeptValues<Plan>(MOST_PLANS)

  const planOf = (task: PlanTask): Plan => {
    const key = planKey(task)
    const { profile, sheet, brake, pieceLength } = task
    const plan = kept.find(key) ?? planProfile(profile, sheet, brake, pieceLength)
    kept.keep(key, plan)
    return plan
  }

  return {
    planOnAll: (profile, stock, pieceLength, brakes) =>
      Promise.resolve().then(() =>
        brakes.map(({ id, brake }) => ({
          brakeId: id,
          brakeName: brake.name,
          plan: planOf({ profile, sheet: sheetOn(stock, id), brake, pieceLength }),
        })),
      ),
  }
}
