import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query'
import { getJob, listJobs } from '#shared/jobs/jobs.contract'
import { call } from '@/lib/api/call'

export const jobsQuery = (search = '') =>
  infiniteQueryOptions({
    queryKey: ['jobs', 'list', search],
    queryFn: ({ pageParam, signal }) =>
      call(listJobs, {
        query: {
          ...(search === '' ? {} : { search }),
          ...(pageParam === null ? {} : { after: pageParam }),
        },
        signal,
      }),
    initialPageParam: null as string | null,
    getNextPageParam: (page) => page.next,
  })

export const jobQuery = (jobId: string) =>
  queryOptions({
    queryKey: ['jobs', 'one', jobId],
    queryFn: ({ signal }) => call(getJob, { params: { jobId }, signal }),
  })
