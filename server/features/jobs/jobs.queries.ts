import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { containing } from '#server/db/like'
import { decodeCursor, toPage } from '#server/http/cursor'
import type { AnswerOf, QueryOf } from '#shared/http/endpoint'
import type { Job, listJobs } from '#shared/jobs/jobs.contract'

interface JobWithCompany {
  id: string
  company_id: string
  company_name: string
  name: string
  address: string
  pitch_rise: number
  version: number
  created_at: Date
  /** To the microsecond, which a Date does not hold. */
  created_key: string
  order_count: number
}

const cursorSchema = z.tuple([z.iso.datetime(), z.uuid()])

const toJob = (row: JobWithCompany): Job => ({
  id: row.id,
  company: { id: row.company_id, name: row.company_name },
  name: row.name,
  address: row.address,
  pitchRise: row.pitch_rise,
  version: row.version,
  orderCount: row.order_count,
  createdAt: row.created_at.toISOString(),
})

export const createJobsQueries = (db: Db) => {
  const jobs = (scope: string | null) => {
    const query = db('jobs as j')
      .join('companies as c', 'c.id', 'j.company_id')
      .select<JobWithCompany[]>(
        'j.id',
        'j.company_id',
        'c.name as company_name',
        'j.name',
        'j.address',
        'j.pitch_rise',
        'j.version',
        'j.created_at',
        db.raw(
          `to_char(j.created_at at time zone 'UTC', 'YYYY-MM-DD"T"HH24:MI:SS.US"Z"') as created_key`,
        ),
        db.raw('(select count(*)::integer from orders o where o.job_id = j.id) as order_count'),
      )
    return scope === null ? query : query.where('j.company_id', scope)
  }

  return {
    /** Newest first. `scope` limits to one company. */
    async listJobs(
      { after, limit, search }: QueryOf<typeof listJobs>,
      scope: string | null,
    ): Promise<AnswerOf<typeof listJobs>> {
      const start = decodeCursor(after, cursorSchema)
      const query = jobs(scope)
        .orderBy([
          { column: 'j.created_at', order: 'desc' },
          { column: 'j.id', order: 'desc' },
        ])
        .limit(limit + 1)
      if (start !== null) void query.whereRaw('(j.created_at, j.id) < (?, ?)', start)
      if (search) {
        const pattern = containing(search)
        void query.where((any) => {
          void any
            .whereILike('j.name', pattern)
            .orWhereILike('j.address', pattern)
            .orWhereILike('c.name', pattern)
        })
      }
      return toPage(await query, limit, toJob, (row) => [row.created_key, row.id])
    },

    async findJob(id: string, scope: string | null): Promise<Job | undefined> {
      const row = await jobs(scope).where('j.id', id).first()
      return row && toJob(row)
    },

    /** As `findJob`, and until the transaction ends nobody gives the job another pitch. */
    async holdJob(id: string, scope: string | null): Promise<Job | undefined> {
      const row = await jobs(scope).where('j.id', id).forShare('j').first()
      return row && toJob(row)
    },
  }
}

export type JobsQueries = ReturnType<typeof createJobsQueries>
