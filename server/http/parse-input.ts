import type { Request } from 'express'
import { z } from 'zod'
import { invalidInput } from '#server/http/errors'
import { inputMessage } from '#server/http/input-messages'
import type { BodyOf, Endpoint, ParamsOf, QueryOf } from '#shared/http/endpoint'
import type { FieldError } from '#shared/http/problem'

interface ParsedInput<E extends Endpoint> {
  readonly params: ParamsOf<E>
  readonly query: QueryOf<E>
  readonly body: BodyOf<E>
}

/** Parses all three parts before complaining, so that one answer names every bad field. */
export function parseInput<E extends Endpoint>(endpoint: E, request: Request): ParsedInput<E> {
  const params = z.safeParse<E['params']>(endpoint.params, request.params, { error: inputMessage })
  const query = z.safeParse<E['query']>(endpoint.query, request.query, { error: inputMessage })
  const body = z.safeParse<E['body']>(endpoint.body, request.body, { error: inputMessage })
  if (params.success && query.success && body.success) {
    return { params: params.data, query: query.data, body: body.data }
  }
  throw invalidInput([params, query, body].flatMap(fieldErrorsOf))
}

function fieldErrorsOf(result: z.ZodSafeParseResult<unknown>): FieldError[] {
  if (result.success) return []
  return result.error.issues.flatMap((issue): FieldError[] => {
    const path = issue.path.map(String)
    if (issue.code !== 'unrecognized_keys')
      return [{ path: path.join('.'), message: issue.message }]
    return issue.keys.map((key) => ({
      path: [...path, key].join('.'),
      message: 'This field is not known here. Leave it out.',
    }))
  })
}
