export const PLAN_CACHE = 'plan_cache'

export interface PlanCacheRow {
  hash: string
  /** A Plan; parsed with planSchema when read. */
  plan: unknown
  made_at: Date
  used_at: Date
}
/** JSON columns are written as text. */
export type PlanCacheInsert = Omit<PlanCacheRow, 'plan'> & { plan: string }
export type PlanCacheUpdate = Pick<PlanCacheRow, 'used_at'>
