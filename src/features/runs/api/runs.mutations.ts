import { useQueryClient } from '@tanstack/react-query'
import type { Run } from '#shared/runs/runs.contract'
import { bendCount, claimRun, leaveRun } from '#shared/runs/runs.contract'
import { call } from '@/lib/api/call'
import { useIdempotentMutation } from '@/lib/api/useIdempotentMutation'
import { rereadPieces } from '@/features/pieces/api/pieces.mutations'
import { runQuery } from './runs.queries'

function useStoreRun() {
  const client = useQueryClient()
  return async (run: Run) => {
    client.setQueryData(runQuery(run.id).queryKey, run)
    await client.invalidateQueries({ queryKey: ['runs', 'list'] })
  }
}

function useRereadRuns() {
  const client = useQueryClient()
  return () => client.invalidateQueries({ queryKey: ['runs'] })
}

export function useClaimRun(runId: string) {
  return useIdempotentMutation({
    send: (_: void, idempotencyKey) =>
      call(claimRun, { params: { runId }, body: {}, idempotencyKey }),
    onSuccess: useStoreRun(),
    onError: useRereadRuns(),
  })
}

export function useLeaveRun(runId: string) {
  return useIdempotentMutation({
    send: (_: void, idempotencyKey) =>
      call(leaveRun, { params: { runId }, body: {}, idempotencyKey }),
    onSuccess: useStoreRun(),
    onError: useRereadRuns(),
  })
}

export function useBendCount(runId: string) {
  const client = useQueryClient()
  return useIdempotentMutation({
    send: (body: { count: number; length?: number }, idempotencyKey) =>
      call(bendCount, { params: { runId }, body, idempotencyKey }),
    onSettled: () => rereadPieces(client),
  })
}
