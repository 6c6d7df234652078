import { createHash } from 'node:crypto'
import { bendingShape } from '#server/planning/bending-shape'
import { KERNEL_VERSION } from '#server/planning/kernel-version'
import { KeptValues } from '#server/planning/kept-values'
import type { PlannedBrake, Planner } from '#server/planning/planner'
import { planProfile } from '#shared/bend-plan/plan-profile'
import type { Plan } from '#shared/bend-plan/plan.schema'
import type { Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import type { Inches } from '#shared/units/brands'

const MOST_PLANS = 1000

const planKey = (profile: Profile, sheet: Sheet, brake: PlannedBrake['brake'], length: Inches) =>
  createHash('sha256')
    .update(JSON.stringify([KERNEL_VERSION, bendingShape(profile), sheet, brake, length]))
    .digest('base64')

/**
 * Plans in this thread. The plans kept in memory only save time: the same request gives the same
 * plan in every process.
 */
export function createLocalPlanner(): Planner {
  const kept = new KeptValues<Plan>(MOST_PLANS)
  return {
    planOnAll: (profile, sheet, pieceLength, brakes) =>
      Promise.resolve().then(() =>
        brakes.map(({ id, brake }) => ({
          brakeId: id,
          brakeName: brake.name,
          plan: kept.getOrMake(planKey(profile, sheet, brake, pieceLength), () =>
            planProfile(profile, sheet, brake, pieceLength),
          ),
        })),
      ),
  }
}
