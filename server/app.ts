import express, { type Express, type RequestHandler } from 'express'
import type { Logger } from 'pino'
import type { Db } from '#server/db/knex'
import { compress } from '#server/http/compress'
import type { Route } from '#server/http/define-route'
import { documentRouter } from '#server/http/document/document.routes'
import { healthRouter } from '#server/http/health'
import { mountRoutes } from '#server/http/mount-routes'
import { answerProblem, unknownPath } from '#server/http/problem-answer'
import { logRequests } from '#server/http/request-log'
import { securityHeaders } from '#server/http/security-headers'
import type { LiveHub } from '#server/live/live-hub'
import { liveRouter } from '#server/live/live.routes'

export interface AppDeps {
  readonly db: Db
  readonly logger: Logger
  readonly routes: readonly Route[]
  readonly hub: LiveHub
  readonly session: RequestHandler
  readonly readPerson: RequestHandler
  /** What answers everything outside /api. */
  readonly client: RequestHandler
  /** Served over TLS. */
  readonly secure: boolean
  readonly contentSecurityPolicy: boolean
  readonly trustProxy: number
}

/** The order of things, top to bottom. */
export function createApp(deps: AppDeps): Express {
  const app = express()
  app.disable('x-powered-by')
  app.set('trust proxy', deps.trustProxy)

  app.use(logRequests(deps.logger))
  app.use(securityHeaders(deps))
  app.use(compress())
  app.use('/api', createApi(deps))
  app.use(deps.client)
  app.use(answerProblem)
  return app
}

function createApi(deps: AppDeps) {
  const api = express.Router()
  api.use(healthRouter(deps.db))
  api.use(documentRouter())

  api.use(deps.session)
  api.use(deps.readPerson)
  api.use(liveRouter(deps.hub))
  api.use(express.json({ limit: '1mb' }))
  mountRoutes(api, deps.routes, deps.db)
  api.use(unknownPath)
  return api
}
