import type { Server } from 'node:http'
import { pino } from 'pino'
import { createServer as createVite } from 'vite'
import { systemClock } from '#server/adapters/clock'
import { readConfig } from '#server/config'
import { exitOnConfigError } from '#server/exit-on-config-error'
import { endGracefully } from '#server/graceful-end'
import { startJobs } from '#server/jobs/start-jobs'
import { sourceWorker } from '#server/planning/source-worker'
import { startPlanning } from '#server/planning/start-planning'
import { startServer } from '#server/running-server'

/** The client's sources, compiled as they are asked for, on the same port as the API. */
const viteClient = async (server: Server) => {
  const vite = await createVite({
    appType: 'spa',
    server: { middlewareMode: true, hmr: { server } },
  })
  server.once('close', () => void vite.close())
  return vite.middlewares
}

const config = exitOnConfigError(readConfig)
const logger = pino({ level: config.logLevel })
const server = await startServer({
  config,
  logger,
  clock: systemClock,
  client: viteClient,
  contentSecurityPolicy: false,
  planning: (deps) => startPlanning({ program: sourceWorker }, deps),
  jobs: startJobs,
})
endGracefully(server, logger)
logger.info({ url: server.url }, 'listening')
