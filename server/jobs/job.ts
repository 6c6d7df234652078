import type { Logger } from 'pino'

/** Which try of a job this is. */
export interface JobTry {
  /** Nobody tries again after it. */
  readonly last: boolean
}

/**
 * What a job does. It may run more than once for one cause (at least once), so it must find out
 * itself what is done already. What it throws is tried again after a wait that grows.
 */
export type JobTask = (payload: unknown, attempt: JobTry) => Promise<void>

export const JOB_NAMES = ['send-mail', 'password-reset'] as const
export type JobName = (typeof JOB_NAMES)[number]

export type JobTasks = Readonly<Record<JobName, JobTask>>

export interface JobsDeps {
  readonly databaseUrl: string
  readonly tasks: JobTasks
  readonly logger: Logger
}

export interface RunningJobs {
  /** Lets what is running end, and takes nothing new. */
  readonly close: () => Promise<void>
}
