import type { Brake } from '#shared/bend-plan/brake.schema'
import type { BrakePlan } from '#shared/plans/plans.contract'
import type { Profile } from '#shared/profile/profile.schema'
import type { CalibratedSheet } from '#shared/stock/sheet-on'
import type { Inches } from '#shared/units/brands'

/** A brake of the shop, as far as planning asks for it. */
export interface PlannedBrake {
  readonly id: string
  readonly brake: Brake
}

/** How far plans under way have come. */
export interface PlanningProgress {
  /** Folds looked at so far, over all brakes. */
  readonly nodes: number
  /** Milliseconds since they were asked for. */
  readonly elapsed: number
}

export interface PlanningOptions {
  /** Ends the wait of this asker; what nobody else waits for is given up. */
  readonly signal?: AbortSignal
  /** Called now and then where planning takes long; not at all where it does not. */
  readonly onProgress?: (progress: PlanningProgress) => void
}

/** Where bend plans come from: a port. */
export interface Planner {
  /**
   * One plan a brake, in the order of `brakes`, each by the stock's sheet on that brake. The profile
   * must be free of errors there (`brakesFor`); the kernel's RangeError passes through otherwise.
   *
   * @throws not-ready where too much waits already or the time is over; the signal's reason
   */
  readonly planOnAll: (
    profile: Profile,
    stock: CalibratedSheet,
    pieceLength: Inches,
    brakes: readonly PlannedBrake[],
    options?: PlanningOptions,
  ) => Promise<BrakePlan[]>
}
