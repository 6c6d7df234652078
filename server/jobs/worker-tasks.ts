import type { TaskList } from 'graphile-worker'
import type { Logger } from 'pino'
import { JOB_NAMES, type JobTasks } from '#server/jobs/job'

/** Our tasks as the worker runs them. What a task throws is logged here, with its cause. */
export const workerTasks = (tasks: JobTasks, logger: Logger): TaskList =>
  Object.fromEntries(
    JOB_NAMES.map((name) => [
      name,
      async (payload, { job }) => {
        try {
          await tasks[name](payload, { last: job.attempts >= job.max_attempts })
        } catch (error) {
          logger.error({ err: error, task: name, attempt: job.attempts }, 'a job failed')
          throw error
        }
      },
    ]),
  )
