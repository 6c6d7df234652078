import { z } from 'zod'
import { endpoint } from '#shared/http/endpoint'
import { momentSchema } from '#shared/http/fields'
import { priceBookSchema } from '#shared/pricing/price-book.schema'

/** A version of the price book with who wrote it. */
export const priceBookVersionSchema = z.strictObject({
  id: z.int(),
  by: z.string(),
  at: momentSchema,
  book: priceBookSchema,
})

export const getPriceBook = endpoint({
  method: 'GET',
  path: '/price-book',
  permission: 'prices.read',
  summary: 'The price book that counts now; orders keep the price they were released at.',
  answer: z.strictObject({
    /** Null as long as the shop has none. */
    current: priceBookVersionSchema.nullable(),
  }),
})

export type PriceBookVersion = z.infer<typeof priceBookVersionSchema>
