import type { Db } from '#server/db/knex'
import type { JobsService } from '#server/features/jobs/jobs.service'
import { defineRoute, type Route } from '#server/http/define-route'
import { createJob, getJob, listJobs, updateJob } from '#shared/jobs/jobs.contract'

export const jobsRoutes = (make: (db: Db) => JobsService): Route[] => [
  defineRoute(listJobs, ({ db, query, person }) => make(db).listJobs(query, person)),
  defineRoute(getJob, ({ db, params, person }) => make(db).getJob(params.jobId, person)),
  defineRoute(createJob, ({ db, body, person }) => make(db).createJob(body, person)),
  defineRoute(updateJob, ({ db, params, body, person }) =>
    make(db).updateJob(params.jobId, body, person),
  ),
]
