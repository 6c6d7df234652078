import type { Clock } from '#server/adapters/clock'
import type { Db } from '#server/db/knex'
import { createBrakesQueries } from '#server/features/brakes/brakes.queries'
import { createStocksQueries } from '#server/features/stocks/stocks.queries'
import { listTestBends } from '#server/features/stocks/test-bends.queries'
import {
  createTestBendsService,
  type TestBendsService,
} from '#server/features/stocks/test-bends.service'
import { createTestBendsStore } from '#server/features/stocks/test-bends.store'
import { announce } from '#server/live/announce'

export const createTestBendsServiceOn = (db: Db, clock?: Clock): TestBendsService =>
  createTestBendsService({
    stocks: createStocksQueries(db),
    brakes: createBrakesQueries(db),
    listBends: (stockId) => listTestBends(db, stockId),
    store: createTestBendsStore(db),
    clock,
    announce: (announcement) => announce(db, announcement),
  })
