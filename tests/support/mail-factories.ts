import type { Db } from '#server/db/knex'
import { MAILS, type MailRow } from '#server/db/tables/mails'

/** The last mail to an address. */
export async function lastMailTo(db: Db, address: string): Promise<MailRow> {
  const mail = await db(MAILS).where({ to_address: address }).orderBy('number', 'desc').first('*')
  if (!mail) throw new Error(`${address} got no mail.`)
  return mail
}

export const countMailsTo = async (db: Db, address: string): Promise<number> =>
  (await db(MAILS).where({ to_address: address }).select('id')).length

/** The token of the link in a mail's text. */
export function tokenIn({ text }: Pick<MailRow, 'text'>): string {
  const token = /\/(?:welcome|reset)\/([\w-]{43})/.exec(text)?.[1]
  if (token === undefined) throw new Error(`No link in:\n${text}`)
  return token
}
