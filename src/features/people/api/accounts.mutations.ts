import { useMutation, useQueryClient } from '@tanstack/react-query'
import type { BodyInputOf } from '#shared/http/endpoint'
import {
  askPasswordReset,
  changePassword,
  createCompany,
  deactivatePerson,
  inviteAgain,
  invitePerson,
  reactivatePerson,
  setPassword,
} from '#shared/people/accounts.contract'
import { sessionKey } from '@/features/people/api/people.queries'
import { call } from '@/lib/api/call'
import { useIdempotentMutation } from '@/lib/api/useIdempotentMutation'

export type Invitation = BodyInputOf<typeof invitePerson>

/** Everything read of people but the session; an invitation is a mail as well. */
function useRereadPeople() {
  const client = useQueryClient()
  return () =>
    Promise.all([
      client.invalidateQueries({
        predicate: ({ queryKey }) => queryKey[0] === 'people' && queryKey[1] !== sessionKey[1],
      }),
      client.invalidateQueries({ queryKey: ['mails'] }),
    ])
}

export const useInvite = () =>
  useIdempotentMutation({
    send: (body: Invitation, idempotencyKey) => call(invitePerson, { body, idempotencyKey }),
    onSuccess: useRereadPeople(),
  })

export const useInviteAgain = () =>
  useIdempotentMutation({
    send: (personId: string, idempotencyKey) =>
      call(inviteAgain, { params: { personId }, idempotencyKey }),
    oneKeyPer: (personId) => personId,
    onSuccess: useRereadPeople(),
  })

export const useDeactivate = () =>
  useMutation({
    mutationFn: (personId: string) => call(deactivatePerson, { params: { personId } }),
    onSuccess: useRereadPeople(),
  })

export const useReactivate = () =>
  useMutation({
    mutationFn: (personId: string) => call(reactivatePerson, { params: { personId } }),
    onSuccess: useRereadPeople(),
  })

export const useCreateCompany = () =>
  useIdempotentMutation({
    send: (body: BodyInputOf<typeof createCompany>, idempotencyKey) =>
      call(createCompany, { body, idempotencyKey }),
    onSuccess: useRereadPeople(),
  })

export const useChangePassword = () =>
  useMutation({
    mutationFn: (body: BodyInputOf<typeof changePassword>) => call(changePassword, { body }),
  })

export const useAskPasswordReset = () =>
  useMutation({
    mutationFn: (body: BodyInputOf<typeof askPasswordReset>) => call(askPasswordReset, { body }),
    retry: false,
  })

export const useSetPassword = () =>
  useMutation({
    mutationFn: (body: BodyInputOf<typeof setPassword>) => call(setPassword, { body }),
    // The link is worth nothing after the first answer.
    retry: false,
  })
