import type { Db } from '#server/db/knex'
import type { RunsService } from '#server/features/runs/runs.service'
import { defineRoute, type Route } from '#server/http/define-route'
import { bendCount, claimRun, getRun, leaveRun, listRuns } from '#shared/runs/runs.contract'

export const runsRoutes = (make: (db: Db) => RunsService): Route[] => [
  defineRoute(listRuns, ({ db, query }) => make(db).listRuns(query.state)),
  defineRoute(getRun, ({ db, params }) => make(db).getRun(params.runId)),
  defineRoute(claimRun, ({ db, params, person }) => make(db).claimRun(params.runId, person)),
  defineRoute(leaveRun, ({ db, params, person }) => make(db).leaveRun(params.runId, person)),
  defineRoute(bendCount, ({ db, params, body, person }) =>
    make(db).bendCount(params.runId, body, person),
  ),
]
