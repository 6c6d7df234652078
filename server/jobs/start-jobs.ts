import { setTimeout as delay } from 'node:timers/promises'
import { run, type Runner } from 'graphile-worker'
import type { JobsDeps, RunningJobs } from '#server/jobs/job'
import { workerLogger } from '#server/jobs/worker-logger'
import { workerTasks } from '#server/jobs/worker-tasks'

/** Jobs at a time in this process. */
const CONCURRENCY = 2
/** A job is heard of at once; this only finds those whose wait is over. */
const LOOK_EVERY_MS = 5_000
const START_AGAIN_MS = 5_000

/**
 * Runs jobs within this process; any number of processes share the work. A worker that ends by
 * itself, as when the database goes away, is started again.
 */
export async function startJobs({ databaseUrl, tasks, logger }: JobsDeps): Promise<RunningJobs> {
  const closing = new AbortController()

  const start = () =>
    run({
      connectionString: databaseUrl,
      maxPoolSize: CONCURRENCY + 2,
      concurrency: CONCURRENCY,
      pollInterval: LOOK_EVERY_MS,
      noHandleSignals: true,
      crontab: '',
      logger: workerLogger(logger),
      taskList: workerTasks(tasks, logger),
    })

  let runner: Runner | undefined = await start()

  const keepRunning = async (): Promise<void> => {
    while (!closing.signal.aborted) {
      try {
        runner ??= await start()
        await runner.promise
      } catch (error) {
        if (!closing.signal.aborted) logger.error({ err: error }, 'the jobs stopped')
      }
      runner = undefined
      await delay(START_AGAIN_MS, undefined, { signal: closing.signal }).catch(endOfWait)
    }
  }
  const kept = keepRunning()

  return {
    close: async () => {
      closing.abort()
      await runner?.stop()
      await kept
    },
  }
}

/** Closing ends the wait; nothing else can. */
function endOfWait(error: unknown): void {
  if (!(error instanceof Error) || error.name !== 'AbortError') throw error
}
