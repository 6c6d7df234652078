import type { StoredLine } from '#server/features/orders/orders.queries'
import { bendingShape } from '#server/planning/bending-shape'
import type { ShopBrake } from '#shared/brakes/brakes.contract'
import type { Override } from '#shared/orders/override.schema'
import type { BrakePlan } from '#shared/plans/plans.contract'
import type { Stock } from '#shared/stock/stock.schema'
import { stockOn } from '#shared/stock/sheet-on'
import { flatStrip } from '#shared/strip/flat-strip'
import type { Strip } from '#shared/strip/strip.schema'

/** Lines that are bent one after another: one shape of one stock on one brake. */
export interface PlannedRun {
  /** The lines in the order's order; at least one. */
  readonly lines: readonly [StoredLine, ...StoredLine[]]
  /** As it is bent on the brake. */
  readonly stock: Stock
  readonly strip: Strip
  readonly brake: ShopBrake
  /** Made for the longest of the lines: what turns the longest piece turns the shorter ones. */
  readonly plan: BrakePlan['plan']
  /** Who answers for it where the plan has no steps. */
  readonly override: Override | null
}

export interface PlannedLine {
  readonly line: StoredLine
  readonly stock: Stock
  readonly brake: ShopBrake
  readonly plan: BrakePlan['plan']
  readonly override: Override | null
}

/** What lines of one run have in common, whatever the brake. */
export const runKind = ({ profile, stockId }: StoredLine): string =>
  JSON.stringify([bendingShape(profile), stockId])

/** One run for the lines of one kind on one brake; lines that are overridden go by their reason too. */
export function gatherRuns(planned: readonly PlannedLine[]): PlannedRun[] {
  const groups = new Map<string, [PlannedLine, ...PlannedLine[]]>()
  for (const item of planned) {
    const { line, brake, override } = item
    const key = JSON.stringify([runKind(line), brake.id, override?.reason ?? null])
    const group = groups.get(key)
    if (group) group.push(item)
    else groups.set(key, [item])
  }
  return [...groups.values()].map(toRun)
}

function toRun([first, ...rest]: [PlannedLine, ...PlannedLine[]]): PlannedRun {
  const longest = rest.reduce(
    (most, item) => (item.line.length > most.line.length ? item : most),
    first,
  )
  const stock = stockOn(first.stock, first.brake.id)
  return {
    lines: [first.line, ...rest.map(({ line }) => line)],
    stock,
    strip: flatStrip(first.line.profile, stock.sheet),
    brake: first.brake,
    plan: longest.plan,
    override: first.override,
  }
}
