import type { Db } from '#server/db/knex'
import type { BrakesQueries } from '#server/features/brakes/brakes.queries'
import { defineRoute, type Route } from '#server/http/define-route'
import { listBrakes } from '#shared/brakes/brakes.contract'

export const brakesRoutes = (make: (db: Db) => BrakesQueries): Route[] => [
  defineRoute(listBrakes, async ({ db }) => ({ items: await make(db).listBrakes() })),
]
