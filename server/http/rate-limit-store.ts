import type { ClientRateLimitInfo, Options, Store } from 'express-rate-limit'
import type { Clock } from '#server/adapters/clock'
import type { Db } from '#server/db/knex'
import { RATE_LIMITS } from '#server/db/tables/rate-limits'

/** Counts tries in PostgreSQL, so that every process counts the same tries. */
export class RateLimitStore implements Store {
  private windowMs = 0

  constructor(
    private readonly db: Db,
    private readonly clock: Clock,
    /** Keeps the keys of one limit apart from those of another. */
    readonly prefix: string,
  ) {}

  init(options: Options): void {
    this.windowMs = options.windowMs
  }

  async increment(key: string): Promise<ClientRateLimitInfo> {
    const now = this.clock.now()
    const resetTime = new Date(now.getTime() + this.windowMs)
    const [row] = await this.db(RATE_LIMITS)
      .insert({ key: this.prefix + key, hits: 1, resets_at: resetTime })
      .onConflict('key')
      .merge({
        hits: this.db.raw(
          'case when rate_limits.resets_at <= ? then 1 else rate_limits.hits + 1 end',
          [now],
        ),
        resets_at: this.db.raw(
          'case when rate_limits.resets_at <= ? then excluded.resets_at else rate_limits.resets_at end',
          [now],
        ),
      })
      .returning(['hits', 'resets_at'])
    if (!row) throw new Error('The rate limit was not counted.')
    return { totalHits: row.hits, resetTime: row.resets_at }
  }

  async decrement(key: string): Promise<void> {
    await this.db(RATE_LIMITS)
      .where({ key: this.prefix + key })
      .where('hits', '>', 0)
      .decrement('hits', 1)
  }

  async resetKey(key: string): Promise<void> {
    await this.db(RATE_LIMITS)
      .where({ key: this.prefix + key })
      .delete()
  }
}
