import { pino } from 'pino'
import { systemClock } from '#server/adapters/clock'
import { readConfig } from '#server/config'
import { endGracefully } from '#server/graceful-end'
import { serveClient } from '#server/http/serve-client'
import { exitOnConfigError } from '#server/exit-on-config-error'
import { startJobs } from '#server/jobs/start-jobs'
import { startPlanning } from '#server/planning/start-planning'
import { startServer } from '#server/running-server'

/** Bundled beside this file. */
const builtWorker = { file: new URL('./plan-worker.js', import.meta.url) }

const config = exitOnConfigError(readConfig)
const logger = pino({ level: config.logLevel })
const server = await startServer({
  config,
  logger,
  clock: systemClock,
  client: () => Promise.resolve(serveClient(config.clientDir)),
  contentSecurityPolicy: true,
  planning: (deps) => startPlanning({ program: builtWorker }, deps),
  jobs: startJobs,
})
endGracefully(server, logger)
logger.info({ url: server.url }, 'listening')
