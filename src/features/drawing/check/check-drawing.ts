import type { Plan } from '#shared/bend-plan/plan.schema'
import { planProfile, type PlanOptions } from '#shared/bend-plan/plan-profile'
import type { ShopBrake } from '#shared/brakes/brakes.contract'
import { hasErrors, type ProfileProblem } from '#shared/profile/problem'
import type { Part } from '#shared/drawing/display-list'
import { profileProblems } from '#shared/profile/problems'
import type { Profile } from '#shared/profile/profile.schema'
import { stockLimits } from '#shared/profile/stock-limits'
import type { Stock } from '#shared/stock/stock.schema'
import { flatStrip } from '#shared/strip/flat-strip'
import type { Strip } from '#shared/strip/strip.schema'
import { pieceWeight } from '#shared/strip/weight'
import type { Inches, Pounds } from '#shared/units/brands'

export interface CheckedPlan {
  readonly brakeId: string
  readonly brakeName: string
  readonly plan: Plan
}

/** All that the answer bar says of a drawing, computed here and now with the server's own code. */
export interface DrawingCheck {
  readonly problems: readonly ProfileProblem[]
  /** Null while the drawing cannot be made. */
  readonly strip: Strip | null
  readonly weight: Pounds | null
}

export function checkDrawing(profile: Profile, stock: Stock, pieceLength: Inches): DrawingCheck {
  const problems = profileProblems(profile, stock.sheet, stockLimits(stock))
  if (hasErrors(problems)) return { problems, strip: null, weight: null }
  const strip = flatStrip(profile, stock.sheet)
  return { problems, strip, weight: pieceWeight(strip, stock.sheet, pieceLength) }
}

/** The plan on every brake; none while the drawing has errors. */
export const planOnBrakes = (
  profile: Profile,
  stock: Stock,
  pieceLength: Inches,
  brakes: readonly ShopBrake[],
  options: PlanOptions = {},
): CheckedPlan[] =>
  brakes.map(({ id, brake }) => ({
    brakeId: id,
    brakeName: brake.name,
    plan: planProfile(profile, stock.sheet, brake, pieceLength, options),
  }))

/** The parts of the figure that a problem speaks of. */
export function partsOfProblem(problem: ProfileProblem): Part[] {
  const parts: Part[] = []
  if (problem.leg !== null) parts.push({ kind: 'leg', leg: problem.leg })
  if (problem.otherLeg !== null) parts.push({ kind: 'leg', leg: problem.otherLeg })
  if (problem.bend !== null) parts.push({ kind: 'bend', bend: problem.bend })
  if (problem.hem !== null) parts.push({ kind: 'hem', edge: problem.hem })
  return parts
}
