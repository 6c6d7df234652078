import { runOnce } from 'graphile-worker'
import type { JobsDeps } from '#server/jobs/job'
import { workerLogger } from '#server/jobs/worker-logger'
import { workerTasks } from '#server/jobs/worker-tasks'

/** Runs the jobs that are due, one after another, until none is left; those that wait stay. */
export const runDueJobs = ({ databaseUrl, tasks, logger }: JobsDeps): Promise<void> =>
  runOnce({
    connectionString: databaseUrl,
    maxPoolSize: 2,
    noHandleSignals: true,
    logger: workerLogger(logger),
    taskList: workerTasks(tasks, logger),
  })
