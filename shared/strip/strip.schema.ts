import { z } from 'zod'

/** Which fold of the piece a crease belongs to: bend b1… counted from 1 at edge A, or a hem's fold. */
export const foldSchema = z.union([z.int().positive(), z.literal('hemA'), z.literal('hemB')])

/** One bend's zone on the strip; distances from edge A in inches. */
export const creaseSchema = z.strictObject({
  fold: foldSchema,
  /** The middle of the bend zone, where the line is drawn. */
  at: z.number(),
  from: z.number(),
  to: z.number(),
  /** Signed degrees as in the profile; a hem's fold is 180 in the direction of its lip. */
  turn: z.number(),
})

export const stripSchema = z.strictObject({
  /** Nominal sum of legs and hems: what is priced. */
  girth: z.number(),
  /** True flat width, not rounded: what is cut. */
  stripWidth: z.number(),
  creases: z.array(creaseSchema),
})

export type Fold = z.infer<typeof foldSchema>
export type Crease = z.infer<typeof creaseSchema>
export type Strip = z.infer<typeof stripSchema>
