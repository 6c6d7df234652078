import type { Db } from '#server/db/knex'
import type { JobName } from '#server/jobs/job'

/**
 * The wait after try n is e^n seconds: 3 s, 7 s, 20 s … 6 hours. Twelve tries reach over 16 hours, a
 * mail server that is down for a night included.
 */
const MOST_TRIES = 12

export interface NewJob {
  readonly name: JobName
  readonly payload: Readonly<Record<string, string>>
  /** A job that waits under the same key is replaced, and its tries count anew. */
  readonly key?: string
}

/**
 * Leaves a job in the transaction that causes it: it runs after the commit, and never if there is
 * none. No worker has to run for it.
 */
export async function addJob(db: Db, { name, payload, key }: NewJob): Promise<void> {
  await db.raw(
    `select graphile_worker.add_job(
       :name, payload := cast(:payload as json), job_key := :key, max_attempts := :tries)`,
    { name, payload: JSON.stringify(payload), key: key ?? null, tries: MOST_TRIES },
  )
}
