import type { Clock } from '#server/adapters/clock'
import type { Db } from '#server/db/knex'
import { createBrakesQueries } from '#server/features/brakes/brakes.queries'
import { createJobsQueries } from '#server/features/jobs/jobs.queries'
import { createOrderPiecesQueries } from '#server/features/orders/order-pieces.queries'
import { createOrderPlanning, type OrderPlanning } from '#server/features/orders/order-planning'
import { createOrderReader } from '#server/features/orders/order-reader'
import { createOrdersQueries } from '#server/features/orders/orders.queries'
import type { OrderMails } from '#server/features/mail/order-mails'
import { createOrdersService, type OrdersService } from '#server/features/orders/orders.service'
import { createOrdersStore } from '#server/features/orders/orders.store'
import { createReleaseOrder } from '#server/features/orders/release-order'
import { createReleaseStore } from '#server/features/orders/release.store'
import { createPricesQueries } from '#server/features/prices/prices.queries'
import { createStocksQueries } from '#server/features/stocks/stocks.queries'
import { announce } from '#server/live/announce'
import type { Planner } from '#server/planning/planner'

export interface OrdersPorts {
  readonly clock: Clock
  /** In a transaction one that only knows what was planned ahead. */
  readonly planner: Planner
  /** IANA name of the shop's time zone. */
  readonly shopTimeZone: string
  readonly mails: OrderMails
}

export function createOrdersServiceOn(db: Db, ports: OrdersPorts): OrdersService {
  const { planner } = ports
  const queries = createOrdersQueries(db)
  const stocks = createStocksQueries(db)
  const brakes = createBrakesQueries(db)
  const prices = createPricesQueries(db)
  const pieces = createOrderPiecesQueries(db)
  return createOrdersService({
    ...ports,
    queries,
    stocks,
    reader: createOrderReader({ queries, pieces, stocks, brakes, prices, planner }),
    store: createOrdersStore(db),
    jobs: createJobsQueries(db),
    release: createReleaseOrder({
      queries,
      store: createReleaseStore(db),
      stocks,
      brakes,
      prices,
      planner,
    }),
    announce: (announcement) => announce(db, announcement),
  })
}

export const createOrderPlanningOn = (pool: Db, planner: Planner): OrderPlanning =>
  createOrderPlanning({
    queries: createOrdersQueries(pool),
    jobs: createJobsQueries(pool),
    stocks: createStocksQueries(pool),
    brakes: createBrakesQueries(pool),
    planner,
  })
