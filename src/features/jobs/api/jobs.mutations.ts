import { useMutation, useQueryClient } from '@tanstack/react-query'
import type { BodyInputOf } from '#shared/http/endpoint'
import { createJob, updateJob, type Job } from '#shared/jobs/jobs.contract'
import { call } from '@/lib/api/call'
import { useIdempotentMutation } from '@/lib/api/useIdempotentMutation'
import { jobQuery } from './jobs.queries'

export type NewJob = BodyInputOf<typeof createJob>
export type JobChange = BodyInputOf<typeof updateJob>

function useStoreJob() {
  const client = useQueryClient()
  return async (job: Job) => {
    client.setQueryData(jobQuery(job.id).queryKey, job)
    await client.invalidateQueries({ queryKey: ['jobs', 'list'] })
  }
}

export function useCreateJob() {
  return useIdempotentMutation({
    send: (body: NewJob, idempotencyKey) => call(createJob, { body, idempotencyKey }),
    onSuccess: useStoreJob(),
  })
}

export function useUpdateJob(jobId: string) {
  return useMutation({
    mutationFn: (body: JobChange) => call(updateJob, { params: { jobId }, body }),
    onSuccess: useStoreJob(),
  })
}
