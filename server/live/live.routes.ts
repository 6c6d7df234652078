import { Router, type Request } from 'express'
import { requirePermission } from '#server/http/permission'
import type { LiveHub } from '#server/live/live-hub'

/** Where the client stopped: its browser says so when it comes back, `?after=` when it asks itself. */
function lastSeenIdOf(request: Request): number | undefined {
  const given = request.get('last-event-id') ?? request.query.after
  if (given === undefined || given === '') return undefined
  // What is no number of ours was never seen, so the stream begins with a reset.
  return typeof given === 'string' && /^\d{1,15}$/.test(given) ? Number(given) : -1
}

/** GET /live: server-sent events, outside the contract because it never ends. */
export function liveRouter(hub: LiveHub): Router {
  const router = Router()
  router.get('/live', requirePermission('live.follow'), (request, response) =>
    hub.follow(request, response, lastSeenIdOf(request)),
  )
  return router
}
