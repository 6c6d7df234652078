import { layStrip } from '#shared/ends/lay-strip'
import type { LaidStrip } from '#shared/ends/lay-strip'
import type { Hands, PieceEnds, Side } from '#shared/ends/end.schema'
import { endsOfHand } from '#shared/ends/hands'
import type { OrderLine } from '#shared/orders/order.schema'
import type { Profile } from '#shared/profile/profile.schema'
import type { Run, RunLine } from '#shared/runs/runs.contract'
import type { Stock } from '#shared/stock/stock.schema'
import type { Strip } from '#shared/strip/strip.schema'
import { pieceWeight } from '#shared/strip/weight'
import type { Inches, Pounds } from '#shared/units/brands'

/** A line as its strip sheet shows it, whether it is read from an order or from a run. */
export interface SheetLine {
  readonly id: string
  readonly mark: string
  readonly name: string
  readonly profile: Profile
  readonly stock: Stock
  readonly strip: Strip
  readonly length: Inches
  readonly quantity: number
  readonly ends: PieceEnds | null
  readonly hands: Hands | null
}

export const sheetOfOrderLine = (line: OrderLine): SheetLine => line

export const sheetOfRunLine = (run: Run, line: RunLine): SheetLine => ({
  ...line,
  profile: run.profile,
  stock: run.stock,
  strip: run.strip,
})

/** The hands that a line really has pieces of; none where they have no hand. */
export const handsMade = (hands: Hands | null): readonly Side[] =>
  hands === null ? [] : (['left', 'right'] as const).filter((hand) => hands[hand] > 0)

/** How many pieces of a hand there are; all of them where there are no hands. */
export const countOf = ({ hands, quantity }: SheetLine, hand: Side | null): number =>
  hands === null || hand === null ? quantity : hands[hand]

export interface DressedPiece {
  readonly ends: PieceEnds | null
  readonly laid: LaidStrip
  /** Pounds of the strip as it is sheared, tabs included; null where it cannot be laid out. */
  readonly weight: Pounds | null
}

/** One piece of the line, by its hand. */
export const dressedPiece = (line: SheetLine, hand: Side | null): DressedPiece => {
  const ends = endsOfHand(line.ends, line.hands, hand)
  const { sheet } = line.stock
  const laid = layStrip({ profile: line.profile, sheet, pieceLength: line.length, ends })
  return {
    ends,
    laid,
    weight: laid.ok ? pieceWeight(line.strip, sheet, laid.layout.blankLength) : null,
  }
}
