import { randomUUID } from 'node:crypto'
import type { IncomingMessage } from 'node:http'
import type { RequestHandler } from 'express'
import type { Logger } from 'pino'
import { pinoHttp } from 'pino-http'

export const REQUEST_ID_HEADER = 'X-Request-Id'

/** Links that set a password carry their token in the path. */
const TOKEN_PATH = /^\/(welcome|reset)\/.*/

const pathOf = (url: string | undefined): string =>
  ((url ?? '').split('?', 1)[0] ?? '').replace(TOKEN_PATH, '/$1/…')

/**
 * One line for each request, under the id that a problem answer carries as `requestId`. No headers,
 * bodies or query strings: they hold passwords, cookies and what people search for.
 */
export const logRequests = (logger: Logger): RequestHandler =>
  pinoHttp({
    logger,
    genReqId: (_request, response) => {
      const id = randomUUID()
      response.setHeader(REQUEST_ID_HEADER, id)
      return id
    },
    customLogLevel: (_request, response, error) => {
      if (error ?? response.statusCode >= 500) return 'error'
      return response.statusCode >= 400 ? 'warn' : 'info'
    },
    serializers: {
      req: (request: {
        id: unknown
        method: string
        raw: IncomingMessage & { originalUrl?: string }
      }) => ({
        id: request.id,
        method: request.method,
        path: pathOf(request.raw.originalUrl ?? request.raw.url),
      }),
      res: (response: { statusCode: number }) => ({ status: response.statusCode }),
    },
  })
