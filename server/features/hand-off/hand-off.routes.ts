import type { Db } from '#server/db/knex'
import type { HandOffService } from '#server/features/hand-off/hand-off.service'
import { defineRoute, type Route } from '#server/http/define-route'
import { getHandOffSheet, handOff, returnBundle } from '#shared/hand-off/hand-off.contract'

export const handOffRoutes = (make: (db: Db) => HandOffService): Route[] => [
  defineRoute(getHandOffSheet, ({ db, params }) => make(db).getHandOffSheet(params.orderId)),
  defineRoute(handOff, ({ db, params, body, person }) =>
    make(db).handOff(params.orderId, body, person),
  ),
  defineRoute(returnBundle, ({ db, params, body, person }) =>
    make(db).returnBundle(params.bundleId, body.reason, person),
  ),
]
