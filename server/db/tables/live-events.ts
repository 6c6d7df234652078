import type { LiveTopic } from '#shared/live/live'

export const LIVE_EVENTS = 'live_events'

export interface LiveEventRow {
  id: number
  topic: LiveTopic
  entity_id: string | null
  company_id: string | null
  audience: 'shop' | 'company' | 'all'
  at: Date
}
export type LiveEventInsert = Pick<LiveEventRow, 'topic' | 'entity_id' | 'company_id' | 'audience'>
