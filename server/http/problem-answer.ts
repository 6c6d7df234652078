import type { ErrorRequestHandler, RequestHandler, Response } from 'express'
import { isHttpError } from '#server/http/http-error'
import { findDatabaseProblem } from '#server/db/constraint-errors'
import { AskerGone } from '#server/http/asker-gone'
import { invalidCsrfTokenError } from '#server/http/csrf'
import { notFound, ProblemError } from '#server/http/errors'
import { REQUEST_ID_HEADER } from '#server/http/request-log'
import type { Problem } from '#shared/http/problem'

/** Unknown paths below /api. */
export const unknownPath: RequestHandler = (request) => {
  throw notFound(`path as ${request.method} ${request.baseUrl}${request.path}`)
}

/** The last handler: every failure leaves as RFC 9457 problem details. */
export const answerProblem: ErrorRequestHandler = (error: unknown, request, response, next) => {
  if (error instanceof AskerGone) {
    request.log.info('who asked has gone')
    return
  }
  const problem = problemOf(error)
  if (problem.status >= 500) request.log.error({ err: error }, 'request failed')
  if (response.headersSent) {
    next(error)
    return
  }
  sendProblem(response, problem)
}

export function sendProblem(response: Response, problem: ProblemError): void {
  const body: Problem = {
    type: `/problems/${problem.code}`,
    title: problem.title,
    status: problem.status,
    detail: problem.detail,
    code: problem.code,
    requestId: response.get(REQUEST_ID_HEADER),
    ...(problem.errors && { errors: [...problem.errors] }),
    ...(problem.current !== undefined && { current: problem.current }),
  }
  if (problem.retryAfter !== undefined) response.set('Retry-After', String(problem.retryAfter))
  response
    .status(problem.status)
    .set('Cache-Control', 'no-store')
    .type('application/problem+json')
    .send(JSON.stringify(body))
}

function problemOf(error: unknown): ProblemError {
  if (error instanceof ProblemError) return error
  if (error === invalidCsrfTokenError) {
    return new ProblemError('csrf-token-wrong', 'Load the page again, then repeat what you did.')
  }
  return (
    findDatabaseProblem(error) ??
    unreadableRequest(error) ??
    new ProblemError('internal', 'The request failed and was logged. Try again in a moment.')
  )
}

/** What Express and the body parser refuse before a handler sees the request. */
function unreadableRequest(error: unknown): ProblemError | undefined {
  if (!isHttpError(error) || error.status >= 500) return undefined
  if (error.status === 404) return notFound('file')
  switch (error.type) {
    case 'entity.parse.failed':
      return new ProblemError('invalid-input', 'The body is not JSON. Send valid JSON.')
    case 'entity.too.large':
      return new ProblemError('invalid-input', 'The body is too large. Send at most 1 MB.')
    default:
      return new ProblemError('invalid-input', `The request cannot be read: ${error.message}.`)
  }
}
