import type { Knex } from 'knex'
import type { Clock } from '#server/adapters/clock'
import type { MailTransport } from '#server/adapters/mail/mail-transport'
import type { Db } from '#server/db/knex'
import { auditRoutes } from '#server/features/audit/audit.routes'
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
import { createDrawOrder } from '#server/features/mail/draw-order'
import { drawSlip } from '#server/features/mail/draw-slip'
import { enqueueMail, type MailPorts } from '#server/features/mail/mail-ports'
import { mailRoutes } from '#server/features/mail/mail.routes'
import { createMailsService } from '#server/features/mail/mails.service'
import { createOrderMails } from '#server/features/mail/order-mails'
import { createOrderSheetForMail } from '#server/features/mail/order-sheet-for-mail'
import { createSendMail } from '#server/features/mail/send-mail'
import {
  createOrderPlanningOn,
  createOrdersServiceOn,
} from '#server/features/orders/create-orders-service'
import { ordersRoutes } from '#server/features/orders/orders.routes'
import { accountsRoutes } from '#server/features/people/accounts.routes'
import { createAccountsService } from '#server/features/people/accounts.service'
import { passwordLimits } from '#server/features/people/password-limits'
import { createPasswordResetJob } from '#server/features/people/password-reset.job'
import { createPasswordService } from '#server/features/people/password.service'
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
import { createPricesQueries } from '#server/features/prices/prices.queries'
import { pricesRoutes } from '#server/features/prices/prices.routes'
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
import type { JobTasks } from '#server/jobs/job'
import type { Planner } from '#server/planning/planner'

export interface Ports {
  /** The pool. */
  readonly db: Knex
  readonly clock: Clock
  readonly planner: Planner
  /** IANA name. */
  readonly shopTimeZone: string
  readonly transport: MailTransport
  /** What links in mails begin with. */
  readonly publicUrl: string
  readonly onError: (message: string, error: unknown) => void
}

export interface Composition {
  readonly routes: readonly Route[]
  readonly signIn: SignIn
  /** What happens without a request. */
  readonly tasks: JobTasks
}

/** The only place that knows every feature: each service is built anew on the handle it is given. */
export function compose(ports: Ports): Composition {
  const { db: pool, clock, planner, shopTimeZone, onError } = ports
  const signIn = createSignIn(pool)
  const making = { clock, drawCode: newCode }
  const mailPorts: MailPorts = { clock, publicUrl: ports.publicUrl, enqueue: enqueueMail }
  const orderMailsOn = (db: Db) => createOrderMails(db, { ...mailPorts, drawCode: newCode })
  const draw = {
    drawings: createDrawOrder(createOrderSheetForMail({ clock, shopTimeZone })),
    slip: drawSlip,
  }
  return {
    signIn,
    tasks: {
      'send-mail': createSendMail({ db: pool, clock, transport: ports.transport, draw }),
      'password-reset': createPasswordResetJob(pool, mailPorts),
    },
    routes: [
      ...sessionRoutes({ signIn, limits: signInLimits(pool, clock), clock }),
      ...peopleRoutes(createPeopleService),
      ...accountsRoutes({
        makeAccounts: (db) => createAccountsService(db, mailPorts),
        makePasswords: (db) => createPasswordService(db, clock),
        limits: passwordLimits(pool, clock),
      }),
      ...mailRoutes((db) =>
        createMailsService(db, { enqueue: enqueueMail, leaves: ports.transport.leaves }),
      ),
      ...auditRoutes(),
      ...jobsRoutes(createJobsServiceOn),
      ...shelfRoutes((db) => createShelfServiceOn(db, clock)),
      ...stocksRoutes(createStocksQueries, (db) => createTestBendsServiceOn(db, clock)),
      ...pricesRoutes(createPricesQueries),
      ...brakesRoutes(createBrakesQueries),
      ...plansRoutes(
        (db) => createPlansServiceOn(db, { planner, onError }),
        planLimit(pool, clock),
      ),
      ...ordersRoutes({
        planner,
        makeService: (db, known) =>
          createOrdersServiceOn(db, {
            clock,
            planner: known,
            shopTimeZone,
            mails: orderMailsOn(db),
          }),
        makePlanning: createOrderPlanningOn,
      }),
      ...piecesRoutes((db) => createPiecesService(db, making)),
      ...runsRoutes((db) => createRunsService(db, making)),
      ...bundlesRoutes((db) => createBundlesService(db, orderMailsOn(db), making)),
      ...handOffRoutes((db) => createHandOffService(db, making)),
      ...labelsRoutes((db) => createLabelsService(db, making)),
      ...sheetsRoutes((db) => createSheetsService(db, { clock, shopTimeZone })),
    ],
  }
}
