import type { Db } from '#server/db/knex'
import { LIVE_EVENTS, type LiveEventInsert } from '#server/db/tables/live-events'
import { LIVE_CHANNEL } from '#server/live/live-message'
import type { LiveEvent } from '#shared/live/live'

export interface Announcement extends LiveEvent {
  /** Whose rows changed; told to the crew only with audience `company`. */
  readonly companyId: string | null
  /** `shop`: the shop's people; `company`: they and the company's crew; `all`: everyone. */
  readonly audience: LiveEventInsert['audience']
}

/**
 * Tells the screens that follow along what changed. Called in the transaction of the change: the
 * event is kept and sent when it commits, and never was when it does not.
 *
 *     await announce(db, { topic: 'orders', entityId: order.id, companyId, audience: 'company' })
 */
export async function announce(db: Db, announcement: Announcement): Promise<void> {
  const { topic, entityId, audience } = announcement
  const companyId = audience === 'company' ? announcement.companyId : null
  await db.raw(
    `with event as (
       insert into ?? (topic, entity_id, company_id, audience) values (?, ?, ?, ?) returning *
     )
     select pg_notify(?, json_build_object(
       'id', id, 'topic', topic, 'entityId', entity_id, 'companyId', company_id, 'audience', audience
     )::text) from event`,
    [LIVE_EVENTS, topic, entityId, companyId, audience, LIVE_CHANNEL],
  )
}
