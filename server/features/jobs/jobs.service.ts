import { companyScope } from '#server/db/company-scope'
import type { JobsQueries } from '#server/features/jobs/jobs.queries'
import type { JobsStore } from '#server/features/jobs/jobs.store'
import type { SignedIn } from '#server/http/define-route'
import { changedMeanwhile, notFound } from '#server/http/errors'
import type { Announcement } from '#server/live/announce'
import type { OwningCompany } from '#server/features/jobs/owning-company'
import type { RedrawOrders } from '#server/features/orders/redraw-orders'
import type { BodyOf, QueryOf } from '#shared/http/endpoint'
import type { createJob, Job, listJobs, updateJob } from '#shared/jobs/jobs.contract'

export interface JobsDeps {
  readonly queries: JobsQueries
  readonly store: JobsStore
  readonly owningCompany: OwningCompany
  readonly redrawOrders: RedrawOrders
  readonly announce: (announcement: Announcement) => Promise<void>
}

export const createJobsService = (deps: JobsDeps) => {
  const { queries, store, owningCompany, redrawOrders, announce } = deps
  const getJob = async (id: string, person: SignedIn): Promise<Job> => {
    const job = await queries.findJob(id, companyScope(person))
    if (!job) throw notFound('job')
    return job
  }

  const tell = (topic: 'jobs' | 'orders', entityId: string | null, companyId: string) =>
    announce({ topic, entityId, companyId, audience: 'company' })

  return {
    listJobs: (query: QueryOf<typeof listJobs>, person: SignedIn) =>
      queries.listJobs(query, companyScope(person)),

    getJob,

    async createJob(body: BodyOf<typeof createJob>, person: SignedIn): Promise<Job> {
      const companyId = await owningCompany(body.companyId, person)
      const id = await store.createJob({
        company_id: companyId,
        name: body.name,
        address: body.address,
        pitch_rise: body.pitchRise,
        created_by: person.id,
      })
      await tell('jobs', id, companyId)
      return getJob(id, person)
    },

    /**
     * Another pitch is drawn on every order of the job that can still be changed.
     *
     * @throws changed-meanwhile with the job as it is now
     */
    async updateJob(id: string, body: BodyOf<typeof updateJob>, person: SignedIn): Promise<Job> {
      const { company, pitchRise: from } = await getJob(id, person)
      const changed = await store.updateJob(id, body.version, {
        ...(body.name !== undefined && { name: body.name }),
        ...(body.address !== undefined && { address: body.address }),
        ...(body.pitchRise !== undefined && { pitch_rise: body.pitchRise }),
      })
      const job = await getJob(id, person)
      if (!changed) throw changedMeanwhile(job)
      await tell('jobs', id, company.id)
      const to = job.pitchRise
      if (to !== from) {
        await redrawOrders({ jobId: id, companyId: company.id, to, personId: person.id })
      }
      // Orders show the name of their job.
      if (body.name !== undefined) await tell('orders', null, company.id)
      return job
    },
  }
}

export type JobsService = ReturnType<typeof createJobsService>
