import type { Db } from '#server/db/knex'
import { createBrakesQueries } from '#server/features/brakes/brakes.queries'
import { createPlansService, type PlansService } from '#server/features/plans/plans.service'
import { createStocksQueries } from '#server/features/stocks/stocks.queries'
import { announcePlan } from '#server/live/announce-plan'
import type { Planner } from '#server/planning/planner'

export interface PlansPorts {
  readonly planner: Planner
  readonly onError: (message: string, error: unknown) => void
}

export const createPlansServiceOn = (db: Db, { planner, onError }: PlansPorts): PlansService =>
  createPlansService({
    stocks: createStocksQueries(db),
    brakes: createBrakesQueries(db),
    planner,
    tellProgress: (message) =>
      announcePlan(db, message).catch((error: unknown) =>
        onError('the progress of a plan could not be told', error),
      ),
  })
