import { useQueryClient, type QueryClient } from '@tanstack/react-query'
import { bendPiece, scrapPiece, undoMoves } from '#shared/pieces/pieces.contract'
import { call } from '@/lib/api/call'
import { useIdempotentMutation } from '@/lib/api/useIdempotentMutation'

/** A piece that moved changes its run, its order and the rack; a refusal means that it had moved before. */
export const rereadPieces = (client: QueryClient) =>
  Promise.all(
    ['pieces', 'runs', 'orders', 'rack'].map((root) =>
      client.invalidateQueries({ queryKey: [root] }),
    ),
  )

function useReread() {
  const client = useQueryClient()
  return () => rereadPieces(client)
}

/** Each code has a key of its own, so that two scans in flight do not share one. */
export function useBendPiece() {
  return useIdempotentMutation({
    send: ({ code, runId }: { code: string; runId?: string }, idempotencyKey) =>
      call(bendPiece, {
        params: { code },
        body: runId === undefined ? {} : { runId },
        idempotencyKey,
      }),
    oneKeyPer: ({ code }) => code,
    onSettled: useReread(),
  })
}

export function useScrapPiece() {
  return useIdempotentMutation({
    send: ({ code, reason }: { code: string; reason: string }, idempotencyKey) =>
      call(scrapPiece, { params: { code }, body: { reason }, idempotencyKey }),
    oneKeyPer: ({ code }) => code,
    onSettled: useReread(),
  })
}

export function useUndoMoves() {
  return useIdempotentMutation({
    send: (body: { eventIds: number[]; reason: string }, idempotencyKey) =>
      call(undoMoves, { body, idempotencyKey }),
    oneKeyPer: ({ eventIds }) => eventIds.join(','),
    onSettled: useReread(),
  })
}
