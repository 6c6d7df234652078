export const RATE_LIMITS = 'rate_limits'

export interface RateLimitRow {
  key: string
  hits: number
  resets_at: Date
}
