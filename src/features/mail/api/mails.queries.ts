import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query'
import { getMail, listMails, mailAttachment, type MailState } from '#shared/mail/mail.contract'
import { call } from '@/lib/api/call'
import { fileHref } from '@/lib/api/file-href'

export const mailsQuery = (state?: MailState) =>
  infiniteQueryOptions({
    queryKey: ['mails', 'list', state ?? null],
    queryFn: ({ pageParam, signal }) =>
      call(listMails, {
        query: { ...(state && { state }), ...(pageParam === null ? {} : { after: pageParam }) },
        signal,
      }),
    initialPageParam: null as string | null,
    getNextPageParam: (page) => page.next,
  })

export const mailQuery = (mailId: string) =>
  queryOptions({
    queryKey: ['mails', 'one', mailId],
    queryFn: ({ signal }) => call(getMail, { params: { mailId }, signal }),
  })

/** Where an attachment lies, for a link that opens in a new tab. */
export const attachmentHref = (mailId: string, position: number): string =>
  fileHref(mailAttachment, { params: { mailId, position } })
