import { useQueryClient } from '@tanstack/react-query'
import { handOff, returnBundle, type Signature } from '#shared/hand-off/hand-off.contract'
import { call } from '@/lib/api/call'
import { useIdempotentMutation } from '@/lib/api/useIdempotentMutation'
import { rereadPieces } from '@/features/pieces/api/pieces.mutations'

export interface HandOver {
  readonly bundleCodes: string[]
  readonly receivedBy: string
  readonly signature: Signature
}

export function useHandOff(orderId: string) {
  const client = useQueryClient()
  return useIdempotentMutation({
    send: (body: HandOver, idempotencyKey) =>
      call(handOff, { params: { orderId }, body, idempotencyKey }),
    onSettled: () => rereadPieces(client),
  })
}

export function useReturnBundle() {
  const client = useQueryClient()
  return useIdempotentMutation({
    send: ({ bundleId, reason }: { bundleId: string; reason: string }, idempotencyKey) =>
      call(returnBundle, { params: { bundleId }, body: { reason }, idempotencyKey }),
    oneKeyPer: ({ bundleId }) => bundleId,
    onSettled: () => rereadPieces(client),
  })
}
