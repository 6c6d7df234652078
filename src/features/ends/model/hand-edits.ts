import type { Side } from '#shared/ends/end.schema'
import type { DraftHands } from './draft-end'
import { otherSide } from './end-edits'

/** What of an order line its hands are about. */
export interface Handed {
  readonly quantity: number | null
  readonly hands: DraftHands | null
}

export const HAND_CHOICES = ['none', 'left', 'right', 'pair'] as const
export type HandChoice = (typeof HAND_CHOICES)[number]

/** A count of 0 on one side is a line of the other hand alone. */
export function handChoice(hands: DraftHands | null): HandChoice {
  if (hands === null) return 'none'
  if (hands.right === 0) return 'left'
  return hands.left === 0 ? 'right' : 'pair'
}

const sum = ({ left, right }: DraftHands): number | null =>
  left === null || right === null ? null : left + right

/** The pieces keep their number where they can; a pair has at least one of each hand. */
export function withHandChoice({ quantity, hands }: Handed, choice: HandChoice): Handed {
  const drawn = hands?.drawn ?? (choice === 'right' ? 'right' : 'left')
  switch (choice) {
    case 'none':
      return { quantity, hands: null }
    case 'left':
      return { quantity, hands: { drawn, left: quantity, right: 0 } }
    case 'right':
      return { quantity, hands: { drawn, left: 0, right: quantity } }
    case 'pair': {
      const all = Math.max(2, quantity ?? 2)
      const pair = { drawn, left: Math.ceil(all / 2), right: Math.floor(all / 2) }
      return { quantity: all, hands: pair }
    }
  }
}

/**
 * How many pieces of one hand of a pair; the quantity follows. None at all is a count still to be
 * typed: a line of one hand alone is chosen as that.
 */
export function withHandCount(hands: DraftHands, hand: Side, count: number | null): Handed {
  const next = { ...hands, [hand]: count === 0 ? null : count }
  return { quantity: sum(next), hands: next }
}

/** The quantity of a line without hands or of one hand alone; its hand follows. */
export function withQuantity({ hands }: Handed, quantity: number | null): Handed {
  const choice = handChoice(hands)
  if (hands === null || choice === 'none' || choice === 'pair') return { quantity, hands }
  return { quantity, hands: { ...hands, [choice]: quantity } }
}

/** Which hand the figure shows beside the drawn one; null where there is none to be made. */
export function otherHand(hands: DraftHands | null): Side | null {
  if (hands === null) return null
  const other = otherSide(hands.drawn)
  return hands[other] === 0 ? null : other
}
