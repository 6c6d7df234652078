import type { Db } from '#server/db/knex'
import { createBrakesQueries } from '#server/features/brakes/brakes.queries'
import { createPlansService, type PlansService } from '#server/features/plans/plans.service'
import { createStocksQueries } from '#server/features/stocks/stocks.queries'
import type { Planner } from '#server/planning/planner'

export const createPlansServiceOn = (db: Db, planner: Planner): PlansService =>
  createPlansService({
    stocks: createStocksQueries(db),
    brakes: createBrakesQueries(db),
    planner,
  })
