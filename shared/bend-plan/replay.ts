import { isEqual } from '#shared/geometry/tolerance'
import { createFeasibility } from './feasibility'
import type { FailedCheck } from './feasibility'
import { foldGroundOf } from './fold-setup'
import { operationCost } from './operation-cost'
import { orientationNumber } from './orientation'
import { unpackCost } from './packed-cost'
import type { Plan, PlanCost, PlanReason, PlanStep } from './plan.schema'
import { pieceReasons } from './plan-reasons'
import type { PlanRequest } from './plan-request'
import { planSteps } from './plan-steps'
import type { Operation } from './search-ground'
import { allBends } from './workpiece'

export type ReplayProblem =
  /** The piece does not go on the brake at all. */
  | { readonly code: 'piece'; readonly reason: PlanReason }
  /** A step names a bend the section does not have, or one made before. */
  | { readonly code: 'unknownBend' | 'madeBefore'; readonly step: number }
  /** A step fails a test of the fold. */
  | {
      readonly code: 'test'
      readonly step: number
      readonly failure: FailedCheck
    }
  /** A figure of the step is not what the section and the brake give. */
  | {
      readonly code: 'figure'
      readonly step: number
      readonly figure: keyof PlanStep
    }
  /** The steps end before the piece is finished. */
  | { readonly code: 'unfinished' }

export interface Replay {
  readonly problems: readonly ReplayProblem[]
  /** The cost of the steps as given. */
  readonly cost: PlanCost
}

const isSameFigure = (a: PlanStep[keyof PlanStep], b: PlanStep[keyof PlanStep]): boolean =>
  typeof a === 'number' && typeof b === 'number' ? isEqual(a, b) : a === b

const FIGURES = [
  'move',
  'direction',
  'angle',
  'swing',
  'hits',
  'gauge',
  'restsOn',
  'scaleAngle',
] as const satisfies readonly (keyof PlanStep)[]

/**
 * Goes through the steps of a plan as they are written down, with the same tests, and adds up what
 * they cost. No problems means that every step may be made and the piece comes out finished.
 */
export const replayPlan = (plan: Plan, request: PlanRequest): Replay => {
  const { section, sheet, brake, pieceLength } = request
  const ground = foldGroundOf(section, sheet, brake)
  const { bends } = ground.piece
  const feasibility = createFeasibility(ground)
  const cost = operationCost(ground, pieceLength)
  const problems: ReplayProblem[] = pieceReasons(request).map((reason) => ({
    code: 'piece',
    reason,
  }))

  const operations: Operation[] = []
  const places: number[] = []
  let made = 0
  let spent = 0
  plan.steps.forEach((step, at) => {
    const bend = bends.find((each) => each.fold === step.bend)
    if (bend === undefined) {
      problems.push({ code: 'unknownBend', step: at })
      return
    }
    const bit = 1 << bend.index
    if ((made & bit) !== 0) {
      problems.push({ code: 'madeBefore', step: at })
      return
    }
    const orientation = orientationNumber(step)
    const failure = feasibility.firstFailure(made, bend, orientation)
    if (failure !== undefined) problems.push({ code: 'test', step: at, failure })
    const before = operations.at(-1)
    if (before !== undefined) spent += cost.move(before.orientation, orientation)
    spent += cost.fixed(bend, orientation) + cost.gauge(made, bend, orientation)
    operations.push({ bend: bend.index, orientation })
    places.push(at)
    made |= bit
  })
  planSteps(ground, operations).forEach((expected, i) => {
    const at = places[i] ?? i
    const given = plan.steps[at]
    for (const figure of FIGURES) {
      if (given === undefined || !isSameFigure(given[figure], expected[figure])) {
        problems.push({ code: 'figure', step: at, figure })
      }
    }
  })
  if (made !== allBends(ground.piece)) problems.push({ code: 'unfinished' })
  return { problems, cost: unpackCost(spent) }
}
