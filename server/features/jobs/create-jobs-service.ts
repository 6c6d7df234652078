import type { Db } from '#server/db/knex'
import { createJobsQueries } from '#server/features/jobs/jobs.queries'
import { createJobsService, type JobsService } from '#server/features/jobs/jobs.service'
import { createJobsStore } from '#server/features/jobs/jobs.store'
import { createOwningCompany } from '#server/features/jobs/owning-company'
import { announce } from '#server/live/announce'

export function createJobsServiceOn(db: Db): JobsService {
  const store = createJobsStore(db)
  return createJobsService({
    queries: createJobsQueries(db),
    store,
    owningCompany: createOwningCompany(db),
    announce: (announcement) => announce(db, announcement),
  })
}
