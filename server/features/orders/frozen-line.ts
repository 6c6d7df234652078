import { z } from 'zod'
import { frozenStockSchema } from '#server/features/stocks/frozen-stock'
import { planSchema } from '#shared/bend-plan/plan.schema'
import { handsSchema, pieceEndsSchema } from '#shared/ends/end.schema'
import { overrideSchema } from '#shared/orders/override.schema'
import { lineQuoteSchema } from '#shared/pricing/line-quote'
import { stripSchema } from '#shared/strip/strip.schema'

/**
 * What a line's pieces are made by, written into `order_lines.frozen` when the order is released.
 * A later change of stock, brake or kernel does not reach them.
 */
export const frozenLineSchema = z.strictObject({
  stock: frozenStockSchema,
  strip: stripSchema,
  /** Pounds. */
  pieceWeight: z.number(),
  brakeId: z.uuid(),
  brakeName: z.string(),
  /** The plan of the run that the line's pieces belong to. */
  plan: planSchema,
  kernelVersion: z.int(),
  /** Lines released before overrides were known have none. */
  override: overrideSchema.nullable().default(null),
  /** Lines released before ends were known have square ones. */
  ends: pieceEndsSchema.nullable().default(null),
  hands: handsSchema.nullable().default(null),
  /** Lines released before prices were kept have neither a price nor why not. */
  price: lineQuoteSchema.shape.price.default(null),
  noPrice: lineQuoteSchema.shape.noPrice.default(null),
})

export type FrozenLine = z.infer<typeof frozenLineSchema>
