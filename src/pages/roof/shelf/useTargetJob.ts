import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { useSearchParams } from 'react-router-dom'
import { z } from 'zod'
import type { Job } from '#shared/jobs/jobs.contract'
import { jobQuery } from '@/features/jobs/api/jobs.queries'

const idSchema = z.uuid().nullable().catch(null)

/** The job that a profile is taken for: the one of the address (`?job=`), or one that is chosen here. */
export interface TargetJob {
  readonly job: Job | null
  /** Of the address; then no other is asked for. */
  readonly jobId: string | null
  /** The order that is amended with it. */
  readonly orderId: string | null
  readonly error: Error | null
  readonly retry: () => void
  readonly choose: (job: Job | null) => void
}

export function useTargetJob(): TargetJob {
  const [query] = useSearchParams()
  const jobId = idSchema.parse(query.get('job'))
  const orderId = idSchema.parse(query.get('order'))
  const given = useQuery({ ...jobQuery(jobId ?? ''), enabled: jobId !== null })
  const [chosen, setChosen] = useState<Job | null>(null)
  return {
    job: jobId === null ? chosen : (given.data ?? null),
    jobId,
    orderId,
    error: given.data ? null : given.error,
    retry: () => void given.refetch(),
    choose: setChosen,
  }
}
