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
  'mails',
] as const
export const liveTopicSchema = z.enum(LIVE_TOPICS)

/** One change, as sent on GET /api/live (server-sent events, `id:` is the event's number). */
export const liveEventSchema = z.strictObject({
  topic: liveTopicSchema,
  /** The thing changed, where one thing changed. */
  entityId: z.string().nullable(),
})

/**
 * How far a plan that takes long has come, sent on GET /api/live as an event named `plan`, without
 * `id:`, to the person who asked alone: first after half a second, then every half second. Nothing is
 * sent for quick plans, nothing says the end (the answer does), and nothing is kept for who is away.
 */
export const livePlanSchema = z.strictObject({
  /** The `progressKey` of the request. */
  key: z.string(),
  /** Folds looked at so far, over all brakes. */
  nodes: z.int(),
  /** Milliseconds since the request came in. */
  elapsed: z.int(),
})

export type LivePlan = z.infer<typeof livePlanSchema>
export type LiveTopic = z.infer<typeof liveTopicSchema>
export type LiveEvent = z.infer<typeof liveEventSchema>
