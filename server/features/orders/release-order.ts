import { randomUUID } from 'node:crypto'
import type { BrakesQueries } from '#server/features/brakes/brakes.queries'
import type { FrozenLine } from '#server/features/orders/frozen-line'
import type { PlannedRun } from '#server/features/orders/gather-runs'
import { lineStrip } from '#server/features/orders/line-strip'
import type { OrdersQueries } from '#server/features/orders/orders.queries'
import { planRelease } from '#server/features/orders/plan-release'
import type { NewPiece, ReleaseStore } from '#server/features/orders/release.store'
import type { PricesQueries } from '#server/features/prices/prices.queries'
import type { StocksQueries } from '#server/features/stocks/stocks.queries'
import type { SignedIn } from '#server/http/define-route'
import { KERNEL_VERSION } from '#server/planning/kernel-version'
import type { Planner } from '#server/planning/planner'
import type { OverrideInput } from '#shared/orders/override.schema'
import { quoteLine } from '#shared/pricing/line-quote'
import type { PriceBook } from '#shared/pricing/price-book.schema'

export interface ReleaseDeps {
  readonly queries: OrdersQueries
  readonly store: ReleaseStore
  readonly stocks: StocksQueries
  readonly brakes: BrakesQueries
  readonly prices: PricesQueries
  readonly planner: Planner
}

export interface Release {
  readonly person: Pick<SignedIn, 'id' | 'name'>
  readonly at: Date
  readonly overrides: readonly OverrideInput[]
}

/**
 * Freezes the lines of an order that this transaction has taken and brings its runs and pieces into
 * being. Afterwards the caller marks the order released; from then on the database refuses to
 * change a line. Gives what the order's event says of overrides: a line each with mark, brake and
 * reason; empty without any.
 */
export type ReleaseOrder = (orderId: string, release: Release) => Promise<string>

export const createReleaseOrder =
  ({ queries, store, stocks, brakes, prices, planner }: ReleaseDeps): ReleaseOrder =>
  async (orderId, { person, at, overrides }) => {
    const lines = await queries.listLines(orderId)
    const runs = await planRelease({
      lines,
      stocks: await stocks.mapStocks(lines.map(({ stockId }) => stockId)),
      brakes: await brakes.listBrakes(),
      loads: await store.mapBrakeLoads(),
      overrides,
      by: person.name,
      at,
      planner,
    })
    const named = runs.map((run) => ({ ...run, id: randomUUID() }))
    const book = await prices.findBook()
    await store.freezeLines(new Map(runs.flatMap((run) => frozenLines(run, book))))
    await store.createRuns(orderId, named)
    await store.createPieces(orderId, named.flatMap(newPieces), person.id)
    return runs.flatMap(overrideTexts).join('\n')
  }

const frozenLines = (run: PlannedRun, book: PriceBook | null): [string, FrozenLine][] => {
  const { lines, stock, brake, plan, override } = run
  return lines.map((line) => [
    line.id,
    {
      stock,
      ...lineStrip(line, stock.sheet),
      ...quoteLine(line, book),
      brakeId: brake.id,
      brakeName: brake.brake.name,
      plan,
      kernelVersion: KERNEL_VERSION,
      override,
      ends: line.ends,
      hands: line.hands,
    },
  ])
}

const newPieces = ({ lines, id: runId }: PlannedRun & { id: string }): NewPiece[] =>
  lines.flatMap(({ id: lineId, quantity }) =>
    Array.from({ length: quantity }, (_, index) => ({ lineId, runId, sequence: index + 1 })),
  )

/** Read in every language. */
const overrideTexts = ({ lines, brake, override }: PlannedRun): string[] =>
  override ? lines.map(({ mark }) => `${mark} → ${brake.brake.name}: ${override.reason}`) : []
