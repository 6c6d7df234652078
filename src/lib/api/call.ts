import type { z } from 'zod'
import type { AnswerOf, BodyInputOf, Endpoint, QueryInputOf } from '#shared/http/endpoint'
import { ApiProblem } from '@/lib/api/api-errors'
import { csrfToken, renewCsrfToken } from '@/lib/api/csrf-token'
import { send, type Sending } from '@/lib/api/send'
import { announceSessionEnd } from '@/lib/api/session-end'

type Nothing = Record<never, never>

type Needs<Name extends string, Value> = Nothing extends Value
  ? { readonly [key in Name]?: Value }
  : { readonly [key in Name]: Value }

/** What a call must say: parameters, query and body as the endpoint's schemas take them. */
export type CallOptions<E extends Endpoint> = Needs<'params', z.input<E['params']>> &
  Needs<'query', QueryInputOf<E>> &
  (undefined extends BodyInputOf<E>
    ? { readonly body?: undefined }
    : { readonly body: BodyInputOf<E> }) & {
    /** Needed where the endpoint is `idempotent`; the same key is sent again with every retry. */
    readonly idempotencyKey?: string
    readonly signal?: AbortSignal
  }

/**
 * Calls the API. Types of parameters, query, body and answer come from the endpoint of the shared
 * contract, and the answer is parsed with its schema.
 *
 *     const job = await call(getJob, { params: { jobId }, signal })
 *
 * Throws `ApiProblem` (the server said why), `OfflineError` (no answer), `UnreadableAnswer` (not
 * the contract's shape). A wrong CSRF token is renewed and the request sent once more; the answer
 * `not-signed-in` is announced, so that the sign-in page comes up over what the person was doing.
 *
 * Features wrap it: `src/features/<x>/api/<x>.queries.ts` exports `queryOptions` builders whose keys
 * begin with the live topic (`['orders', ...]`); `<x>.mutations.ts` exports hooks, and what a
 * change makes stale is invalidated there. `features/people/api` shows both.
 */
export async function call<E extends Endpoint>(
  endpoint: E,
  ...[options]: Nothing extends CallOptions<E> ? [CallOptions<E>?] : [CallOptions<E>]
): Promise<AnswerOf<E>> {
  const key = options?.idempotencyKey
  if (endpoint.idempotent && key === undefined) {
    throw new TypeError(`${endpoint.method} ${endpoint.path} needs an idempotency key.`)
  }
  const sending = (token: string | null): Sending => ({
    params: options?.params,
    query: options?.query,
    body: options?.body,
    signal: options?.signal,
    headers: {
      ...(token === null ? {} : { 'x-csrf-token': token }),
      ...(key === undefined ? {} : { 'idempotency-key': key }),
    },
  })
  try {
    if (endpoint.method === 'GET') return await send(endpoint, sending(null))
    return await sendChange(endpoint, sending)
  } catch (error) {
    if (error instanceof ApiProblem && error.is('not-signed-in')) announceSessionEnd()
    throw error
  }
}

async function sendChange<E extends Endpoint>(
  endpoint: E,
  sending: (token: string) => Sending,
): Promise<AnswerOf<E>> {
  try {
    return await send(endpoint, sending(await csrfToken()))
  } catch (error) {
    if (!(error instanceof ApiProblem && error.is('csrf-token-wrong'))) throw error
    return send(endpoint, sending(await renewCsrfToken()))
  }
}
