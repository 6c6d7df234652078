import type { Db } from '#server/db/knex'
import type { PersonTableRow } from '#server/db/tables/people'
import { PEOPLE } from '#server/db/tables/people'
import { SESSIONS } from '#server/db/tables/sessions'
import type { Viewer } from '#server/live/may-follow'

type OpenSession = Pick<PersonTableRow, 'role' | 'company_id'> & { sid: string }

/** Of the sessions named, those that have not ended, with who is signed in as of now. */
export async function listOpenSessions(
  db: Db,
  sids: readonly string[],
): Promise<Map<string, Viewer>> {
  const rows = await db(SESSIONS)
    .join(PEOPLE, db.raw("people.id::text = sessions.sess -> 'passport' ->> 'user'"))
    .whereIn('sid', sids)
    .whereRaw('expire > now()')
    .where('active', true)
    .select<OpenSession[]>('sid', 'role', 'company_id')
  return new Map(rows.map((row) => [row.sid, { role: row.role, companyId: row.company_id }]))
}
