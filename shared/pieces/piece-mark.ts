import type { Side } from '#shared/ends/end.schema'

/** The hand as it stands on label, card and sheet, in every language. */
export const HAND_LETTERS: Readonly<Record<Side, 'L' | 'R'>> = { left: 'L', right: 'R' }

/**
 * A piece as the floor calls it: the crew's mark, its number in the line and its hand, `A-3` or
 * `A-3 L`; never `P11` for P1's first.
 */
export const pieceMark = ({
  mark,
  sequence,
  hand,
}: {
  readonly mark: string
  readonly sequence: number
  readonly hand: Side | null
}): string => `${mark}-${sequence}${hand === null ? '' : ` ${HAND_LETTERS[hand]}`}`
