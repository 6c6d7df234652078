import type { Knex } from 'knex'
import type { Clock } from '#server/adapters/clock'
import { createBrakesQueries } from '#server/features/brakes/brakes.queries'
import { brakesRoutes } from '#server/features/brakes/brakes.routes'
import { bundlesRoutes } from '#server/features/bundles/bundles.routes'
import { createBundlesService } from '#server/features/bundles/bundles.service'
import { handOffRoutes } from '#server/features/hand-off/hand-off.routes'
import { createHandOffService } from '#server/features/hand-off/hand-off.service'
import { createJobsServiceOn } from '#server/features/jobs/create-jobs-service'
import { jobsRoutes } from '#server/features/jobs/jobs.routes'
import { labelsRoutes } from '#server/features/labels/labels.routes'
import { createLabelsService } from '#server/features/labels/labels.service'
import {
  createOrderPlanningOn,
  createOrdersServiceOn,
} from '#server/features/orders/create-orders-service'
import { ordersRoutes } from '#server/features/orders/orders.routes'
import { createPeopleService } from '#server/features/people/people.service'
import { peopleRoutes } from '#server/features/people/people.routes'
import { sessionRoutes } from '#server/features/people/session.routes'
import { createSignIn, type SignIn } from '#server/features/people/sign-in'
import { signInLimits } from '#server/features/people/sign-in-limits'
import { newCode } from '#server/features/pieces/new-code'
import { piecesRoutes } from '#server/features/pieces/pieces.routes'
import { createPiecesService } from '#server/features/pieces/pieces.service'
import { createPlansServiceOn } from '#server/features/plans/create-plans-service'
import { planLimit } from '#server/features/plans/plan-limit'
import { plansRoutes } from '#server/features/plans/plans.routes'
import { runsRoutes } from '#server/features/runs/runs.routes'
import { createRunsService } from '#server/features/runs/runs.service'
import { sheetsRoutes } from '#server/features/sheets/sheets.routes'
import { createSheetsService } from '#server/features/sheets/sheets.service'
import { createShelfServiceOn } from '#server/features/shelf/create-shelf-service'
import { shelfRoutes } from '#server/features/shelf/shelf.routes'
import { createTestBendsServiceOn } from '#server/features/stocks/create-test-bends-service'
import { createStocksQueries } from '#server/features/stocks/stocks.queries'
import { stocksRoutes } from '#server/features/stocks/stocks.routes'
import type { Route } from '#server/http/define-route'
import type { Planner } from '#server/planning/planner'

export interface Ports {
  /** The pool. */
  readonly db: Knex
  readonly clock: Clock
  readonly planner: Planner
  /** IANA name. */
  readonly shopTimeZone: string
  readonly onError: (message: string, error: unknown) => void
}

export interface Composition {
  readonly routes: readonly Route[]
  readonly signIn: SignIn
}

/** The only place that knows every feature: each service is built anew on the handle it is given. */
export function compose(ports: Ports): Composition {
  const { db: pool, clock, planner, shopTimeZone, onError } = ports
  const signIn = createSignIn(pool)
  const making = { clock, drawCode: newCode }
  return {
    signIn,
    routes: [
      ...sessionRoutes({ signIn, limits: signInLimits(pool, clock), clock }),
      ...peopleRoutes(createPeopleService),
      ...jobsRoutes(createJobsServiceOn),
      ...shelfRoutes((db) => createShelfServiceOn(db, clock)),
      ...stocksRoutes(createStocksQueries, (db) => createTestBendsServiceOn(db, clock)),
      ...brakesRoutes(createBrakesQueries),
      ...plansRoutes(
        (db) => createPlansServiceOn(db, { planner, onError }),
        planLimit(pool, clock),
      ),
      ...ordersRoutes({
        planner,
        makeService: (db, known) =>
          createOrdersServiceOn(db, { clock, planner: known, shopTimeZone }),
        makePlanning: createOrderPlanningOn,
      }),
      ...piecesRoutes((db) => createPiecesService(db, making)),
      ...runsRoutes((db) => createRunsService(db, making)),
      ...bundlesRoutes((db) => createBundlesService(db, making)),
      ...handOffRoutes((db) => createHandOffService(db, making)),
      ...labelsRoutes((db) => createLabelsService(db, making)),
      ...sheetsRoutes((db) => createSheetsService(db, { clock, shopTimeZone })),
    ],
  }
}
