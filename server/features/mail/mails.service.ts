import type { Db } from '#server/db/knex'
import type { MailAttachmentRow } from '#server/db/tables/mails'
import type { MailPorts } from '#server/features/mail/mail-ports'
import {
  findMail,
  listMails,
  toMailSummary,
  type MailToPerson,
} from '#server/features/mail/mails.queries'
import { listAttachments, lockMail, updateMail } from '#server/features/mail/mails.store'
import { SECRET_HIDDEN, withoutSecret } from '#server/features/mail/send-mail'
import { notFound, wrongState } from '#server/http/errors'
import type { AnswerOf, FileAnswer, QueryOf } from '#shared/http/endpoint'
import type { listMails as listMailsEndpoint, Mail } from '#shared/mail/mail.contract'

export interface MailsServicePorts extends Pick<MailPorts, 'enqueue'> {
  /** Whether mails leave the machine; see MailTransport. */
  readonly leaves: boolean
}

export type MailsService = ReturnType<typeof createMailsService>

export const createMailsService = (db: Db, { enqueue, leaves }: MailsServicePorts) => {
  const getMail = async (id: string): Promise<Mail> => {
    const row = await findMail(db, id)
    if (!row) throw notFound('mail')
    return toMail(row, await listAttachments(db, id), leaves)
  }

  return {
    listMails: async (
      query: QueryOf<typeof listMailsEndpoint>,
    ): Promise<AnswerOf<typeof listMailsEndpoint>> => ({ ...(await listMails(db, query)), leaves }),

    getMail,

    attachment: async (mailId: string, position: number): Promise<FileAnswer> => {
      const rows = await listAttachments(db, mailId)
      const row = rows.find((each) => each.position === position && each.content_id === null)
      if (!row) throw notFound('attachment')
      return { name: row.name, bytes: new Uint8Array(row.bytes) }
    },

    /** @throws wrong-state for one that is sent, or waits to be */
    sendAgain: async (id: string): Promise<Mail> => {
      const mail = await lockMail(db, id)
      if (!mail) throw notFound('mail')
      if (mail.state !== 'failed') {
        throw wrongState('Only a mail that could not be sent is sent again.', mail.state)
      }
      await updateMail(db, id, { state: 'queued' })
      await enqueue(db, id)
      return getMail(id)
    },
  }
}

/**
 * While mails leave the machine a manager does not get to see what opens another one's account. The
 * catcher shows it: nobody else gets the mail.
 */
function toMail(
  row: MailToPerson,
  attachments: readonly MailAttachmentRow[],
  leaves: boolean,
): Mail {
  const shown = leaves ? { ...row, ...withoutSecret(row) } : row
  return {
    ...toMailSummary(row),
    text: shown.text,
    html: withPictures(shown.html, attachments),
    attachments: attachments
      .filter(({ content_id: contentId }) => contentId === null)
      .map(({ position, name, bytes }) => ({ position, name, size: bytes.length })),
    secretHidden: shown.text.includes(SECRET_HIDDEN),
  }
}

/** Pictures that a mail program takes from the attachments are put where they are shown. */
const withPictures = (html: string, attachments: readonly MailAttachmentRow[]): string =>
  attachments.reduce(
    (text, { content_id: id, media_type: type, bytes }) =>
      id === null
        ? text
        : text.replaceAll(`"cid:${id}"`, `"data:${type};base64,${bytes.toString('base64')}"`),
    html,
  )
