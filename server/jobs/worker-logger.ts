import { Logger, type LogLevel } from 'graphile-worker'
import type { Logger as Pino } from 'pino'

/** The worker tells of each job; that is of interest to whoever looks for a fault in the queue itself. */
const LEVELS: Record<`${LogLevel}`, 'error' | 'warn' | 'debug' | 'trace'> = {
  error: 'error',
  warning: 'warn',
  info: 'debug',
  debug: 'trace',
}

/** Without one the worker writes to the standard output. */
export const workerLogger = (logger: Pino): Logger =>
  new Logger((scope) => (level, message) => {
    logger[LEVELS[level]]({ job: scope.jobId, task: scope.taskIdentifier }, message)
  })
