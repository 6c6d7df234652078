import type { PieceEnds } from '#shared/ends/end.schema'
import { isAtMost } from '#shared/geometry/tolerance'
import type { LinePrice, PriceBook } from '#shared/pricing/price-book.schema'
import type { Profile } from '#shared/profile/profile.schema'
import { girthOf } from '#shared/strip/flat-strip'
import type { Cents, Inches } from '#shared/units/brands'
import { INCHES_PER_FOOT } from '#shared/units/length-units'

export interface LineToPrice {
  readonly profile: Profile
  readonly stockId: string
  readonly quantity: number
  /** Of one piece; tabs are not charged as metal. */
  readonly length: Inches
  readonly ends: PieceEnds | null
}

export type PriceResult =
  | { readonly ok: true; readonly price: LinePrice }
  | {
      readonly ok: false
      /** The book has no rates of the stock, or none for a girth this wide. */
      readonly code: 'stockNotPriced' | 'girthNotPriced'
      /** The widest girth the book has a rate for; null where it has none at all. */
      readonly widest: Inches | null
    }

const isDressed = (end: PieceEnds['left']): boolean => end.kind !== 'square' || end.tabs.length > 0

const charge = (count: number, centsEach: Cents) => ({ count, centsEach, cents: count * centsEach })

/**
 * The price of an order line in integer cents: feet of a piece at the rate of its nominal girth, so
 * much a bend, a hem and a dressed end, times the quantity, one set-up a line, and at least the
 * minimum. The metal of one piece is rounded to the whole cent (half up) before it is multiplied, so
 * that every figure shown adds up; nothing else is ever rounded. A girth on a bracket's border
 * belongs to it.
 */
export const priceLine = (line: LineToPrice, book: PriceBook): PriceResult => {
  const rates = book.stocks.find(({ stockId }) => stockId === line.stockId)?.rates
  if (rates === undefined) return { ok: false, code: 'stockNotPriced', widest: null }
  const girth = girthOf(line.profile)
  const rate = rates.find(({ upTo }) => isAtMost(girth, upTo))
  if (rate === undefined) {
    return { ok: false, code: 'girthNotPriced', widest: rates.at(-1)?.upTo ?? null }
  }
  const feet = line.length / INCHES_PER_FOOT
  const metal = Math.round(feet * rate.centsPerFoot)
  const { hemA, hemB, bends } = line.profile
  const bendCharge = charge(bends.length, book.perBend)
  const hemCharge = charge([hemA, hemB].filter((hem) => hem !== null).length, book.perHem)
  const dressed = line.ends ? [line.ends.left, line.ends.right].filter(isDressed).length : 0
  const endCharge = charge(dressed, book.perDressedEnd)
  const pieceCents = metal + bendCharge.cents + hemCharge.cents + endCharge.cents
  const piecesCents = pieceCents * line.quantity
  const toMinimumCents = Math.max(0, book.minimum - piecesCents - book.setUp)
  return {
    ok: true,
    price: {
      currency: book.currency,
      quantity: line.quantity,
      metal: { girth, upTo: rate.upTo, feet, centsPerFoot: rate.centsPerFoot, cents: metal },
      bends: bendCharge,
      hems: hemCharge,
      ends: endCharge,
      pieceCents,
      piecesCents,
      setUpCents: book.setUp,
      toMinimumCents,
      cents: piecesCents + book.setUp + toMinimumCents,
    },
  }
}

/** What an order comes to; null as soon as one line has no price. */
export const sumPrices = (prices: readonly (LinePrice | null)[]): Cents | null =>
  prices.reduce<Cents | null>(
    (sum, price) => (sum === null || price === null ? null : sum + price.cents),
    0,
  )
