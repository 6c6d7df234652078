import type { Brake } from '#shared/bend-plan/brake.schema'
import type { BrakePlan } from '#shared/plans/plans.contract'
import type { Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import type { Inches } from '#shared/units/brands'

/** A brake of the shop, as far as planning asks for it. */
export interface PlannedBrake {
  readonly id: string
  readonly brake: Brake
}

/** Where bend plans come from: a port, so that planning can leave the request's thread. */
export interface Planner {
  /**
   * One plan a brake, in the order of `brakes`. The profile must be free of errors
   * (`profileProblems`); the planner's RangeError passes through otherwise.
   */
  readonly planOnAll: (
    profile: Profile,
    sheet: Sheet,
    pieceLength: Inches,
    brakes: readonly PlannedBrake[],
  ) => Promise<BrakePlan[]>
}
