import type { MailDraws, MailState, MailTemplate } from '#shared/mail/mail.contract'
import type { Language } from '#shared/people/people.contract'

export const MAILS = 'mails'
export const MAIL_ATTACHMENTS = 'mail_attachments'
export const SLIPS = 'slips'

export interface MailRow {
  id: string
  number: number
  person_id: string
  to_address: string
  language: Language
  template: MailTemplate
  subject: string
  text: string
  html: string
  /** What opens an account; it stands in text and HTML until the mail has left the machine. */
  secret: string | null
  order_id: string | null
  draws: MailDraws | null
  state: MailState
  attempts: number
  last_error: string | null
  created_at: Date
  sent_at: Date | null
}
export type MailInsert = Pick<
  MailRow,
  'person_id' | 'to_address' | 'language' | 'template' | 'subject' | 'text' | 'html' | 'created_at'
> &
  Partial<Pick<MailRow, 'id' | 'secret' | 'order_id' | 'draws'>>
export type MailUpdate = Partial<
  Pick<MailRow, 'text' | 'html' | 'secret' | 'state' | 'attempts' | 'last_error' | 'sent_at'>
>

export interface MailAttachmentRow {
  mail_id: string
  /** From 1. */
  position: number
  name: string
  media_type: string
  /** Set for a picture that the HTML shows. */
  content_id: string | null
  bytes: Buffer
}
export type MailAttachmentInsert = MailAttachmentRow

export interface SlipRow {
  order_id: string
  code: string
  created_at: Date
}
export type SlipInsert = SlipRow
