import { z } from 'zod'

const point = z.tuple([z.number(), z.number()])

/**
 * The workpiece where it first meets something, as the bender sees it from the end: inches, the bend
 * line at the origin, x to the front, y up; a down fold's front truly swings down. Centre line; a
 * closed hem that is made counts as flat sheet and is not drawn.
 */
export const contactSchema = z.strictObject({
  direction: z.enum(['up', 'down']),
  leftUp: z.boolean(),
  aBack: z.boolean(),
  /** From the bend line to the back. */
  rear: z.array(point),
  /** From the bend line to the front, swung to the first contact. */
  front: z.array(point),
  /** Degrees the front has swung; 0 where the clamped sheet is in the way at once. */
  swung: z.number(),
  /** The place on the sheet's centre line that meets, one clearance away from what it meets. */
  at: point,
  /** For `apronMeetsRear` the apron has swung with the front; for all else it rests. */
  against: z.enum(['inner', 'outer', 'apron', 'piece']),
})

export type Contact = z.infer<typeof contactSchema>
