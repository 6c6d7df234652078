import type { RequestHandler } from 'express'
import type { Db } from '#server/db/knex'
import type { PlansService } from '#server/features/plans/plans.service'
import { defineRoute, type Route } from '#server/http/define-route'
import { planDrawing } from '#shared/plans/plans.contract'

export const plansRoutes = (make: (db: Db) => PlansService, limit: RequestHandler): Route[] => [
  defineRoute(
    planDrawing,
    ({ db, body, person, signal }) => make(db).planDrawing(body, person, signal),
    [limit],
  ),
]
