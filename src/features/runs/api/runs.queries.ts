import { queryOptions } from '@tanstack/react-query'
import { getRun, listRuns } from '#shared/runs/runs.contract'
import { call } from '@/lib/api/call'

export const runsQuery = (state: 'open' | 'done' = 'open') =>
  queryOptions({
    queryKey: ['runs', 'list', state],
    queryFn: ({ signal }) => call(listRuns, { query: { state }, signal }),
  })

export const runQuery = (runId: string) =>
  queryOptions({
    queryKey: ['runs', 'one', runId],
    queryFn: ({ signal }) => call(getRun, { params: { runId }, signal }),
  })
