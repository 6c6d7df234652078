import { describe, expect, it } from 'vitest'
import { keptQuote, quoteLine } from '#shared/pricing/line-quote'
import type { PriceBook } from '#shared/pricing/price-book.schema'
import { profileOf } from '../../support/arbitrary-profile'

const STOCK = '00000000-0000-4000-8000-000000000001'
const book: PriceBook = {
  currency: 'USD',
  stocks: [{ stockId: STOCK, rates: [{ upTo: 12, centsPerFoot: 300 }] }],
  perBend: 10,
  perHem: 20,
  perDressedEnd: 100,
  setUp: 500,
  minimum: 0,
}
const line = (legs: readonly number[]) => ({
  profile: profileOf([...legs], [90]),
  stockId: STOCK,
  quantity: 2,
  length: 120,
  ends: null,
})

describe('a quote', () => {
  it('is a price, or why there is none', () => {
    // 10 ft at $3 and a bend, twice, and the set-up.
    expect(quoteLine(line([4, 2]), book)).toMatchObject({ price: { cents: 6520 }, noPrice: null })
    expect(quoteLine(line([9, 5]), book)).toEqual({
      price: null,
      noPrice: { code: 'girthNotPriced', widest: 12 },
    })
    expect(quoteLine({ ...line([4, 2]), stockId: STOCK.replace('1', '2') }, book)).toMatchObject({
      noPrice: { code: 'stockNotPriced' },
    })
    expect(quoteLine(line([4, 2]), null)).toMatchObject({ noPrice: { code: 'noBook' } })
  })

  it('that was kept stays as it is; a line that kept nothing says so', () => {
    for (const quote of [quoteLine(line([4, 2]), book), quoteLine(line([9, 5]), book)]) {
      expect(keptQuote(quote)).toEqual(quote)
    }
    expect(keptQuote({ price: null, noPrice: null })).toEqual({
      price: null,
      noPrice: { code: 'notKept', widest: null },
    })
  })
})
