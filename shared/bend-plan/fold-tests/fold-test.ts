import type { PlanCheck } from '../plan.schema'
import type { FoldSetup } from '../fold-setup'

/** What was found and the limit it breaks, in the unit of the check; null where there is no figure. */
export interface FoldFailure {
  readonly found: number | null
  readonly limit: number | null
}

export interface FoldTest {
  readonly check: PlanCheck
  /**
   * What the answer depends on besides bend and orientation, so that it can be remembered: nothing,
   * the hems made, the bends made on one side, or all bends made. `piece`: all bends made, and the
   * answer is the same in every orientation.
   */
  readonly sees: 'bend' | 'hems' | 'front' | 'rear' | 'piece' | 'all'
  /** A fold that fails on the flat sheet fails on every bent one: more bends never help. */
  readonly neverEases: boolean
  /** Undefined when the fold may be made. */
  readonly find: (setup: FoldSetup) => FoldFailure | undefined
}

export const NO_FIGURE: FoldFailure = { found: null, limit: null }
