import {
  gatherRuns,
  runKind,
  type PlannedLine,
  type PlannedRun,
} from '#server/features/orders/gather-runs'
import { endErrors } from '#server/features/orders/line-strip'
import type { StoredLine } from '#server/features/orders/orders.queries'
import { overridePath, overridesByLine } from '#server/features/orders/release-overrides'
import { cannotBend, invalidInput, profileProblem } from '#server/http/errors'
import { brakesFor, type BrakesFor } from '#server/planning/brakes-for'
import { findFreest, listCheapest, type BrakeLoad } from '#server/planning/choose-brake'
import { planReasonText } from '#server/planning/plan-reason-text'
import type { Planner } from '#server/planning/planner'
import type { ShopBrake } from '#shared/brakes/brakes.contract'
import type { FieldError } from '#shared/http/problem'
import type { OverrideInput } from '#shared/orders/override.schema'
import type { BrakePlan } from '#shared/plans/plans.contract'
import type { Stock } from '#shared/stock/stock.schema'

export interface ReleaseInput {
  readonly lines: readonly StoredLine[]
  readonly stocks: ReadonlyMap<string, Stock>
  /** In the shop's order. */
  readonly brakes: readonly ShopBrake[]
  readonly loads: ReadonlyMap<string, BrakeLoad>
  readonly overrides: readonly OverrideInput[]
  /** Who answers for the overrides. */
  readonly by: string
  readonly at: Date
  readonly planner: Planner
}

interface LineMadeOf {
  readonly line: StoredLine
  readonly stock: Stock
  readonly plans: readonly BrakePlan[]
}

/**
 * Chooses a brake for every line and gathers the lines into runs. Of the brakes whose plan costs
 * least a line goes to the one that a line of its run went to already, then to a free one before a
 * busy one, then to the one with the least to bend, what this release brings included, then to the
 * shop's first.
 *
 * @throws profile-problem where the pitch or a stock has changed so that a line or its ends cannot be
 *   made any more
 * @throws invalid-input for an override that names nothing, or a line that bends
 * @throws cannot-bend naming every line that bends nowhere, with each brake's reasons
 */
export async function planRelease(input: ReleaseInput): Promise<PlannedRun[]> {
  const { lines, brakes, overrides } = input
  const overrideOf = overridesByLine(overrides, lines, brakes)
  const madeOf = await planLines(input, overrideOf)
  checkOverrides(madeOf, overrides)
  checkAllBend(
    madeOf.filter(({ line }) => !overrideOf.has(line.id)),
    lines,
  )

  const brakeById = new Map(brakes.map((brake) => [brake.id, brake]))
  const loads = new Map(input.loads)
  const brakeOfKind = new Map<string, string>()
  const planned = madeOf.map(({ line, stock, plans }): PlannedLine => {
    const given = overrideOf.get(line.id)
    const kind = runKind(line)
    const chosen = given
      ? plans.find(({ brakeId }) => brakeId === given.brakeId)
      : chooseBrake(plans, loads, brakeOfKind.get(kind))
    if (!chosen) throw new Error(`Line ${line.id} has no plan to be released by.`)
    const { brakeId, plan } = chosen
    if (!given) brakeOfKind.set(kind, brakeId)
    const { busy, queued } = loads.get(brakeId) ?? { busy: false, queued: 0 }
    loads.set(brakeId, { busy, queued: queued + line.quantity })
    const override = given && { by: input.by, at: input.at.toISOString(), reason: given.reason }
    return { line, stock, brake: getById(brakeById, brakeId), plan, override: override ?? null }
  })
  const runs = gatherRuns(planned)
  checkEnds(runs, lines)
  return runs
}

async function planLines(
  { lines, stocks, brakes, planner }: ReleaseInput,
  overrideOf: ReadonlyMap<string, OverrideInput>,
): Promise<LineMadeOf[]> {
  const madeOf = lines.map((line, index) => {
    const stock = getById(stocks, line.stockId)
    return { line, stock, able: brakesFor(line.profile, stock, brakes, `lines.${index}.profile`) }
  })
  const problems = madeOf.flatMap(({ line, able }) => unmakeable(able, overrideOf.get(line.id)))
  if (problems.length > 0) throw profileProblem(problems)
  const planned: LineMadeOf[] = []
  for (const { line, stock, able } of madeOf) {
    const plans = await planner.planOnAll(line.profile, stock, line.length, able.brakes)
    planned.push({ line, stock, plans })
  }
  return planned
}

/** Ends that the sheet of the line's brake, or a drawing that followed the roof, leaves no room for. */
function checkEnds(runs: readonly PlannedRun[], lines: readonly StoredLine[]): void {
  const errors = runs.flatMap((run) =>
    run.lines.flatMap((line) => endErrors(line, run.stock.sheet, `lines.${lines.indexOf(line)}`)),
  )
  if (errors.length > 0) throw profileProblem(errors)
}

/**
 * What keeps a line from being made at all: of the brake that an override names, or else of the
 * first where it can be made on none.
 */
function unmakeable(able: BrakesFor<ShopBrake>, override: OverrideInput | undefined): FieldError[] {
  if (override) return able.errorsOn.get(override.brakeId) ?? []
  if (able.brakes.length > 0) return []
  const [first] = able.errorsOn.values()
  return first ?? []
}

function chooseBrake(
  plans: readonly BrakePlan[],
  loads: ReadonlyMap<string, BrakeLoad>,
  ofItsRun: string | undefined,
): BrakePlan | undefined {
  const cheapest = listCheapest(plans)
  return cheapest.find(({ brakeId }) => brakeId === ofItsRun) ?? findFreest(cheapest, loads)
}

/** An override stands for what is not known to bend; where a brake bends it there is nothing to answer for. */
function checkOverrides(madeOf: readonly LineMadeOf[], overrides: readonly OverrideInput[]): void {
  const errors = madeOf.flatMap(({ line, plans }) => {
    const [best] = listCheapest(plans)
    if (!best || !overrides.some(({ lineId }) => lineId === line.id)) return []
    const message = `Line ${line.mark} bends on ${best.brakeName}. Release it without an override.`
    return [{ path: overridePath(overrides, line.id), message }]
  })
  if (errors.length > 0) throw invalidInput(errors)
}

function checkAllBend(madeOf: readonly LineMadeOf[], lines: readonly StoredLine[]): void {
  const stuck = madeOf.filter(({ plans }) => listCheapest(plans).length === 0)
  if (stuck.length === 0) return
  const marks = stuck.map(({ line }) => line.mark).join(', ')
  throw cannotBend(
    `No brake of the shop bends line ${marks} under the checks made. Nothing was released.`,
    stuck.flatMap(({ line, plans }) => reasonErrors(plans, `lines.${lines.indexOf(line)}`)),
  )
}

const reasonErrors = (plans: readonly BrakePlan[], path: string): FieldError[] =>
  plans.length === 0
    ? [{ path, message: 'The shop has no brakes.' }]
    : plans.flatMap(({ brakeName, plan }) =>
        plan.reasons.map((reason) => ({
          path,
          message: `${brakeName}: ${planReasonText(reason)}.`,
          code: reason.code,
        })),
      )

function getById<Value>(values: ReadonlyMap<string, Value>, id: string): Value {
  const value = values.get(id)
  if (value === undefined) throw new Error(`${id} is asked for at release and not there.`)
  return value
}
