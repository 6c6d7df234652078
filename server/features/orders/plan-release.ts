import type { StoredLine } from '#server/features/orders/orders.queries'
import { cannotBend, profileProblem } from '#server/http/errors'
import { bendingShape } from '#server/planning/bending-shape'
import { findCheapestPlan } from '#server/planning/cheapest-plan'
import { planReasonText } from '#server/planning/plan-reason-text'
import type { Planner } from '#server/planning/planner'
import { profileErrors } from '#server/planning/profile-errors'
import type { ShopBrake } from '#shared/brakes/brakes.contract'
import type { FieldError } from '#shared/http/problem'
import type { BrakePlan } from '#shared/plans/plans.contract'
import type { Stock } from '#shared/stock/stock.schema'
import { flatStrip } from '#shared/strip/flat-strip'
import type { Strip } from '#shared/strip/strip.schema'

/** Lines that are bent one after another: one shape of one stock on one brake. */
export interface PlannedRun {
  /** The lines in the order's order; at least one. */
  readonly lines: readonly [StoredLine, ...StoredLine[]]
  readonly stock: Stock
  readonly strip: Strip
  readonly brake: ShopBrake
  /** Made for the longest of the lines: what turns the longest piece turns the shorter ones. */
  readonly plan: BrakePlan['plan']
}

interface PlannedLine {
  readonly line: StoredLine
  readonly stock: Stock
  readonly chosen: BrakePlan
}

/**
 * Chooses a brake for every line (the cheapest plan, then the shop's order of brakes) and gathers
 * the lines into runs.
 *
 * @throws profile-problem where a stock has changed so that a line cannot be made of it any more
 * @throws cannot-bend naming every line that bends nowhere, with each brake's reasons
 */
export async function planRelease(
  lines: readonly StoredLine[],
  stocks: ReadonlyMap<string, Stock>,
  brakes: readonly ShopBrake[],
  planner: Planner,
): Promise<PlannedRun[]> {
  const madeOf = lines.map((line) => ({ line, stock: getById(stocks, line.stockId) }))
  const problems = madeOf.flatMap(({ line, stock }, index) =>
    profileErrors(line.profile, stock, `lines.${index}.profile`),
  )
  if (problems.length > 0) throw profileProblem(problems)

  const planned: PlannedLine[] = []
  const refused: FieldError[] = []
  const refusedMarks: string[] = []
  for (const [index, { line, stock }] of madeOf.entries()) {
    const plans = await planner.planOnAll(line.profile, stock.sheet, line.length, brakes)
    const chosen = findCheapestPlan(plans)
    if (chosen) {
      planned.push({ line, stock, chosen })
    } else {
      refusedMarks.push(line.mark)
      refused.push(...reasonErrors(plans, `lines.${index}`))
    }
  }
  if (refusedMarks.length > 0) {
    throw cannotBend(
      `No brake of the shop bends line ${refusedMarks.join(', ')} under the checks made. Nothing was released.`,
      refused,
    )
  }
  return gatherRuns(planned, new Map(brakes.map((brake) => [brake.id, brake])))
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

function gatherRuns(
  planned: readonly PlannedLine[],
  brakes: ReadonlyMap<string, ShopBrake>,
): PlannedRun[] {
  const groups = new Map<string, [PlannedLine, ...PlannedLine[]]>()
  for (const item of planned) {
    const { line, chosen } = item
    const key = JSON.stringify([bendingShape(line.profile), line.stockId, chosen.brakeId])
    const group = groups.get(key)
    if (group) group.push(item)
    else groups.set(key, [item])
  }
  return [...groups.values()].map(([first, ...rest]) => {
    const longest = rest.reduce(
      (most, item) => (item.line.length > most.line.length ? item : most),
      first,
    )
    return {
      lines: [first.line, ...rest.map(({ line }) => line)],
      stock: first.stock,
      strip: flatStrip(first.line.profile, first.stock.sheet),
      brake: getById(brakes, first.chosen.brakeId),
      plan: longest.chosen.plan,
    }
  })
}

function getById<Value>(values: ReadonlyMap<string, Value>, id: string): Value {
  const value = values.get(id)
  if (value === undefined) throw new Error(`${id} is asked for at release and not there.`)
  return value
}
