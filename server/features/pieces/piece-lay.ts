import { z } from 'zod'
import { handsSchema, pieceEndsSchema, type Side } from '#shared/ends/end.schema'
import { endsOfHand, handOf } from '#shared/ends/hands'

/** Of a line's row what says how its pieces lie; the columns `ends` and `hands`. */
export const lineLaySchema = z.object({
  ends: pieceEndsSchema.nullable(),
  hands: handsSchema.nullable(),
})

export interface PieceLay {
  readonly hand: Side | null
  /** By the piece's own hand. */
  readonly lowEnd: Side | null
}

/** The hand of a piece by its number within the line, which its remake keeps, and its low end. */
export function pieceLay(
  { ends, hands }: z.infer<typeof lineLaySchema>,
  sequence: number,
): PieceLay {
  const hand = handOf(hands, sequence)
  return { hand, lowEnd: endsOfHand(ends, hands, hand)?.lowEnd ?? null }
}
