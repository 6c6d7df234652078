import type { Clock } from '#server/adapters/clock'
import type { Db } from '#server/db/knex'
import { PLAN_CACHE } from '#server/db/tables/plan-cache'
import { planSchema, type Plan } from '#shared/bend-plan/plan.schema'

const DAY = 24 * 60 * 60 * 1000

export interface PlanCacheDeps {
  /** The pool: never a transaction of somebody else. */
  readonly db: Db
  readonly clock: Clock
  readonly onError: (message: string, error: unknown) => void
}

/** Plans that any process made, by their keys. */
export const createPlanCache = ({ db, clock, onError }: PlanCacheDeps) => ({
  /** Those of the keys that are kept; what is kept but no plan of today is dropped and logged. */
  async findPlans(keys: readonly string[]): Promise<Map<string, Plan>> {
    const found = new Map<string, Plan>()
    if (keys.length === 0) return found
    const rows = await db(PLAN_CACHE).whereIn('hash', keys).select('hash', 'plan', 'used_at')
    const yesterday = new Date(clock.now().getTime() - DAY)
    const unreadable: string[] = []
    const unused: string[] = []
    for (const { hash, plan, used_at: usedAt } of rows) {
      const parsed = planSchema.safeParse(plan)
      if (parsed.success) {
        found.set(hash, parsed.data)
        if (usedAt < yesterday) unused.push(hash)
      } else {
        unreadable.push(hash)
        onError('a kept plan cannot be read and is made anew', parsed.error)
      }
    }
    if (unreadable.length > 0) await db(PLAN_CACHE).whereIn('hash', unreadable).delete()
    if (unused.length > 0) {
      await db(PLAN_CACHE).whereIn('hash', unused).update({ used_at: clock.now() })
    }
    return found
  },

  /** A twin that another process kept meanwhile is the same plan. */
  async keepPlan(key: string, plan: Plan): Promise<void> {
    const now = clock.now()
    await db(PLAN_CACHE)
      .insert({ hash: key, plan: JSON.stringify(plan), made_at: now, used_at: now })
      .onConflict('hash')
      .ignore()
  },
})

export type PlanCache = ReturnType<typeof createPlanCache>
