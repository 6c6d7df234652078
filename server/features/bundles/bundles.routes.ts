import type { Db } from '#server/db/knex'
import type { BundlesService } from '#server/features/bundles/bundles.service'
import { defineRoute, type Route } from '#server/http/define-route'
import {
  createBundle,
  getBundle,
  getRack,
  moveBundle,
  openBundle,
} from '#shared/bundles/bundles.contract'

export const bundlesRoutes = (make: (db: Db) => BundlesService): Route[] => [
  defineRoute(getRack, ({ db }) => make(db).getRack()),
  defineRoute(getBundle, ({ db, params }) => make(db).getBundle(params.code)),
  defineRoute(createBundle, ({ db, body, person }) => make(db).createBundle(body, person)),
  defineRoute(moveBundle, ({ db, params, body }) => make(db).moveBundle(params.bundleId, body)),
  defineRoute(openBundle, ({ db, params, body, person }) =>
    make(db).openBundle(params.bundleId, body, person),
  ),
]
