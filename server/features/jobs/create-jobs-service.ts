import type { Db } from '#server/db/knex'
import { createJobsQueries } from '#server/features/jobs/jobs.queries'
import { createJobsService, type JobsService } from '#server/features/jobs/jobs.service'
import { createJobsStore } from '#server/features/jobs/jobs.store'
import { createOwningCompany } from '#server/features/jobs/owning-company'
import { createOrdersQueries } from '#server/features/orders/orders.queries'
import { createOrdersStore } from '#server/features/orders/orders.store'
import { createRedrawOrders } from '#server/features/orders/redraw-orders'
import { announce as announceOn, type Announcement } from '#server/live/announce'

export function createJobsServiceOn(db: Db): JobsService {
  const announce = (announcement: Announcement) => announceOn(db, announcement)
  return createJobsService({
    queries: createJobsQueries(db),
    store: createJobsStore(db),
    owningCompany: createOwningCompany(db),
    redrawOrders: createRedrawOrders({
      queries: createOrdersQueries(db),
      store: createOrdersStore(db),
      announce,
    }),
    announce,
  })
}
