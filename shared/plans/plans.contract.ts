import { z } from 'zod'
import { planSchema } from '#shared/bend-plan/plan.schema'
import { endpoint } from '#shared/http/endpoint'
import { profileSchema } from '#shared/profile/profile.schema'
import { stripSchema } from '#shared/strip/strip.schema'

/** The longest piece anyone may ask about; the brakes' own lengths are checked by the planner. */
export const pieceLengthSchema = z
  .number()
  .positive('A piece needs a length.')
  .max(600, 'No piece is longer than 50 ft (600 in.).')

export const brakePlanSchema = z.strictObject({
  brakeId: z.uuid(),
  brakeName: z.string(),
  plan: planSchema,
})

export const planDrawing = endpoint({
  method: 'POST',
  path: '/plans',
  permission: 'plans.make',
  summary: 'Strip and bend plans of a drawing that need not be saved, for every brake of the shop.',
  changes: false,
  body: z.strictObject({
    profile: profileSchema,
    stockId: z.uuid(),
    pieceLength: pieceLengthSchema,
    /** Names this request in the live events that tell how far it is; absent: none are sent. */
    progressKey: z.string().min(1).max(80).optional(),
  }),
  answer: z.strictObject({
    strip: stripSchema,
    /** Pounds of one piece. */
    weight: z.number(),
    brakes: z.array(brakePlanSchema),
  }),
})

export type BrakePlan = z.infer<typeof brakePlanSchema>
