import type { Db } from '#server/db/knex'
import type { StocksQueries } from '#server/features/stocks/stocks.queries'
import { defineRoute, type Route } from '#server/http/define-route'
import { listStocks } from '#shared/stock/stock.contract'

export const stocksRoutes = (make: (db: Db) => StocksQueries): Route[] => [
  defineRoute(listStocks, async ({ db }) => ({ items: await make(db).listStocks() })),
]
