import type { Clock } from '#server/adapters/clock'
import type { Db } from '#server/db/knex'
import { createOwningCompany } from '#server/features/jobs/owning-company'
import { createShelfQueries } from '#server/features/shelf/shelf.queries'
import { createShelfService, type ShelfService } from '#server/features/shelf/shelf.service'
import { createShelfStore } from '#server/features/shelf/shelf.store'
import { announce } from '#server/live/announce'

export function createShelfServiceOn(db: Db, clock: Clock): ShelfService {
  return createShelfService({
    queries: createShelfQueries(db),
    store: createShelfStore(db),
    owningCompany: createOwningCompany(db),
    clock,
    announce: (announcement) => announce(db, announcement),
  })
}
