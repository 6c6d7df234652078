import { z } from 'zod'
import type { Clock } from '#server/adapters/clock'
import {
  MailRefused,
  type MailTransport,
  type OutgoingAttachment,
  type OutgoingMail,
} from '#server/adapters/mail/mail-transport'
import type { Db } from '#server/db/knex'
import type { MailRow, MailUpdate } from '#server/db/tables/mails'
import { PEOPLE } from '#server/db/tables/people'
import {
  addAttachments,
  findMailRow,
  listAttachments,
  updateMail,
} from '#server/features/mail/mails.store'
import type { JobTry } from '#server/jobs/job'
import type { MailDraws } from '#shared/mail/mail.contract'

/** Draws what a mail about an order carries, for the person it goes to. */
export type DrawForMail = (
  db: Db,
  wish: { readonly orderId: string; readonly personId: string },
) => Promise<readonly OutgoingAttachment[]>

export interface SendMailDeps {
  readonly db: Db
  readonly clock: Clock
  readonly transport: MailTransport
  readonly draw: Record<MailDraws, DrawForMail>
}

const payloadSchema = z.object({ mailId: z.uuid() })

/** Longer answers of mail servers are cut. */
const LONGEST_ERROR = 500

/**
 * The job that sends a mail. One that is sent or given up already is left alone, so running twice
 * for one cause sends once, but for a process that dies between sending and writing it down: that
 * mail goes out again under the same Message-ID.
 *
 * Throws what the transport throws while tries are left; after the last one, or when the mail server
 * refuses the address for good, the mail is marked as failed and the job ends.
 */
export const createSendMail = (deps: SendMailDeps) => async (payload: unknown, attempt: JobTry) => {
  const { mailId } = payloadSchema.parse(payload)
  const mail = await findMailRow(deps.db, mailId)
  if (mail?.state !== 'queued') return
  const attempts = mail.attempts + 1
  try {
    await deps.transport.send(await outgoing(deps, mail))
  } catch (error) {
    const failed = attempt.last || error instanceof MailRefused
    await updateMail(deps.db, mail.id, {
      attempts,
      last_error: messageOf(error),
      ...(failed && { state: 'failed' as const }),
    })
    if (failed) return
    throw error
  }
  await updateMail(deps.db, mail.id, {
    state: 'sent',
    sent_at: deps.clock.now(),
    attempts,
    last_error: null,
    ...(deps.transport.leaves && withoutSecret(mail)),
  })
}

async function outgoing(deps: SendMailDeps, mail: MailRow): Promise<OutgoingMail> {
  const person = await deps.db(PEOPLE).where({ id: mail.person_id }).first('name')
  return {
    id: mail.id,
    to: { name: person?.name ?? '', address: mail.to_address },
    language: mail.language,
    subject: mail.subject,
    text: mail.text,
    html: mail.html,
    attachments: await attachmentsOf(deps, mail),
  }
}

/** Drawn before the first try, and kept. */
async function attachmentsOf(
  { db, draw }: SendMailDeps,
  { id, draws, order_id: orderId, person_id: personId }: MailRow,
): Promise<OutgoingAttachment[]> {
  if (draws === null || orderId === null) return []
  const kept = await listAttachments(db, id)
  if (kept.length === 0) await addAttachments(db, id, await draw[draws](db, { orderId, personId }))
  const rows = kept.length === 0 ? await listAttachments(db, id) : kept
  return rows.map((row) => ({
    name: row.name,
    mediaType: row.media_type,
    contentId: row.content_id,
    bytes: row.bytes,
  }))
}

/** What opens an account is no longer kept once it lies with its person. */
export const SECRET_HIDDEN = '•••'

export function withoutSecret({ text, html, secret }: MailRow): MailUpdate {
  if (secret === null) return {}
  return {
    text: text.replaceAll(secret, SECRET_HIDDEN),
    html: html.replaceAll(secret, SECRET_HIDDEN),
    secret: null,
  }
}

const messageOf = (error: unknown): string =>
  (error instanceof Error ? error.message : String(error)).slice(0, LONGEST_ERROR)
