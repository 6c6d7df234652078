import type { Db } from '#server/db/knex'
import { listStockItems as readItems } from '#server/features/stocks/stock-items.queries'
import type { StocksQueries } from '#server/features/stocks/stocks.queries'
import type { TestBendsService } from '#server/features/stocks/test-bends.service'
import { defineRoute, type Route } from '#server/http/define-route'
import { listStockItems } from '#shared/stock/stock-items.contract'
import {
  calibrateStock,
  listStocks,
  listTestBends,
  recordTestBend,
  withdrawTestBend,
} from '#shared/stock/stock.contract'

export const stocksRoutes = (
  make: (db: Db) => StocksQueries,
  makeTestBends: (db: Db) => TestBendsService,
): Route[] => [
  defineRoute(listStocks, async ({ db }) => ({ items: await make(db).listStocks() })),
  defineRoute(listStockItems, async ({ db, params }) => ({
    items: await readItems(db, params.stockId),
  })),
  defineRoute(listTestBends, ({ db, params }) => makeTestBends(db).getTestBends(params.stockId)),
  defineRoute(recordTestBend, ({ db, params, body, person }) =>
    makeTestBends(db).recordTestBend(params.stockId, body, person),
  ),
  defineRoute(withdrawTestBend, ({ db, params, body, person }) =>
    makeTestBends(db).withdrawTestBend(params, body.reason, person),
  ),
  defineRoute(calibrateStock, ({ db, params, body, person }) =>
    makeTestBends(db).calibrateStock(params.stockId, body, person),
  ),
]
