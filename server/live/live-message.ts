import { z } from 'zod'
import { liveEventSchema } from '#shared/live/live'

/** The channel of NOTIFY. */
export const LIVE_CHANNEL = 'live'

/** One row of live_events on its way to the streams. */
export const liveMessageSchema = liveEventSchema.extend({
  id: z.int(),
  companyId: z.uuid().nullable(),
  audience: z.enum(['shop', 'company', 'all']),
})

export type LiveMessage = z.infer<typeof liveMessageSchema>
