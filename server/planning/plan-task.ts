import type { Brake } from '#shared/bend-plan/brake.schema'
import type { Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import type { Inches } from '#shared/units/brands'

/** One plan to be made: a profile on a brake. */
export interface PlanTask {
  readonly profile: Profile
  readonly sheet: Sheet
  readonly brake: Brake
  readonly pieceLength: Inches
}
