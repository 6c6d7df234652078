import type { Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import type { Inches } from '#shared/units/brands'
import type { Brake } from './brake.schema'
import { withFloorData } from './floor-data'
import type { Plan } from './plan.schema'
import type { PlanRequest } from './plan-request'
import { planBends } from './planner'
import { sectionOf } from './section'

/**
 * Plans a profile as the crew draws it. Throws RangeError where the profile has a leg shorter than its
 * bends consume: ask for the profile's problems first. `limits` as for `planBends`.
 */
export const planProfile = (
  profile: Profile,
  sheet: Sheet,
  brake: Brake,
  pieceLength: Inches,
  limits?: PlanRequest['limits'],
): Plan => {
  const section = sectionOf(profile, sheet)
  const paintedSide = profile.colorSide
  const plan = planBends({ section, sheet, brake, pieceLength, paintedSide, limits })
  return withFloorData(plan, profile, sheet, brake)
}
