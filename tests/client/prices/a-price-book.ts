import type { PriceBook } from '#shared/pricing/price-book.schema'
import { json } from '../../support/fake-api'
import { STOCK } from '../orders/draft-lines'

/** Girths to 9 in. at $3 a foot, to 12 in. at $4. */
export const BOOK: PriceBook = {
  currency: 'USD',
  stocks: [
    {
      stockId: STOCK.id,
      rates: [
        { upTo: 9, centsPerFoot: 300 },
        { upTo: 12, centsPerFoot: 400 },
      ],
    },
  ],
  perBend: 25,
  perHem: 50,
  perDressedEnd: 400,
  setUp: 1000,
  minimum: 2000,
}

/** The server's answer with this book; null: the shop has none. */
export const bookAnswer = (book: PriceBook | null = BOOK) => ({
  'GET /api/price-book': () =>
    json({
      current: book && { id: 1, by: 'Juno Marsh', at: '2026-03-01T09:00:00.000Z', book },
    }),
})
