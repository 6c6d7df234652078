import type { Request, RequestHandler, Router } from 'express'
import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { inTransaction } from '#server/db/transaction'
import { AheadOutdated } from '#server/http/ahead-outdated'
import { signalOfAsker } from '#server/http/asker-gone'
import { csrfSynchronisedProtection } from '#server/http/csrf'
import type { Route } from '#server/http/define-route'
import { once, readKeyedRequest, type Outcome } from '#server/http/idempotency'
import { requirePermission } from '#server/http/permission'
import { sendAnswer } from '#server/http/send-answer'
import type { Endpoint, Method } from '#shared/http/endpoint'

const VERBS = {
  GET: 'get',
  POST: 'post',
  PUT: 'put',
  PATCH: 'patch',
  DELETE: 'delete',
} as const satisfies Record<Method, string>

const MOST_TRIES = 4

/**
 * Mounts every route with the same steps: permission, CSRF token, the route's own limits, input,
 * work ahead, idempotency, handler in one transaction, answer. A session was read before.
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
    const signal = signalOfAsker(response)
    const answerOnce = async () => {
      const act = await route.prepare({ request, signal, pool: db })
      const work = async (handle: Db) => ({
        status: endpoint.success,
        answer: checkAnswer(endpoint, await act(handle)),
      })
      return runOnce(route, request, db, work)
    }
    sendAnswer(response, endpoint, await againWhileOutdated(answerOnce))
  }
}

/** Prepared and run anew when somebody changed something between the two, within reason. */
async function againWhileOutdated<T>(answer: () => Promise<T>): Promise<T> {
  for (let tries = 1; ; tries += 1) {
    try {
      return await answer()
    } catch (error) {
      if (!(error instanceof AheadOutdated) || tries === MOST_TRIES) throw error
    }
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
