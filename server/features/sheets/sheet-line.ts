import { invalidField, profileProblem } from '#server/http/errors'
import { endErrors } from '#server/features/orders/line-strip'
import type { StripLayout } from '#shared/ends/end-layout'
import type { Hands, PieceEnds, Side } from '#shared/ends/end.schema'
import { endsOfHand } from '#shared/ends/hands'
import { layStrip } from '#shared/ends/lay-strip'
import { SQUARE_ENDS } from '#shared/ends/strip-borders'
import type { Profile } from '#shared/profile/profile.schema'
import type { Stock } from '#shared/stock/stock.schema'
import type { Strip } from '#shared/strip/strip.schema'
import type { Inches, Pounds } from '#shared/units/brands'

/** A line of an order as its sheets need it: frozen once it is released, the kernel's before. */
export interface SheetLine {
  readonly mark: string
  readonly name: string
  readonly profile: Profile
  readonly stock: Stock
  readonly strip: Strip
  readonly length: Inches
  readonly quantity: number
  readonly ends: PieceEnds | null
  readonly hands: Hands | null
  readonly statedGirth: Inches | null
  /** Of one piece as it is sheared. */
  readonly pieceWeight: Pounds
  /** Null before release. */
  readonly brakeName: string | null
  readonly orderNumber: number
  readonly poNumber: string
  readonly company: string
  readonly job: string
}

/** A piece of a line by its hand, laid out flat. */
export interface SheetPiece {
  readonly line: SheetLine
  readonly hand: Side | null
  readonly ends: PieceEnds
  readonly layout: StripLayout
}

/**
 * The piece of a line that is meant: of the hand asked for, else as it was drawn.
 *
 * @throws invalid-input for a hand that the line has no pieces of
 * @throws profile-problem naming the ends that cannot be cut
 */
export function sheetPiece(line: SheetLine, asked: Side | undefined): SheetPiece {
  const hand = handMeant(line.hands, asked)
  const { profile, stock, length } = line
  const ends = endsOfHand(line.ends, line.hands, hand)
  const laid = layStrip({ profile, sheet: stock.sheet, pieceLength: length, ends })
  if (!laid.ok) throw profileProblem(endErrors({ profile, length, ends }, stock.sheet, 'line'))
  return { line, hand, ends: ends ?? SQUARE_ENDS, layout: laid.layout }
}

function handMeant(hands: Hands | null, asked: Side | undefined): Side | null {
  if (hands === null) {
    if (asked === undefined) return null
    throw invalidField('hand', 'The pieces of this line have no hand. Leave it out.')
  }
  if (asked === undefined) return hands.drawn
  if (hands[asked] > 0) return asked
  throw invalidField('hand', `This line has no ${asked} pieces. Ask for the other hand.`)
}

/** Whether there is more to an end than a square cut. */
export const isDressed = (ends: PieceEnds, side: Side): boolean => {
  const end = ends[side]
  return end.kind !== 'square' || end.tabs.length > 0
}
