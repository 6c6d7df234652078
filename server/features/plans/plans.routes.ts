import type { Db } from '#server/db/knex'
import type { PlansService } from '#server/features/plans/plans.service'
import { defineRoute, type Route } from '#server/http/define-route'
import { planDrawing } from '#shared/plans/plans.contract'

export const plansRoutes = (make: (db: Db) => PlansService): Route[] => [
  defineRoute(planDrawing, ({ db, body }) => make(db).planDrawing(body)),
]
