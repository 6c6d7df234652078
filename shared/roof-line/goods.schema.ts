import { z } from 'zod'

/** The small goods that go with trim. */
export const GOOD_KINDS = [
  'fasteners',
  'butylTape',
  'closures',
  'rivets',
  'sealant',
  'touchUpPaint',
] as const

/** What a good is counted in: pieces; feet of tape; tubes of sealant; bottles of paint. */
export const GOOD_UNITS = ['each', 'foot', 'tube', 'bottle'] as const

/** A line of small goods on an order; the color is that of a stock, where it must match. */
export const goodSchema = z.strictObject({
  kind: z.enum(GOOD_KINDS),
  quantity: z.int('Count whole units.').min(1, 'At least one.').max(100_000),
  unit: z.enum(GOOD_UNITS),
  stockId: z.uuid().nullable(),
  note: z.string().trim().max(200).default(''),
})

export type Good = z.output<typeof goodSchema>
export type GoodKind = (typeof GOOD_KINDS)[number]
export type GoodUnit = (typeof GOOD_UNITS)[number]
