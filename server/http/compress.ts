import compression from 'compression'
import type { RequestHandler } from 'express'

/** Everything but event streams, which would wait in the compressor. */
export const compress = (): RequestHandler =>
  compression({
    filter: (request, response) =>
      response.getHeader('Content-Type') !== 'text/event-stream' &&
      compression.filter(request, response),
  })
