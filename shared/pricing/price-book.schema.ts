import { z } from 'zod'

/** Whole cents. */
export const centsSchema = z.int('Prices are whole cents.').min(0, 'A price is not negative.')

/** A price as a person types it. */
const rateSchema = centsSchema.max(1_000_000, 'No rate of trim is over $10,000.')

/** What a foot of a piece costs whose girth is at most `upTo` inches. */
export const girthRateSchema = z.strictObject({
  upTo: z.number().positive('Enter the girth.').max(120),
  centsPerFoot: rateSchema,
})

/** The rates of one stock, from the narrowest girth to the widest. */
export const stockRatesSchema = z
  .strictObject({
    stockId: z.uuid(),
    rates: z.array(girthRateSchema).min(1, 'A stock needs at least one rate.').max(40),
  })
  .refine(({ rates }) => rates.every((rate, index) => rate.upTo > (rates[index - 1]?.upTo ?? 0)), {
    path: ['rates'],
    error: 'Girths must rise from one rate to the next.',
  })

/** What the shop charges. Money is integer cents of one currency. */
export const priceBookSchema = z.strictObject({
  currency: z.literal('USD'),
  stocks: z.array(stockRatesSchema).max(500),
  /** A piece each. */
  perBend: rateSchema,
  perHem: rateSchema,
  /** An end that is mitered, lapped or tabbed, a piece each. */
  perDressedEnd: rateSchema,
  /** Once a line. */
  setUp: rateSchema,
  /** The least that a line costs. */
  minimum: rateSchema,
})

/** One line of a breakdown: so many at so much. */
const chargeSchema = z.strictObject({
  count: z.int().nonnegative(),
  centsEach: centsSchema,
  cents: centsSchema,
})

/** The price of an order line, item by item. `cents` is the sum of all that stands above it. */
export const linePriceSchema = z.strictObject({
  currency: z.literal('USD'),
  quantity: z.int().positive(),
  /** A piece: feet at the rate of its girth. */
  metal: z.strictObject({
    girth: z.number(),
    /** The bracket that the girth falls into. */
    upTo: z.number(),
    feet: z.number(),
    centsPerFoot: centsSchema,
    cents: centsSchema,
  }),
  bends: chargeSchema,
  hems: chargeSchema,
  ends: chargeSchema,
  /** Metal, bends, hems and ends of one piece. */
  pieceCents: centsSchema,
  /** All pieces. */
  piecesCents: centsSchema,
  setUpCents: centsSchema,
  /** What is added so that the line comes to the minimum; 0 where it does by itself. */
  toMinimumCents: centsSchema,
  cents: centsSchema,
})

export type GirthRate = z.infer<typeof girthRateSchema>
export type PriceBook = z.infer<typeof priceBookSchema>
export type LinePrice = z.infer<typeof linePriceSchema>
