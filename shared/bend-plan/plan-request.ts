import type { Sheet } from '#shared/stock/stock.schema'
import type { ColorSide } from '#shared/profile/profile.schema'
import type { Inches } from '#shared/units/brands'
import type { Brake } from './brake.schema'
import type { Section } from './plan.schema'

export interface PlanRequest {
  readonly section: Section
  readonly sheet: Sheet
  readonly brake: Brake
  readonly pieceLength: Inches
  readonly paintedSide: ColorSide
  /** Overlaps and contacts in the reasons of a piece that cannot be bent; not unless asked for. */
  readonly explain?: boolean
  readonly limits?: {
    /** Folds tested, in the worst case, before the planner answers with the best so far. */
    readonly nodes?: number
    /**
     * Asked before each fold that is looked at; once true it must stay true, and the search ends as at
     * the limit on nodes. For callers that have a clock: such an answer depends on the machine.
     */
    readonly isOver?: () => boolean
  }
}
