import { z } from 'zod'
import { liveEventSchema, livePlanSchema } from '#shared/live/live'

/** The channel of NOTIFY. */
export const LIVE_CHANNEL = 'live'

/** One row of live_events on its way to the streams. */
export const liveMessageSchema = liveEventSchema.extend({
  id: z.int(),
  companyId: z.uuid().nullable(),
  audience: z.enum(['shop', 'company', 'all']),
})

/** For the streams of one person; kept nowhere. */
export const personalMessageSchema = z.strictObject({ personId: z.uuid(), plan: livePlanSchema })

/** What comes through the channel. */
export const channelMessageSchema = z.union([liveMessageSchema, personalMessageSchema])

export type PersonalMessage = z.infer<typeof personalMessageSchema>
export type LiveMessage = z.infer<typeof liveMessageSchema>
