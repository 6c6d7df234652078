import { useMutation, useQueryClient } from '@tanstack/react-query'
import type { BodyInputOf } from '#shared/http/endpoint'
import { createShelfProfile, updateShelfProfile } from '#shared/shelf/shelf.contract'
import { call } from '@/lib/api/call'
import { useIdempotentMutation } from '@/lib/api/useIdempotentMutation'

export type NewShelfProfile = BodyInputOf<typeof createShelfProfile>
export type ShelfProfileChange = BodyInputOf<typeof updateShelfProfile>

export function useCreateShelfProfile() {
  const client = useQueryClient()
  return useIdempotentMutation({
    send: (body: NewShelfProfile, idempotencyKey) =>
      call(createShelfProfile, { body, idempotencyKey }),
    onSuccess: () => client.invalidateQueries({ queryKey: ['shelf'] }),
  })
}

export function useUpdateShelfProfile(profileId: string) {
  const client = useQueryClient()
  return useMutation({
    mutationFn: (body: ShelfProfileChange) =>
      call(updateShelfProfile, { params: { profileId }, body }),
    onSuccess: () => client.invalidateQueries({ queryKey: ['shelf'] }),
  })
}
