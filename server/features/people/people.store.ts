import type { Db } from '#server/db/knex'
import { PEOPLE, type PersonUpdate } from '#server/db/tables/people'
import { SESSIONS } from '#server/db/tables/sessions'

export async function updatePerson(db: Db, id: string, update: PersonUpdate): Promise<void> {
  await db(PEOPLE).where({ id }).update(update)
}

/** Ends every session of a person but the one named. */
export async function deleteOtherSessions(db: Db, personId: string, sid: string): Promise<void> {
  await db(SESSIONS)
    .whereRaw("sess -> 'passport' ->> 'user' = ?", [personId])
    .whereNot({ sid })
    .delete()
}
