import type { Db } from '#server/db/knex'
import { JOBS, type JobInsert, type JobUpdate } from '#server/db/tables/jobs'

export const createJobsStore = (db: Db) => ({
  async createJob(job: JobInsert): Promise<string> {
    const [row] = await db(JOBS).insert(job).returning('id')
    if (!row) throw new Error('The new job has no row.')
    return row.id
  },

  /** False when the job is no longer at `version`. */
  async updateJob(
    id: string,
    version: number,
    changes: Omit<JobUpdate, 'version'>,
  ): Promise<boolean> {
    const count = await db(JOBS)
      .where({ id, version })
      .update({ ...changes, version: version + 1 })
    return count === 1
  },
})

export type JobsStore = ReturnType<typeof createJobsStore>
