import { z } from 'zod'

const inches = z.number().positive().max(12_000)

/** What a line on the roof asks for. Inches; `rise` in 12. */
export const roofLineSchema = z
  .strictObject({
    /** The length on the roof that trim must cover, overhang included. */
    length: inches.optional(),
    /** Or the level run that a rake covers, and the roof's rise in 12. */
    planRun: inches.optional(),
    rise: z.number().min(0).max(36).optional(),
    /** The longest piece: the least of what brake, stock and truck take. */
    pieceLength: inches,
    lap: z.number().min(0).max(24),
    mode: z.enum(['full', 'equal']),
    /** No piece is shorter, unless the line itself is. */
    minimum: z.number().min(0).max(240).default(24),
    /** What tabs and miter points add to the line at either end. */
    leftExtra: z.number().min(0).max(60).default(0),
    rightExtra: z.number().min(0).max(60).default(0),
  })
  .refine(
    ({ length, planRun, rise }) =>
      (length === undefined) !== (planRun === undefined) &&
      (planRun === undefined) === (rise === undefined),
    { error: 'Give the length, or the plan run with the rise.', path: ['length'] },
  )

export type RoofLine = z.output<typeof roofLineSchema>
export type RoofLineInput = z.input<typeof roofLineSchema>
