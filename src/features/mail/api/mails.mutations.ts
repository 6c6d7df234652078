import { useQueryClient } from '@tanstack/react-query'
import { sendMailAgain } from '#shared/mail/mail.contract'
import { mailQuery } from '@/features/mail/api/mails.queries'
import { call } from '@/lib/api/call'
import { useIdempotentMutation } from '@/lib/api/useIdempotentMutation'

export function useSendMailAgain() {
  const client = useQueryClient()
  return useIdempotentMutation({
    send: (mailId: string, idempotencyKey) =>
      call(sendMailAgain, { params: { mailId }, idempotencyKey }),
    oneKeyPer: (mailId) => mailId,
    onSuccess: async (mail) => {
      client.setQueryData(mailQuery(mail.id).queryKey, mail)
      await client.invalidateQueries({ queryKey: ['mails', 'list'] })
    },
  })
}
