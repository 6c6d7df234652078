import { z } from 'zod'
import { momentSchema, textField } from '#shared/http/fields'

/**
 * A line released on a brake although no order of single folds works there under the checks made: a
 * bender may know a two-stage way. Its bend card has no steps.
 */
export const overrideSchema = z.strictObject({
  /** Who answers for it. */
  by: z.string(),
  at: momentSchema,
  reason: z.string(),
})

export const overrideInputSchema = z.strictObject({
  lineId: z.uuid(),
  brakeId: z.uuid(),
  reason: textField(400),
})

export type Override = z.infer<typeof overrideSchema>
export type OverrideInput = z.infer<typeof overrideInputSchema>
