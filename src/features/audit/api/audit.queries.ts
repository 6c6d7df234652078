import { infiniteQueryOptions } from '@tanstack/react-query'
import { listAudit } from '#shared/audit/audit.contract'
import { call } from '@/lib/api/call'

/** What a person did and what was done to them; everybody's without one. */
export const auditQuery = (person?: string) =>
  infiniteQueryOptions({
    queryKey: ['audit', 'list', person ?? null],
    queryFn: ({ pageParam, signal }) =>
      call(listAudit, {
        query: { ...(person && { person }), ...(pageParam === null ? {} : { after: pageParam }) },
        signal,
      }),
    initialPageParam: null as string | null,
    getNextPageParam: (page) => page.next,
  })
