import { calibrationSchema, kSourceSchema, stockSchema } from '#shared/stock/stock.schema'
import { z } from 'zod'

/**
 * A stock as it was written down when something was made of it. What was frozen before the source
 * of K was known has the shop's own K, and nobody had measured it.
 */
export const frozenStockSchema = stockSchema.extend({
  kSource: kSourceSchema.default('shop'),
  paintTBend: stockSchema.shape.paintTBend.default(null),
  alloy: stockSchema.shape.alloy.default(null),
  calibrations: z.array(calibrationSchema).default([]),
})
