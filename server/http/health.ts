import { Router } from 'express'
import type { Db } from '#server/db/knex'
import { listPendingMigrations } from '#server/db/migrate'
import { ProblemError } from '#server/http/errors'

/** GET /health: 200 only when the database answers and has every migration. */
export function healthRouter(db: Db): Router {
  const router = Router()
  router.get('/health', async (request, response) => {
    const pending = await listPendingMigrations(db).catch((error: unknown) => {
      request.log.warn({ err: error }, 'the database is not ready')
      throw new ProblemError('not-ready', 'The database does not answer yet.')
    })
    if (pending.length > 0) {
      throw new ProblemError('not-ready', 'The database has not been migrated yet.')
    }
    response.set('Cache-Control', 'no-store').json({ status: 'ok' })
  })
  return router
}
