import { z } from 'zod'

const inches = z.number().positive().max(240)
const perLap = z.int().min(0).max(50)

/**
 * How a shop counts small goods, in inches unless said otherwise. Every default is common practice,
 * no source; a shop sets its own.
 */
export const goodsSettingsSchema = z.strictObject({
  /** Between two fasteners along the line. */
  fastenerSpacing: z.number().min(1).max(120).default(12),
  /** From the low or left end of the line to its first fastener. */
  fastenerStart: z.number().min(0).max(120).default(3),
  /** The most that the other end may stand past its last fastener. */
  fastenerEnd: z.number().min(0).max(120).default(3),
  /** Color-matched rivets through a lap, and through a tab. */
  rivetsPerLap: perLap.default(4),
  rivetsPerTab: perLap.default(2),
  /** Rows of butyl tape across the girth of a lap, and rows along the line. */
  tapeRowsPerLap: perLap.default(1),
  tapeRowsAlong: perLap.default(1),
  /** Beads of sealant across the girth of a lap, and of a tab. */
  beadsPerLap: perLap.default(1),
  beadsPerTab: perLap.default(1),
  /** Feet of bead that a tube gives. */
  beadFeetPerTube: z.number().positive().max(1000).default(24),
  /** What a panel covers: a closure goes under each. */
  panelModule: inches.default(36),
  /** Touch-up bottles for each painted color of an order. */
  bottlesPerColor: perLap.default(1),
})

export type GoodsSettings = z.output<typeof goodsSettingsSchema>

export const GOODS_DEFAULTS: GoodsSettings = goodsSettingsSchema.parse({})
