import type { Request, RequestHandler } from 'express'
import type { Db } from '#server/db/knex'
import { notSignedIn } from '#server/http/errors'
import { parseInput } from '#server/http/parse-input'
import type { SignedIn } from '#server/http/signed-in'
import type { AnswerOf, BodyOf, Endpoint, ParamsOf, QueryOf } from '#shared/http/endpoint'

export type { SignedIn } from '#server/http/signed-in'

export interface RouteInput<E extends Endpoint> {
  readonly params: ParamsOf<E>
  readonly query: QueryOf<E>
  readonly body: BodyOf<E>
  readonly person: SignedIn
  /** The request's own transaction where the endpoint changes something, the pool otherwise. */
  readonly db: Db
  /** Aborts with `AskerGone` when nobody is left to be answered. A change is carried out all the same. */
  readonly signal: AbortSignal
  /** For the session routes only. */
  readonly request: Request
}

export interface PublicRouteInput<E extends Endpoint> extends Omit<RouteInput<E>, 'person'> {
  readonly person: SignedIn | null
  /** Always the pool: who is not signed in yet holds no transaction. */
  readonly db: Db
}

/** What a route is given before its transaction begins. */
export interface Asked {
  readonly request: Request
  readonly signal: AbortSignal
  readonly pool: Db
}

/** Runs on the pool or in a transaction; may run twice when the database asks for a retry. */
type Act = (db: Db) => Promise<unknown>

export interface Route {
  readonly endpoint: Endpoint
  /** Whether the handler runs in a transaction of its own. */
  readonly transaction: boolean
  /** Runs before the input is parsed. */
  readonly before: readonly RequestHandler[]
  /**
   * Parses the input (throws `invalid-input`), does what takes too long for a transaction, and gives
   * what remains to be done.
   */
  readonly prepare: (asked: Asked) => Promise<Act>
}

/**
 * Joins an endpoint of the contract to its handler. The mounting code has checked session,
 * permission and CSRF token; it opens the transaction and parses the answer.
 *
 *     defineRoute(getJob, ({ params, person, db }) => make(db).getJob(params.jobId, person))
 */
export const defineRoute = <E extends Endpoint>(
  endpoint: E,
  handle: (input: RouteInput<E>) => Promise<AnswerOf<E>>,
  before: readonly RequestHandler[] = [],
): Route => ({
  ...defineRouteAhead(endpoint, { ahead: () => Promise.resolve(undefined), handle }),
  before,
})

export interface AheadHandlers<E extends Endpoint, Ahead> {
  /**
   * Runs on the pool, before the transaction, and again when the transaction finds it outdated. It
   * refuses nothing: a request sent again under its key must come to its first answer.
   */
  readonly ahead: (input: RouteInput<E>) => Promise<Ahead>
  /** Throws `AheadOutdated` where what was done ahead does not fit what it finds. */
  readonly handle: (input: RouteInput<E> & { readonly ahead: Ahead }) => Promise<AnswerOf<E>>
}

/** Like `defineRoute`, for handlers that need something slow, which no transaction waits for. */
export function defineRouteAhead<E extends Endpoint, Ahead>(
  endpoint: E,
  { ahead, handle }: AheadHandlers<E, Ahead>,
): Route {
  if (endpoint.permission === 'public') {
    throw new Error(`${endpoint.method} ${endpoint.path} is public: use definePublicRoute.`)
  }
  return {
    endpoint,
    transaction: endpoint.changes,
    before: [],
    prepare: async ({ request, signal, pool }) => {
      const parsed = parseInput(endpoint, request)
      const person = request.user
      if (!person) throw notSignedIn()
      const input = { ...parsed, person, signal, request }
      const done = await ahead({ ...input, db: pool })
      return (db) => handle({ ...input, db, ahead: done })
    },
  }
}

/** Like `defineRoute`, for the few endpoints that need no session; not in a transaction. */
export function definePublicRoute<E extends Endpoint>(
  endpoint: E,
  handle: (input: PublicRouteInput<E>) => Promise<AnswerOf<E>>,
  before: readonly RequestHandler[] = [],
): Route {
  return {
    endpoint,
    transaction: false,
    before,
    // eslint-disable-next-line @typescript-eslint/require-await -- what it throws must reject
    prepare: async ({ request, signal }) => {
      const input = parseInput(endpoint, request)
      return (db) => handle({ ...input, person: request.user ?? null, db, signal, request })
    },
  }
}
