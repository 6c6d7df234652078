import { companyScope } from '#server/db/company-scope'
import type { BrakesQueries } from '#server/features/brakes/brakes.queries'
import type { JobsQueries } from '#server/features/jobs/jobs.queries'
import { isBeforeRelease } from '#server/features/orders/before-release'
import { linesForPitch } from '#server/features/orders/order-lines'
import type { OrdersQueries } from '#server/features/orders/orders.queries'
import { planLine } from '#server/features/orders/plan-line'
import type { StocksQueries } from '#server/features/stocks/stocks.queries'
import type { SignedIn } from '#server/http/define-route'
import type { Planner } from '#server/planning/planner'
import type { BodyOf } from '#shared/http/endpoint'
import type { OrderLineInput } from '#shared/orders/order.schema'
import type { amendOrder, submitOrder } from '#shared/orders/orders.contract'

export interface OrderPlanningDeps {
  readonly queries: OrdersQueries
  readonly jobs: JobsQueries
  readonly stocks: StocksQueries
  readonly brakes: BrakesQueries
  readonly planner: Planner
}

/**
 * Plans what a change of an order will ask for, before its transaction. Judges nothing: where the
 * change will be refused, there is only less to plan.
 */
export const createOrderPlanning = ({
  queries,
  jobs,
  stocks,
  brakes,
  planner,
}: OrderPlanningDeps) => {
  const planLines = async (lines: readonly OrderLineInput[]): Promise<void> => {
    const stockById = await stocks.mapStocks(lines.map(({ stockId }) => stockId))
    const shopBrakes = await brakes.listBrakes()
    // One after another: a long order leaves room for what others ask meanwhile.
    for (const line of lines) {
      const stock = stockById.get(line.stockId)
      if (stock) await planLine({ line, stock, brakes: shopBrakes, planner })
    }
  }

  const planStored = async (orderId: string): Promise<void> => {
    const lines = await queries.listLines(orderId)
    await planLines(lines.filter(({ frozen }) => frozen === null))
  }

  return {
    async forNew({ jobId, lines }: BodyOf<typeof submitOrder>, person: SignedIn): Promise<void> {
      const job = await jobs.findJob(jobId, companyScope(person))
      if (job) await planLines(linesForPitch(lines, job.pitchRise))
    },

    async forStored(orderId: string, person: SignedIn): Promise<void> {
      if (await queries.findOrder(orderId, companyScope(person))) await planStored(orderId)
    },

    /** The lines as they will be; as they are where the amendment comes too late. */
    async forAmended(
      orderId: string,
      { version, lines }: BodyOf<typeof amendOrder>,
      person: SignedIn,
    ): Promise<void> {
      const standing = await queries.findOrder(orderId, companyScope(person))
      if (!standing) return
      const inTime = standing.version === version && isBeforeRelease(standing.state)
      const job = inTime ? await jobs.findJob(standing.job.id, null) : undefined
      if (job) await planLines(linesForPitch(lines, job.pitchRise))
      else await planStored(orderId)
    },
  }
}

export type OrderPlanning = ReturnType<typeof createOrderPlanning>
