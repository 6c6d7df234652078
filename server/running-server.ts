import { createServer, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import { promisify } from 'node:util'
import type { RequestHandler } from 'express'
import type { Knex } from 'knex'
import pg from 'pg'
import type { Logger } from 'pino'
import type { Clock } from '#server/adapters/clock'
import { localCatcher } from '#server/adapters/mail/local-catcher'
import { smtpTransport } from '#server/adapters/mail/smtp-transport'
import { createApp } from '#server/app'
import { compose } from '#server/composition'
import type { Config } from '#server/config'
import { createDatabase } from '#server/db/knex'
import { createSessions } from '#server/http/session'
import type { JobsDeps, RunningJobs } from '#server/jobs/job'
import { startHousekeeping } from '#server/jobs/housekeeping'
import { LiveHub } from '#server/live/live-hub'
import type { Planning, PlanningDeps } from '#server/planning/start-planning'

const SESSION_CONNECTIONS = 4
/** Below the ten seconds after which a supervisor kills. */
const LONGEST_CLOSE_MS = 8_000
const IDLE_CHECK_MS = 50

export interface ServerOptions {
  readonly config: Config
  readonly logger: Logger
  readonly clock: Clock
  /** What answers everything outside /api. */
  readonly client: (server: Server) => Promise<RequestHandler>
  readonly contentSecurityPolicy: boolean
  readonly planning: (deps: PlanningDeps) => Planning
  /** Runs what mails and other jobs were left for. */
  readonly jobs: (deps: JobsDeps) => Promise<RunningJobs>
}

export interface RunningServer {
  /** The origin it listens on. */
  readonly url: string
  readonly db: Knex
  readonly hub: LiveHub
  /** Lets open requests finish, ends the streams, the jobs and the planning, and closes the database. */
  readonly close: () => Promise<void>
}

/** Puts the parts together and listens. */
export async function startServer(options: ServerOptions): Promise<RunningServer> {
  const { config, logger, clock } = options
  const onError = (message: string, error: unknown) => logger.error({ err: error }, message)

  const db = createDatabase(config.databaseUrl)
  const sessionPool = openSessionPool(config.databaseUrl, onError)
  const sessions = createSessions({
    pool: sessionPool,
    secret: config.sessionSecret,
    secureCookie: config.cookieSecure,
    onError,
  })
  const hub = new LiveHub({ db, databaseUrl: config.databaseUrl, onError })
  const planning = options.planning({ db, clock, onError })
  const transport = config.smtp ? smtpTransport(config.smtp) : localCatcher()
  const { routes, signIn, tasks } = compose({
    db,
    clock,
    planner: planning.planner,
    shopTimeZone: config.shopTimeZone,
    publicUrl: config.publicUrl,
    transport,
    onError,
  })

  const server = createServer()
  const app = createApp({
    db,
    logger,
    routes,
    hub,
    session: sessions.middleware,
    readPerson: signIn.readPerson,
    client: await options.client(server),
    secure: config.cookieSecure,
    contentSecurityPolicy: options.contentSecurityPolicy,
    trustProxy: config.trustProxy,
  })
  server.on('request', app)

  await hub.start()
  const stopHousekeeping = startHousekeeping({ db, clock, onError })
  const jobs = await options.jobs({ databaseUrl: config.databaseUrl, tasks, logger })
  const address = await listen(server, config)

  const close = async () => {
    stopHousekeeping()
    const closed = closeServer(server)
    await hub.stop()
    await closed
    await jobs.close()
    transport.close()
    sessions.close()
    await planning.close()
    await Promise.all([db.destroy(), sessionPool.end()])
  }
  return { url: originOf(address), db, hub, close }
}

function openSessionPool(
  connectionString: string,
  onError: (message: string, error: unknown) => void,
): pg.Pool {
  const pool = new pg.Pool({
    connectionString,
    max: SESSION_CONNECTIONS,
    application_name: 'foldyard sessions',
  })
  pool.on('error', (error) => onError('an idle session connection failed', error))
  return pool
}

const listen = (server: Server, { host, port }: Config): Promise<AddressInfo> =>
  new Promise((resolve, reject) => {
    server.once('error', reject)
    server.listen(port, host, () => {
      const address = server.address()
      if (address !== null && typeof address === 'object') resolve(address)
      else reject(new Error('The server listens on no port.'))
    })
  })

const originOf = ({ address, family, port }: AddressInfo): string =>
  `http://${family === 'IPv6' ? `[${address}]` : address}:${port}`

/** Takes no new requests; ends each connection when its last answer is out, and all in the end. */
async function closeServer(server: Server): Promise<void> {
  const idle = setInterval(() => server.closeIdleConnections(), IDLE_CHECK_MS)
  const late = setTimeout(() => server.closeAllConnections(), LONGEST_CLOSE_MS)
  try {
    await promisify(server.close.bind(server))()
  } finally {
    clearInterval(idle)
    clearTimeout(late)
  }
}
