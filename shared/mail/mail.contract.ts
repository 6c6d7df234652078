import { z } from 'zod'
import { endpoint, fileEndpoint } from '#shared/http/endpoint'
import { idParams, momentSchema } from '#shared/http/fields'
import { pageOf, pageQuery } from '#shared/http/paging'
import { languageSchema } from '#shared/people/people.contract'

export const mailStateSchema = z.enum(['queued', 'sent', 'failed'])

export const mailTemplateSchema = z.enum([
  'invitation',
  'passwordReset',
  'orderReceived',
  'question',
  'released',
  'ready',
])

/** What is drawn of the mail's order and attached before it is sent. */
export const mailDrawsSchema = z.enum(['drawings', 'slip'])

export const mailSummarySchema = z.strictObject({
  id: z.uuid(),
  to: z.strictObject({ name: z.string(), address: z.string() }),
  template: mailTemplateSchema,
  language: languageSchema,
  subject: z.string(),
  state: mailStateSchema,
  /** How often sending was tried. */
  attempts: z.int(),
  /** Why the last try failed, as the mail server said it. */
  lastError: z.string().nullable(),
  createdAt: momentSchema,
  sentAt: momentSchema.nullable(),
})

export const mailAttachmentSchema = z.strictObject({
  /** From 1. */
  position: z.int(),
  name: z.string(),
  /** Bytes. */
  size: z.int(),
})

export const mailSchema = z.strictObject({
  ...mailSummarySchema.shape,
  text: z.string(),
  /** Pictures are in it; it is shown in a frame that runs no script. */
  html: z.string(),
  attachments: z.array(mailAttachmentSchema),
  /** The link that opens the account is left out: it belongs to the person it is sent to. */
  secretHidden: z.boolean(),
})

const mailParams = idParams('mailId')

export const listMails = endpoint({
  method: 'GET',
  path: '/mails',
  permission: 'mails.read',
  summary: 'Mails to people, newest first.',
  query: z.strictObject({ ...pageQuery, state: mailStateSchema.optional() }),
  answer: z.strictObject({
    ...pageOf(mailSummarySchema).shape,
    /** False while mails are only kept here and sent to nobody. */
    leaves: z.boolean(),
  }),
})

export const getMail = endpoint({
  method: 'GET',
  path: '/mails/:mailId',
  permission: 'mails.read',
  summary: 'A mail with its text and HTML.',
  params: mailParams,
  answer: mailSchema,
})

export const mailAttachment = fileEndpoint({
  path: '/mails/:mailId/attachments/:position',
  permission: 'mails.read',
  summary: 'A drawing that was attached to a mail.',
  params: mailParams.extend({ position: z.coerce.number().int().min(1) }),
  produces: 'application/pdf',
})

export const sendMailAgain = endpoint({
  method: 'POST',
  path: '/mails/:mailId/sending',
  permission: 'mails.send',
  summary: 'Try a mail again that could not be sent.',
  params: mailParams,
  answer: mailSchema,
  idempotent: true,
})

export type MailState = z.infer<typeof mailStateSchema>
export type MailTemplate = z.infer<typeof mailTemplateSchema>
export type MailDraws = z.infer<typeof mailDrawsSchema>
export type MailSummary = z.infer<typeof mailSummarySchema>
export type MailAttachment = z.infer<typeof mailAttachmentSchema>
export type Mail = z.infer<typeof mailSchema>
