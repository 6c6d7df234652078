import type { Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import type { Inches } from '#shared/units/brands'
import type { Brake } from './brake.schema'
import { profileSubject, sectionSubject } from './explain/cure-subject'
import type { CureSubject } from './explain/cure-subject'
import { findCures } from './explain/find-cures'
import { withFloorData } from './floor-data'
import type { Plan } from './plan.schema'
import type { PlanRequest } from './plan-request'
import { planBends } from './planner'
import { sectionOf } from './section'

export interface PlanOptions extends NonNullable<PlanRequest['limits']> {
  /** Overlaps, contacts and cures for a piece that cannot be bent, on by default; off while dragging. */
  readonly explain?: boolean
}

const planWithCures = (request: PlanRequest, subject: CureSubject): Plan => {
  const plan = planBends(request)
  if (plan.feasible || !plan.proven || request.explain !== true) return plan
  return { ...plan, cures: findCures(request, plan.reasons, subject) }
}

/**
 * Plans a profile as the crew draws it; where it cannot be bent, with what is in the way and what would
 * cure it. Throws RangeError where the profile has a leg shorter than its bends consume: ask for the
 * profile's problems first. Limits as for `planBends`.
 */
export const planProfile = (
  profile: Profile,
  sheet: Sheet,
  brake: Brake,
  pieceLength: Inches,
  { explain = true, ...limits }: PlanOptions = {},
): Plan => {
  const section = sectionOf(profile, sheet)
  const paintedSide = profile.colorSide
  const request = { section, sheet, brake, pieceLength, paintedSide, limits, explain }
  const plan = planWithCures(request, profileSubject(profile, sheet))
  return withFloorData(plan, profile, sheet, brake)
}

/** Plans a section as it stands and explains in the same way; its cures have no edits. */
export const planSection = (request: PlanRequest): Plan => {
  const explained = { explain: true, ...request }
  return planWithCures(explained, sectionSubject(request.section))
}
