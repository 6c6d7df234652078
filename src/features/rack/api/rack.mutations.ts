import { useMutation, useQueryClient } from '@tanstack/react-query'
import { createBundle, moveBundle, openBundle } from '#shared/bundles/bundles.contract'
import { call } from '@/lib/api/call'
import { useIdempotentMutation } from '@/lib/api/useIdempotentMutation'
import { rereadPieces } from '@/features/pieces/api/pieces.mutations'

function useReread() {
  const client = useQueryClient()
  return () => rereadPieces(client)
}

export function useCreateBundle() {
  return useIdempotentMutation({
    send: (body: { orderId: string; pieceCodes: string[]; rackPlace: string }, idempotencyKey) =>
      call(createBundle, { body, idempotencyKey }),
    onSettled: useReread(),
  })
}

export function useMoveBundle(bundleId: string) {
  return useMutation({
    mutationFn: (rackPlace: string) =>
      call(moveBundle, { params: { bundleId }, body: { rackPlace } }),
    onSettled: useReread(),
  })
}

export function useOpenBundle(bundleId: string) {
  return useIdempotentMutation({
    send: (body: { pieceCodes?: string[]; reason: string }, idempotencyKey) =>
      call(openBundle, { params: { bundleId }, body, idempotencyKey }),
    onSettled: useReread(),
  })
}
