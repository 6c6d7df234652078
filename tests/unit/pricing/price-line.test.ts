import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { End } from '#shared/ends/end.schema'
import type { LinePrice, PriceBook } from '#shared/pricing/price-book.schema'
import { linePriceSchema, priceBookSchema } from '#shared/pricing/price-book.schema'
import { priceLine, sumPrices } from '#shared/pricing/price-line'
import type { Profile } from '#shared/profile/profile.schema'
import { profileArbitrary, profileOf } from '../../support/arbitrary-profile'

const STOCK = '00000000-0000-4000-8000-000000000001'
const OTHER = '00000000-0000-4000-8000-000000000002'

const book: PriceBook = {
  currency: 'USD',
  stocks: [
    {
      stockId: STOCK,
      rates: [
        { upTo: 6, centsPerFoot: 210 },
        { upTo: 12, centsPerFoot: 335 },
        { upTo: 24, centsPerFoot: 610 },
      ],
    },
  ],
  perBend: 35,
  perHem: 60,
  perDressedEnd: 450,
  setUp: 1500,
  minimum: 4000,
}

const line = (profile: Profile, quantity: number, length: number) => ({
  profile,
  stockId: STOCK,
  quantity,
  length,
  ends: null,
})

const priceOf = (result: ReturnType<typeof priceLine>): LinePrice => {
  if (!result.ok) throw new Error(`No price: ${result.code}`)
  return result.price
}

const square: End = { kind: 'square', tabs: [] }

describe('the price of a line', () => {
  it('is metal by girth and feet, bends, hems and ends a piece, and one set-up', () => {
    const gable: Profile = {
      ...profileOf([4, 4, 0.75], [-90, 45]),
      hemB: { style: 'closed', length: 0.5, turn: -1 },
    }
    const ends = { left: square, right: { ...square, tabs: [{ leg: 1, length: 1 }] }, lowEnd: null }
    // Girth 9 1/4: the bracket to 12. 10 ft 6 in. at 3.35 are 35.175, rounded up to 35.18.
    expect(priceOf(priceLine({ ...line(gable, 4, 126), ends }, book))).toMatchObject({
      metal: { girth: 9.25, upTo: 12, feet: 10.5, centsPerFoot: 335, cents: 3518 },
      bends: { count: 2, centsEach: 35, cents: 70 },
      hems: { count: 1, centsEach: 60, cents: 60 },
      ends: { count: 1, centsEach: 450, cents: 450 },
      pieceCents: 4098,
      piecesCents: 16_392,
      setUpCents: 1500,
      toMinimumCents: 0,
      cents: 17_892,
    })
  })

  it('comes to the minimum, and says what was added', () => {
    const price = priceOf(priceLine(line(profileOf([2, 1], [90]), 1, 24), book))
    expect(price).toMatchObject({ pieceCents: 455, toMinimumCents: 2045, cents: 4000 })
  })

  it('takes a girth on the border into the narrower bracket', () => {
    expect(priceOf(priceLine(line(profileOf([5, 1], [90]), 1, 120), book)).metal.upTo).toBe(6)
    expect(priceOf(priceLine(line(profileOf([5, 1.125], [90]), 1, 120), book)).metal.upTo).toBe(12)
  })

  it('is refused where the book has no rate, with the widest it has', () => {
    expect(priceLine(line(profileOf([20, 8], [90]), 1, 120), book)).toEqual({
      ok: false,
      code: 'girthNotPriced',
      widest: 24,
    })
    expect(priceLine({ ...line(profileOf([2], []), 1, 120), stockId: OTHER }, book)).toEqual({
      ok: false,
      code: 'stockNotPriced',
      widest: null,
    })
  })
})

describe('every price', () => {
  const cents = fc.integer({ min: 0, max: 5000 })
  const arbitraryBook = fc
    .record({
      perBend: cents,
      perHem: cents,
      perDressedEnd: cents,
      setUp: cents,
      minimum: cents,
      rate: cents,
    })
    .map(({ rate, ...rates }): PriceBook => ({
      currency: 'USD',
      stocks: [{ stockId: STOCK, rates: [{ upTo: 120, centsPerFoot: rate }] }],
      ...rates,
    }))
  const arbitraryLine = fc.record({
    profile: profileArbitrary,
    quantity: fc.integer({ min: 1, max: 500 }),
    length: fc.integer({ min: 1, max: 9600 }).map((sixteenths) => sixteenths / 16),
  })

  it('is whole cents, and the sum of what stands above it', () => {
    fc.assert(
      fc.property(arbitraryBook, arbitraryLine, (rates, { profile, quantity, length }) => {
        const price = priceOf(priceLine(line(profile, quantity, length), rates))
        expect(linePriceSchema.safeParse(price).success).toBe(true)
        const { metal, bends, hems, ends, pieceCents, piecesCents } = price
        expect(pieceCents).toBe(metal.cents + bends.cents + hems.cents + ends.cents)
        expect(piecesCents).toBe(pieceCents * quantity)
        expect(price.cents).toBe(piecesCents + price.setUpCents + price.toMinimumCents)
        expect(price.cents).toBeGreaterThanOrEqual(rates.minimum)
        expect(Math.abs(metal.cents - metal.feet * metal.centsPerFoot)).toBeLessThanOrEqual(0.5)
      }),
    )
  })

  it('never falls when pieces are added or grow longer', () => {
    fc.assert(
      fc.property(arbitraryBook, arbitraryLine, (rates, { profile, quantity, length }) => {
        const at = (pieces: number, inches: number) =>
          priceOf(priceLine(line(profile, pieces, inches), rates)).cents
        expect(at(quantity + 1, length)).toBeGreaterThanOrEqual(at(quantity, length))
        expect(at(quantity, length + 1)).toBeGreaterThanOrEqual(at(quantity, length))
      }),
    )
  })
})

describe('the sum of an order', () => {
  it('is that of its lines, and unknown as soon as one is', () => {
    const price = priceOf(priceLine(line(profileOf([5, 1], [90]), 3, 120), book))
    expect(sumPrices([price, price])).toBe(2 * price.cents)
    expect(sumPrices([])).toBe(0)
    expect(sumPrices([price, null])).toBeNull()
  })
})

describe('a price book', () => {
  it('lists its girths rising', () => {
    const falling = [
      { upTo: 12, centsPerFoot: 300 },
      { upTo: 6, centsPerFoot: 200 },
    ]
    const parsed = priceBookSchema.safeParse({
      ...book,
      stocks: [{ stockId: STOCK, rates: falling }],
    })
    expect(parsed.error?.issues[0]?.path).toEqual(['stocks', 0, 'rates'])
  })

  it('takes whole cents alone', () => {
    expect(priceBookSchema.safeParse({ ...book, perBend: 3.5 }).success).toBe(false)
    expect(priceBookSchema.safeParse({ ...book, perBend: -1 }).success).toBe(false)
  })
})
