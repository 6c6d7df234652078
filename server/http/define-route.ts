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
  /** The pool for a GET, the request's own transaction for everything else. */
  readonly db: Db
  /** For the session routes only. */
  readonly request: Request
}

export interface PublicRouteInput<E extends Endpoint> extends Omit<RouteInput<E>, 'person'> {
  readonly person: SignedIn | null
  /** Always the pool: who is not signed in yet holds no transaction. */
  readonly db: Db
}

/** Runs on the pool or in a transaction; may run twice when the database asks for a retry. */
type Act = (db: Db) => Promise<unknown>

export interface Route {
  readonly endpoint: Endpoint
  /** Whether the handler runs in a transaction of its own. */
  readonly transaction: boolean
  /** Runs before the input is parsed. */
  readonly before: readonly RequestHandler[]
  /** Parses the input (throws `invalid-input`) and gives what remains to be done. */
  readonly prepare: (request: Request) => Act
}

/**
 * Joins an endpoint of the contract to its handler. The mounting code has checked session,
 * permission and CSRF token; it opens the transaction and parses the answer.
 *
 *     defineRoute(getJob, ({ params, person, db }) => make(db).getJob(params.jobId, person))
 */
export function defineRoute<E extends Endpoint>(
  endpoint: E,
  handle: (input: RouteInput<E>) => Promise<AnswerOf<E>>,
): Route {
  if (endpoint.permission === 'public') {
    throw new Error(`${endpoint.method} ${endpoint.path} is public: use definePublicRoute.`)
  }
  return {
    endpoint,
    transaction: endpoint.method !== 'GET',
    before: [],
    prepare: (request) => {
      const input = parseInput(endpoint, request)
      const person = request.user
      if (!person) throw notSignedIn()
      return (db) => handle({ ...input, person, db, request })
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
    prepare: (request) => {
      const input = parseInput(endpoint, request)
      return (db) => handle({ ...input, person: request.user ?? null, db, request })
    },
  }
}
