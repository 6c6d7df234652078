import { z } from 'zod'
import { hemSchema } from '#shared/profile/profile.schema'

/** The edits of a profile that a cure may ask for; each is a `ProfileEdit` as it stands. */
export const cureEditSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('setLeg'), leg: z.int().positive(), length: z.number() }),
  z.strictObject({ kind: z.literal('setTurn'), bend: z.int().positive(), turn: z.number() }),
  z.strictObject({
    kind: z.literal('setHem'),
    edge: z.enum(['A', 'B']),
    hem: hemSchema.nullable(),
  }),
])

export type CureEdit = z.infer<typeof cureEditSchema>
