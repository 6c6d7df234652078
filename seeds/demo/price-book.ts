import type { PriceBook } from '#shared/pricing/price-book.schema'
import type { Metal } from '#shared/stock/stock.schema'
import { DEMO_STOCKS } from './stocks'

/** Girths at which the rate of a foot rises, inches. */
const GIRTHS = [4, 6, 8, 10, 12, 16, 20, 24, 30, 36, 48]

/** Cents a foot: so much for the work and so much for every inch of girth. All rates are invented. */
const RATES: Record<Metal, { readonly work: number; readonly inch: number }> = {
  steel: { work: 85, inch: 17 },
  aluminum: { work: 95, inch: 21 },
  stainless: { work: 150, inch: 46 },
  copper: { work: 220, inch: 88 },
  zinc: { work: 190, inch: 64 },
}

/** What the demo shop charges, for every stock it has. */
export const DEMO_PRICE_BOOK: PriceBook = {
  currency: 'USD',
  stocks: Object.values(DEMO_STOCKS).map(({ id, metal, widest_strip: widest }) => ({
    stockId: id,
    rates: GIRTHS.filter((upTo) => upTo <= widest).map((upTo) => ({
      upTo,
      centsPerFoot: RATES[metal].work + RATES[metal].inch * upTo,
    })),
  })),
  perBend: 30,
  perHem: 75,
  perDressedEnd: 425,
  setUp: 1200,
  minimum: 3500,
}
