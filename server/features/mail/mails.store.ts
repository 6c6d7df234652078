import type { Db } from '#server/db/knex'
import {
  MAIL_ATTACHMENTS,
  MAILS,
  type MailInsert,
  type MailRow,
  type MailUpdate,
} from '#server/db/tables/mails'
import type { OutgoingAttachment } from '#server/adapters/mail/mail-transport'
import type { MailPorts } from '#server/features/mail/mail-ports'
import type { MailContent } from '#server/features/mail/templates/mail-words'
import { announce } from '#server/live/announce'
import type { MailDraws, MailTemplate } from '#shared/mail/mail.contract'
import type { Language } from '#shared/people/people.contract'

export interface NewMail {
  readonly to: { readonly id: string; readonly email: string; readonly language: Language }
  readonly template: MailTemplate
  readonly content: MailContent
  /** A token that stands in the content; it is blotted out once the mail has left the machine. */
  readonly secret?: string
  readonly order?: { readonly id: string; readonly draws?: MailDraws }
}

/**
 * Writes a mail and leaves the job that sends it, in the transaction of what causes it: rolled back,
 * there never was one.
 */
export async function writeMail(db: Db, mail: NewMail, ports: MailPorts): Promise<void> {
  const row: MailInsert = {
    person_id: mail.to.id,
    to_address: mail.to.email,
    language: mail.to.language,
    template: mail.template,
    ...mail.content,
    secret: mail.secret ?? null,
    order_id: mail.order?.id ?? null,
    draws: mail.order?.draws ?? null,
    created_at: ports.clock.now(),
  }
  const [written] = await db(MAILS).insert(row).returning('id')
  if (!written) throw new Error('The new mail has no row.')
  await ports.enqueue(db, written.id)
  await announceMail(db, written.id)
}

/** The mail, locked until the transaction ends. */
export const lockMail = (db: Db, id: string): Promise<MailRow | undefined> =>
  db(MAILS).where({ id }).forUpdate().first('*')

export const findMailRow = (db: Db, id: string): Promise<MailRow | undefined> =>
  db(MAILS).where({ id }).first('*')

export async function updateMail(db: Db, id: string, changes: MailUpdate): Promise<void> {
  await db(MAILS).where({ id }).update(changes)
  await announceMail(db, id)
}

/** Keeps what was drawn: a second try sends the same. */
export async function addAttachments(
  db: Db,
  mailId: string,
  files: readonly OutgoingAttachment[],
): Promise<void> {
  if (files.length === 0) return
  await db(MAIL_ATTACHMENTS)
    .insert(
      files.map(({ name, mediaType, contentId, bytes }, index) => ({
        mail_id: mailId,
        position: index + 1,
        name,
        media_type: mediaType,
        content_id: contentId,
        bytes: Buffer.from(bytes),
      })),
    )
    .onConflict(['mail_id', 'position'])
    .ignore()
}

export const listAttachments = (db: Db, mailId: string) =>
  db(MAIL_ATTACHMENTS).where({ mail_id: mailId }).orderBy('position').select('*')

const announceMail = (db: Db, id: string) =>
  announce(db, { topic: 'mails', entityId: id, companyId: null, audience: 'shop' })
