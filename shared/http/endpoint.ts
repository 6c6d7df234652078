import { z } from 'zod'
import type { Permission } from '#shared/access/permissions'

export const MEDIA_TYPES = [
  'application/json',
  'application/pdf',
  'image/svg+xml',
  'image/vnd.dxf',
] as const
export type MediaType = (typeof MEDIA_TYPES)[number]

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
  /** What the answer is sent as; anything but JSON is a `FileAnswer`, opened or kept by the person. */
  readonly produces: MediaType
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
  readonly produces?: MediaType
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
    produces: 'application/json',
    changes: definition.method !== 'GET',
    idempotent: false,
    ...definition,
    params: (definition.params ?? nothing) as Params,
    query: (definition.query ?? nothing) as Query,
    body: (definition.body ?? noBody) as Body,
  }
}

/** A file as a handler gives it; `name` is what it is kept under, with its ending. */
export const fileAnswerSchema = z.strictObject({
  name: z.string().regex(/^[\w.-]+$/),
  bytes: z.instanceof(Uint8Array),
})
export type FileAnswer = z.infer<typeof fileAnswerSchema>

/** An endpoint that is read with a link and answers with a file. Permissions and rows as everywhere. */
export const fileEndpoint = <Params extends z.ZodType = Nothing, Query extends z.ZodType = Nothing>(
  definition: Omit<
    Definition<Params, Query, NoBody, typeof fileAnswerSchema>,
    'method' | 'answer' | 'body' | 'success' | 'changes' | 'idempotent'
  > & { readonly produces: Exclude<MediaType, 'application/json'> },
): Endpoint<Params, Query, NoBody, typeof fileAnswerSchema> =>
  endpoint({ method: 'GET', answer: fileAnswerSchema, ...definition })

/** An answer without content. */
export const noContent = z.undefined()

export type ParamsOf<E extends Endpoint> = z.output<E['params']>
export type QueryOf<E extends Endpoint> = z.output<E['query']>
export type QueryInputOf<E extends Endpoint> = z.input<E['query']>
export type BodyOf<E extends Endpoint> = z.output<E['body']>
export type BodyInputOf<E extends Endpoint> = z.input<E['body']>
export type AnswerOf<E extends Endpoint> = z.output<E['answer']>
