import type { Clock } from '#server/adapters/clock'
import type { Db } from '#server/db/knex'
import { IDEMPOTENCY_KEYS } from '#server/db/tables/idempotency-keys'
import { LIVE_EVENTS } from '#server/db/tables/live-events'
import { PLAN_CACHE } from '#server/db/tables/plan-cache'
import { RATE_LIMITS } from '#server/db/tables/rate-limits'

const HOUR = 60 * 60 * 1000
const DAY = 24 * HOUR
const LIVE_EVENTS_KEPT_FOR = DAY
/** A tablet that was out of reach for weeks may still send what was done meanwhile. */
const IDEMPOTENCY_KEYS_KEPT_FOR = 60 * DAY
/** Counted from the day a plan was last asked for. */
const PLANS_KEPT_FOR = 30 * DAY

/** Removes what nobody will ask for again. Any number of processes may do it at once. */
export async function removeOutdated(db: Db, now: Date): Promise<void> {
  const before = (age: number) => new Date(now.getTime() - age)
  await db(LIVE_EVENTS).where('at', '<', before(LIVE_EVENTS_KEPT_FOR)).delete()
  await db(IDEMPOTENCY_KEYS).where('created_at', '<', before(IDEMPOTENCY_KEYS_KEPT_FOR)).delete()
  await db(PLAN_CACHE).where('used_at', '<', before(PLANS_KEPT_FOR)).delete()
  await db(RATE_LIMITS).where('resets_at', '<', now).delete()
}

export interface HousekeepingOptions {
  readonly db: Db
  readonly clock: Clock
  readonly onError: (message: string, error: unknown) => void
}

/** Tidies up now and every hour; the function given back ends it. */
export function startHousekeeping({ db, clock, onError }: HousekeepingOptions): () => void {
  const tidy = () => {
    removeOutdated(db, clock.now()).catch((error: unknown) =>
      onError('what is outdated could not be removed', error),
    )
  }
  tidy()
  const timer = setInterval(tidy, HOUR)
  timer.unref()
  return () => clearInterval(timer)
}
