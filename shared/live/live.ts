import { z } from 'zod'

/** What a change concerns; the client invalidates the queries that begin with these words. */
export const LIVE_TOPICS = [
  'jobs',
  'shelf',
  'orders',
  'pieces',
  'runs',
  'rack',
  'stocks',
  'brakes',
  'people',
] as const
export const liveTopicSchema = z.enum(LIVE_TOPICS)

/** One change, as sent on GET /api/live (server-sent events, `id:` is the event's number). */
export const liveEventSchema = z.strictObject({
  topic: liveTopicSchema,
  /** The thing changed, where one thing changed. */
  entityId: z.string().nullable(),
})

export type LiveTopic = z.infer<typeof liveTopicSchema>
export type LiveEvent = z.infer<typeof liveEventSchema>
