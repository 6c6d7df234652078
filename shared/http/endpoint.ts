import { z } from 'zod'
import type { Permission } from '#shared/access/permissions'

export type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE'

/**
 * One request of the API: the server mounts a handler on it, the client calls it, the API document
 * and the permission test are made from it. Paths are relative to /api, parameters as `:name`.
 */
export interface Endpoint<
  Params extends z.ZodType = z.ZodType,
  Query extends z.ZodType = z.ZodType,
  Body extends z.ZodType = z.ZodType,
  Answer extends z.ZodType = z.ZodType,
> {
  readonly method: Method
  readonly path: string
  /** `public` needs no session. */
  readonly permission: Permission | 'public'
  readonly summary: string
  readonly params: Params
  readonly query: Query
  readonly body: Body
  readonly answer: Answer
  readonly success: 200 | 201 | 204
  /** False for what only reads; the server opens no transaction for it. Every GET, and a POST that asks. */
  readonly changes: boolean
  /** True when the request makes or moves something and must carry an `Idempotency-Key`. */
  readonly idempotent: boolean
}

const nothing = z.strictObject({})
const noBody = z.undefined()
type Nothing = typeof nothing
type NoBody = typeof noBody

interface Definition<Params, Query, Body, Answer> {
  readonly method: Method
  readonly path: string
  readonly permission: Permission | 'public'
  readonly summary: string
  readonly params?: Params
  readonly query?: Query
  readonly body?: Body
  readonly answer: Answer
  readonly success?: 200 | 201 | 204
  readonly changes?: boolean
  readonly idempotent?: boolean
}

/** Fills in what an endpoint does not name: no parameters, no query, no body, 200; a GET changes nothing. */
export function endpoint<
  Answer extends z.ZodType,
  Params extends z.ZodType = Nothing,
  Query extends z.ZodType = Nothing,
  Body extends z.ZodType = NoBody,
>(definition: Definition<Params, Query, Body, Answer>): Endpoint<Params, Query, Body, Answer> {
  return {
    success: 200,
    changes: definition.method !== 'GET',
    idempotent: false,
    ...definition,
    params: (definition.params ?? nothing) as Params,
    query: (definition.query ?? nothing) as Query,
    body: (definition.body ?? noBody) as Body,
  }
}

/** An answer without content. */
export const noContent = z.undefined()

export type ParamsOf<E extends Endpoint> = z.output<E['params']>
export type QueryOf<E extends Endpoint> = z.output<E['query']>
export type QueryInputOf<E extends Endpoint> = z.input<E['query']>
export type BodyOf<E extends Endpoint> = z.output<E['body']>
export type BodyInputOf<E extends Endpoint> = z.input<E['body']>
export type AnswerOf<E extends Endpoint> = z.output<E['answer']>
