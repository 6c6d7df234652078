import type { Db } from '#server/db/knex'
import type { ShelfService } from '#server/features/shelf/shelf.service'
import { defineRoute, type Route } from '#server/http/define-route'
import {
  createShelfProfile,
  listShelf,
  listShelfVersions,
  updateShelfProfile,
} from '#shared/shelf/shelf.contract'

export const shelfRoutes = (make: (db: Db) => ShelfService): Route[] => [
  defineRoute(listShelf, async ({ db, person }) => ({ items: await make(db).listShelf(person) })),
  defineRoute(listShelfVersions, async ({ db, params, person }) => ({
    items: await make(db).listVersions(params.profileId, person),
  })),
  defineRoute(createShelfProfile, ({ db, body, person }) =>
    make(db).createShelfProfile(body, person),
  ),
  defineRoute(updateShelfProfile, ({ db, params, body, person }) =>
    make(db).updateShelfProfile(params.profileId, body, person),
  ),
]
