import type { Clock } from '#server/adapters/clock'
import type { Db } from '#server/db/knex'
import { createBrakesQueries } from '#server/features/brakes/brakes.queries'
import { createBundlesService, type BundlesService } from '#server/features/bundles/bundles.service'
import {
  createHandOffService,
  type HandOffService,
} from '#server/features/hand-off/hand-off.service'
import { createJobsQueries } from '#server/features/jobs/jobs.queries'
import { createOrderPiecesQueries } from '#server/features/orders/order-pieces.queries'
import { createOrderReader } from '#server/features/orders/order-reader'
import { createOrdersQueries } from '#server/features/orders/orders.queries'
import { createOrdersService, type OrdersService } from '#server/features/orders/orders.service'
import { createOrdersStore, type OrdersStore } from '#server/features/orders/orders.store'
import { createReleaseOrder } from '#server/features/orders/release-order'
import type { OrderMails } from '#server/features/mail/order-mails'
import { createPiecesService, type PiecesService } from '#server/features/pieces/pieces.service'
import { createRunsService, type RunsService } from '#server/features/runs/runs.service'
import { createPricesQueries } from '#server/features/prices/prices.queries'
import { createStocksQueries } from '#server/features/stocks/stocks.queries'
import { listTestBends } from '#server/features/stocks/test-bends.queries'
import {
  createTestBendsService,
  type TestBendsService,
} from '#server/features/stocks/test-bends.service'
import { createTestBendsStore } from '#server/features/stocks/test-bends.store'
import { announce } from '#server/live/announce'
import { createLocalPlanner } from '#server/planning/local-planner'
import type { Calendar } from './calendar'
import { createDemoRandom, type DemoRandom } from './demo-random'
import { createDemoMails } from './mails'
import { createDemoReleaseStore } from './release-store'

/** Ids of test bends are drawn apart, so that they move no code of the pieces. */
const TEST_BEND_SEED = 20_261

/** Working days before today from which on mails are there: the page of mails was cleared before. */
const MAILS_SINCE = -1

/** The product's own services under a clock that the seed sets, so that its history obeys every rule. */
export interface DemoShop {
  readonly db: Db
  readonly calendar: Calendar
  readonly clock: Clock
  readonly setTime: (moment: Date) => void
  readonly orders: OrdersService
  readonly pieces: PiecesService
  readonly runs: RunsService
  readonly bundles: BundlesService
  readonly handOff: HandOffService
  readonly testBends: TestBendsService
}

export function createDemoShop(db: Db, calendar: Calendar, random: DemoRandom): DemoShop {
  let time = calendar.moment(-14, '13:00')
  const clock = { now: () => time }
  const ports = { clock, drawCode: random.drawCode }
  const mails = createDemoMails(db, clock, calendar.moment(MAILS_SINCE, '00:00'))
  return {
    db,
    calendar,
    clock,
    setTime: (moment) => {
      if (moment < time)
        throw new RangeError(`${moment.toISOString()} lies before what was seeded.`)
      time = moment
    },
    orders: createDemoOrders(db, random, clock, mails),
    pieces: createPiecesService(db, ports),
    runs: createRunsService(db, ports),
    bundles: createBundlesService(db, mails, ports),
    handOff: createHandOffService(db, ports),
    testBends: createDemoTestBends(db, clock),
  }
}

function createDemoTestBends(db: Db, clock: { now: () => Date }): TestBendsService {
  const { nextId } = createDemoRandom(TEST_BEND_SEED)
  const base = createTestBendsStore(db)
  return createTestBendsService({
    stocks: createStocksQueries(db),
    brakes: createBrakesQueries(db),
    listBends: (stockId) => listTestBends(db, stockId),
    store: { ...base, addTestBend: (bend) => base.addTestBend({ id: nextId(), ...bend }) },
    clock,
    announce: (announcement) => announce(db, announcement),
  })
}

function createDemoOrders(
  db: Db,
  random: DemoRandom,
  clock: Clock,
  mails: OrderMails,
): OrdersService {
  const queries = createOrdersQueries(db)
  const stocks = createStocksQueries(db)
  const brakes = createBrakesQueries(db)
  const planner = createLocalPlanner()
  const prices = createPricesQueries(db)
  const pieces = createOrderPiecesQueries(db)
  const base = createOrdersStore(db)
  const store: OrdersStore = {
    ...base,
    createOrder: (order) => base.createOrder({ id: random.nextId(), ...order }),
    addEvent: (event) => base.addEvent({ at: clock.now(), ...event }),
  }
  return createOrdersService({
    queries,
    stocks,
    store,
    clock,
    mails,
    // The demo shop's hours are UTC, see the calendar.
    shopTimeZone: 'UTC',
    reader: createOrderReader({ queries, pieces, stocks, brakes, prices, planner }),
    jobs: createJobsQueries(db),
    release: createReleaseOrder({
      queries,
      stocks,
      brakes,
      prices,
      planner,
      store: createDemoReleaseStore(db, random, clock),
    }),
    announce: (announcement) => announce(db, announcement),
  })
}
