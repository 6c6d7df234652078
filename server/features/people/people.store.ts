import type { Db } from '#server/db/knex'
import { COMPANIES } from '#server/db/tables/companies'
import {
  PEOPLE,
  type PersonInsert,
  type PersonTableRow,
  type PersonUpdate,
} from '#server/db/tables/people'
import { SESSIONS } from '#server/db/tables/sessions'

export async function updatePerson(db: Db, id: string, update: PersonUpdate): Promise<void> {
  await db(PEOPLE).where({ id }).update(update)
}

/** Somebody without a password yet. */
export async function createPerson(
  db: Db,
  person: Pick<PersonInsert, 'name' | 'email' | 'role' | 'language' | 'company_id'>,
): Promise<string> {
  const [row] = await db(PEOPLE)
    .insert({ ...person, password_hash: null })
    .returning('id')
  if (!row) throw new Error('The new person has no row.')
  return row.id
}

/** The person, locked until the transaction ends. */
export const lockPerson = (db: Db, id: string): Promise<PersonTableRow | undefined> =>
  db(PEOPLE).where({ id }).forNoKeyUpdate().first('*')

/** Ids of the managers whose accounts are open and taken up, locked in one order everywhere. */
export async function lockManagersWhoSignIn(db: Db): Promise<string[]> {
  const rows = await db(PEOPLE)
    .where({ role: 'manager', active: true })
    .whereNotNull('password_hash')
    .orderBy('id')
    .forNoKeyUpdate()
    .select('id')
  return rows.map(({ id }) => id)
}

export async function createCompany(db: Db, name: string): Promise<{ id: string; name: string }> {
  const [row] = await db(COMPANIES).insert({ name }).returning(['id', 'name'])
  if (!row) throw new Error('The new company has no row.')
  return row
}

/** Ends every session of a person. */
export async function deleteSessions(db: Db, personId: string): Promise<void> {
  await db(SESSIONS).whereRaw("sess -> 'passport' ->> 'user' = ?", [personId]).delete()
}

/** Ends every session of a person but the one named. */
export async function deleteOtherSessions(db: Db, personId: string, sid: string): Promise<void> {
  await db(SESSIONS)
    .whereRaw("sess -> 'passport' ->> 'user' = ?", [personId])
    .whereNot({ sid })
    .delete()
}
