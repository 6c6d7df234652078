import type { Db } from '#server/db/knex'
import { LIVE_EVENTS, type LiveEventRow } from '#server/db/tables/live-events'
import type { LiveMessage } from '#server/live/live-message'

/** Longer than any transaction of ours: ids are given out before the commit, in no order of commits. */
const LATE_COMMIT_SECONDS = 30

export type CatchUp =
  | { readonly kind: 'events'; readonly events: readonly LiveMessage[] }
  /** What was missed is no longer kept: everything has to be read anew. */
  | { readonly kind: 'reset' }

const messageOf = (row: LiveEventRow): LiveMessage => ({
  id: row.id,
  topic: row.topic,
  entityId: row.entity_id,
  companyId: row.company_id,
  audience: row.audience,
})

/** 0 when nothing is kept. */
export async function findLatestEventId(db: Db): Promise<number> {
  const row = await db(LIVE_EVENTS).max({ latest: 'id' }).first()
  return Number(row?.latest ?? 0)
}

/**
 * What happened after the event last seen, in order, together with whatever may have committed late
 * beside it. Telling a screen twice does no harm; not telling it would.
 */
export async function listEventsSince(db: Db, lastSeenId: number): Promise<CatchUp> {
  const lastSeen = await db(LIVE_EVENTS).where({ id: lastSeenId }).first()
  if (!lastSeen) {
    const latest = await findLatestEventId(db)
    return latest === 0 && lastSeenId === 0 ? { kind: 'events', events: [] } : { kind: 'reset' }
  }
  const rows = await db(LIVE_EVENTS)
    .where('id', '>', lastSeenId)
    .orWhere((late) => {
      void late
        .whereNot('id', lastSeenId)
        .where('at', '>=', new Date(lastSeen.at.getTime() - LATE_COMMIT_SECONDS * 1000))
    })
    .orderBy('id')
  return { kind: 'events', events: rows.map(messageOf) }
}
