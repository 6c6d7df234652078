import type { Logger } from 'pino'
import type { RunningServer } from '#server/running-server'

/**
 * Ends the server once, on SIGTERM, on Ctrl-C, or when the process that started it is gone (its IPC
 * channel closes), so that the port is free for the next start.
 */
export function endGracefully(server: RunningServer, logger: Logger): void {
  let ending = false
  const end = (why: string) => {
    if (ending) return
    ending = true
    logger.info({ why }, 'stopping')
    server.close().then(
      () => process.exit(0),
      (error: unknown) => {
        logger.fatal({ err: error }, 'could not stop cleanly')
        process.exit(1)
      },
    )
  }
  process.once('SIGTERM', () => end('SIGTERM'))
  process.once('SIGINT', () => end('SIGINT'))
  if (process.connected) process.once('disconnect', () => end('the launcher is gone'))
}
