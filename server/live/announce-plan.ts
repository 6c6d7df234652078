import type { Db } from '#server/db/knex'
import { LIVE_CHANNEL, type PersonalMessage } from '#server/live/live-message'

/** Tells the screens of one person, on whatever process they follow; kept nowhere. */
export async function announcePlan(db: Db, message: PersonalMessage): Promise<void> {
  await db.raw('select pg_notify(?, ?)', [LIVE_CHANNEL, JSON.stringify(message)])
}
