import type { Db } from '#server/db/knex'
import type { PricesQueries } from '#server/features/prices/prices.queries'
import { defineRoute, type Route } from '#server/http/define-route'
import { getPriceBook } from '#shared/pricing/pricing.contract'

export const pricesRoutes = (make: (db: Db) => PricesQueries): Route[] => [
  defineRoute(getPriceBook, async ({ db }) => ({ current: await make(db).findVersion() })),
]
