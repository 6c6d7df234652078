import { randomUUID } from 'node:crypto'
import type { BrakesQueries } from '#server/features/brakes/brakes.queries'
import type { FrozenLine } from '#server/features/orders/frozen-line'
import type { OrdersQueries } from '#server/features/orders/orders.queries'
import { planRelease, type PlannedRun } from '#server/features/orders/plan-release'
import type { NewPiece, ReleaseStore } from '#server/features/orders/release.store'
import type { StocksQueries } from '#server/features/stocks/stocks.queries'
import type { SignedIn } from '#server/http/define-route'
import { KERNEL_VERSION } from '#server/planning/kernel-version'
import type { Planner } from '#server/planning/planner'
import { pieceWeight } from '#shared/strip/weight'

export interface ReleaseDeps {
  readonly queries: OrdersQueries
  readonly store: ReleaseStore
  readonly stocks: StocksQueries
  readonly brakes: BrakesQueries
  readonly planner: Planner
}

/**
 * Freezes the lines of an order that this transaction has taken and brings its runs and pieces into
 * being. Afterwards the caller marks the order released; from then on the database refuses to
 * change a line.
 */
export type ReleaseOrder = (orderId: string, person: Pick<SignedIn, 'id'>) => Promise<void>

export const createReleaseOrder =
  ({ queries, store, stocks, brakes, planner }: ReleaseDeps): ReleaseOrder =>
  async (orderId, person) => {
    const lines = await queries.listLines(orderId)
    const stockById = await stocks.mapStocks(lines.map(({ stockId }) => stockId))
    const runs = await planRelease(lines, stockById, await brakes.listBrakes(), planner)
    const named = runs.map((run) => ({ ...run, id: randomUUID() }))
    await store.freezeLines(new Map(runs.flatMap(frozenLines)))
    await store.createRuns(orderId, named)
    await store.createPieces(orderId, named.flatMap(newPieces), person.id)
  }

const frozenLines = ({ lines, stock, strip, brake, plan }: PlannedRun): [string, FrozenLine][] =>
  lines.map((line) => [
    line.id,
    {
      stock,
      strip,
      pieceWeight: pieceWeight(strip, stock.sheet, line.length),
      brakeId: brake.id,
      brakeName: brake.brake.name,
      plan,
      kernelVersion: KERNEL_VERSION,
    },
  ])

const newPieces = ({ lines, id: runId }: PlannedRun & { id: string }): NewPiece[] =>
  lines.flatMap(({ id: lineId, quantity }) =>
    Array.from({ length: quantity }, (_, index) => ({ lineId, runId, sequence: index + 1 })),
  )
