import type { Request, RequestHandler, Response, Router } from 'express'
import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { inTransaction } from '#server/db/transaction'
import { csrfSynchronisedProtection } from '#server/http/csrf'
import type { Route } from '#server/http/define-route'
import { once, readKeyedRequest, type Outcome } from '#server/http/idempotency'
import { requirePermission } from '#server/http/permission'
import type { Endpoint, Method } from '#shared/http/endpoint'

const VERBS = {
  GET: 'get',
  POST: 'post',
  PUT: 'put',
  PATCH: 'patch',
  DELETE: 'delete',
} as const satisfies Record<Method, string>

/**
 * Mounts every route with the same steps: permission, CSRF token, the route's own limits, input,
 * idempotency, handler in one transaction, answer. A session was read before.
 */
export function mountRoutes(router: Router, routes: readonly Route[], db: Db): void {
  for (const route of routes) {
    const { method, path, permission } = route.endpoint
    router[VERBS[method]](
      path,
      requirePermission(permission),
      csrfSynchronisedProtection,
      ...route.before,
      answerWith(route, db),
    )
  }
}

function answerWith(route: Route, db: Db): RequestHandler {
  const { endpoint } = route
  return async (request, response) => {
    const act = route.prepare(request)
    const work = async (handle: Db) => ({
      status: endpoint.success,
      answer: checkAnswer(endpoint, await act(handle)),
    })
    send(response, await runOnce(route, request, db, work))
  }
}

async function runOnce(
  { endpoint, transaction }: Route,
  request: Request,
  db: Db,
  work: (db: Db) => Promise<Omit<Outcome, 'replayed'>>,
): Promise<Outcome> {
  if (!transaction) return { ...(await work(db)), replayed: false }
  if (!endpoint.idempotent) return { ...(await inTransaction(db, work)), replayed: false }
  const keyed = readKeyedRequest(request)
  return inTransaction(db, (handle) => once(handle, keyed, () => work(handle)))
}

/** What does not fit the contract is never sent: the transaction rolls back and the log says why. */
function checkAnswer(endpoint: Endpoint, answer: unknown): unknown {
  const parsed = z.safeParse(endpoint.answer, answer)
  if (parsed.success) return parsed.data
  throw new Error(
    `The answer of ${endpoint.method} ${endpoint.path} does not fit the contract:\n${z.prettifyError(parsed.error)}`,
  )
}

function send(response: Response, { status, answer, replayed }: Outcome): void {
  response.status(status).set('Cache-Control', 'no-store')
  if (replayed) response.set('Idempotency-Replayed', 'true')
  if (status === 204) response.end()
  else response.json(answer)
}
