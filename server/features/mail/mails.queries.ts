import { z } from 'zod'
import type { Db } from '#server/db/knex'
import type { MailRow } from '#server/db/tables/mails'
import { decodeCursor, toPage } from '#server/http/cursor'
import type { QueryOf } from '#shared/http/endpoint'
import type { listMails as listMailsEndpoint, MailSummary } from '#shared/mail/mail.contract'

const cursorSchema = z.int()

export type MailToPerson = MailRow & { to_name: string }

export const toMailSummary = (row: MailToPerson): MailSummary => ({
  id: row.id,
  to: { name: row.to_name, address: row.to_address },
  template: row.template,
  language: row.language,
  subject: row.subject,
  state: row.state,
  attempts: row.attempts,
  lastError: row.last_error,
  createdAt: row.created_at.toISOString(),
  sentAt: row.sent_at?.toISOString() ?? null,
})

const mailsToPeople = (db: Db) =>
  db('mails as m')
    .join('people as p', 'p.id', 'm.person_id')
    .select<MailToPerson[]>('m.*', 'p.name as to_name')

/** Newest first. */
export async function listMails(
  db: Db,
  { after, limit, state }: QueryOf<typeof listMailsEndpoint>,
): Promise<{ items: MailSummary[]; next: string | null }> {
  const start = decodeCursor(after, cursorSchema)
  const query = mailsToPeople(db)
    .orderBy('m.number', 'desc')
    .limit(limit + 1)
  if (start !== null) void query.where('m.number', '<', start)
  if (state !== undefined) void query.where('m.state', state)
  return toPage(await query, limit, toMailSummary, (row) => row.number)
}

export async function findMail(db: Db, id: string): Promise<MailToPerson | undefined> {
  const [row] = await mailsToPeople(db).where('m.id', id)
  return row
}
