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
 * Runs jobs within this process; any number of processes share the work. Installs the queue's tables
 * where they are not there yet. A worker that ends by itself, as when the database goes away, is
 * started again.
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

  /** Until the worker ends, or is told to. */
  const runUntilEnd = async (runner: Runner): Promise<void> => {
    const stop = () => void runner.stop().catch(told)
    closing.signal.addEventListener('abort', stop)
    if (closing.signal.aborted) stop()
    try {
      await runner.promise
    } finally {
      closing.signal.removeEventListener('abort', stop)
    }
  }

  const told = (error: unknown) => logger.error({ err: error }, 'the jobs stopped')

  const keepRunning = async (first: Runner): Promise<void> => {
    await runUntilEnd(first).catch(told)
    while (!closing.signal.aborted) {
      await delay(START_AGAIN_MS, undefined, { signal: closing.signal }).catch(endOfWait)
      if (!closing.signal.aborted) await start().then(runUntilEnd).catch(told)
    }
  }
  const kept = keepRunning(await start())

  return {
    close: () => {
      closing.abort()
      return kept
    },
  }
}

/** Closing ends the wait; nothing else can. */
function endOfWait(error: unknown): void {
  if (!(error instanceof Error) || error.name !== 'AbortError') throw error
}
