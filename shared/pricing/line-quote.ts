import { z } from 'zod'
import { linePriceSchema, type PriceBook } from '#shared/pricing/price-book.schema'
import { priceLine, type LineToPrice } from '#shared/pricing/price-line'

/**
 * Why a line has no price: the shop has no book, the book has no rates of the stock or none for a
 * girth this wide, or the line was released before prices were kept.
 */
export const NO_PRICE_CODES = ['noBook', 'stockNotPriced', 'girthNotPriced', 'notKept'] as const

export const noPriceSchema = z.strictObject({
  code: z.enum(NO_PRICE_CODES),
  /** The widest girth the book has a rate for, inches; null but for `girthNotPriced`. */
  widest: z.number().nullable(),
})

/** What a line of an order costs, or why that is not known: one of the two is null. */
export const lineQuoteSchema = z.strictObject({
  price: linePriceSchema.nullable(),
  noPrice: noPriceSchema.nullable(),
})

export type NoPrice = z.infer<typeof noPriceSchema>
export type LineQuote = z.infer<typeof lineQuoteSchema>

const without = (code: NoPrice['code'], widest: number | null = null): LineQuote => ({
  price: null,
  noPrice: { code, widest },
})

/** A line by the book, or by none. */
export function quoteLine(line: LineToPrice, book: PriceBook | null): LineQuote {
  if (book === null) return without('noBook')
  const result = priceLine(line, book)
  return result.ok ? { price: result.price, noPrice: null } : without(result.code, result.widest)
}

/** What was kept of a released line; lines released before prices were kept have neither. */
export const keptQuote = ({ price, noPrice }: LineQuote): LineQuote =>
  price === null && noPrice === null ? without('notKept') : { price, noPrice }
