import { isAtMost, TOLERANCE } from '#shared/geometry/tolerance'
import type { RoofLine } from '#shared/roof-line/roof-line.schema'
import type { RoofPieces } from '#shared/roof-line/roof-pieces'
import type { Inches } from '#shared/units/brands'
import type { DraftEnds } from '@/features/ends/model/draft-end'
import { BOTH_SQUARE, endsToKeep } from '@/features/ends/model/end-edits'
import { handChoice } from '@/features/ends/model/hand-edits'
import { nextMark, type DraftLine } from '@/features/orders/draft/order-draft'
import type { DraftRoofLine } from './draft-roof-line'
import { endsOfPiece, firstSide, type EndExtra } from './line-ends'

/** Pieces of a line that are alike. */
export interface PieceGroup {
  /** From tip to tip without tabs, as an order line has it. */
  readonly length: Inches
  readonly ends: DraftEnds
  readonly count: number
}

const SIXTEENTHS = 16

/**
 * An exact length as a tape shows it: counted up, so that the line stays covered, but down where
 * the piece with its tabs would be longer than the shop makes them.
 */
function cutLength(exact: Inches, tabs: Inches, longest: Inches): Inches {
  const up = Math.ceil((exact - tabs - TOLERANCE) * SIXTEENTHS) / SIXTEENTHS
  if (isAtMost(up + tabs, longest)) return up
  return tabs === 0 ? longest : Math.floor((longest - tabs + TOLERANCE) * SIXTEENTHS) / SIXTEENTHS
}

/** What the ends of the whole line add, at its low or left end and at the other. */
export interface OutsideExtras {
  readonly first: EndExtra
  readonly last: EndExtra
}

/**
 * The pieces of a line in the order of their first one, alike in length and ends together, in
 * lengths to 1/16 in.
 */
export function pieceGroups(
  { order }: RoofPieces,
  { pieceLength, lap }: RoofLine,
  outside: DraftEnds,
  extras: OutsideExtras,
  dressLaps: boolean,
): PieceGroup[] {
  const groups: { length: Inches; ends: DraftEnds; count: number; key: string }[] = []
  order.forEach((piece, index) => {
    const ends = endsOfPiece(outside, index, order.length, dressLaps ? lap : null)
    // A tab is metal beyond the tip, which an order line's length leaves out.
    const tabs =
      (index === 0 ? extras.first.tab : 0) + (index === order.length - 1 ? extras.last.tab : 0)
    const length = cutLength(piece.length, tabs, pieceLength)
    const key = JSON.stringify([length, ends])
    const known = groups.find((group) => group.key === key)
    if (known) known.count += 1
    else groups.push({ length, ends, count: 1, key })
  })
  return groups.map(({ length, ends, count }) => ({ length, ends, count }))
}

/** The lines that cover one line on the roof, in the order of the draft; the line alone at first. */
export const linesOfRoofLine = (
  line: DraftLine,
  lines: readonly DraftLine[],
): readonly DraftLine[] =>
  line.covers === null
    ? [line]
    : lines.filter(({ covers }) => covers?.roofLine === line.covers?.roofLine)

/** The ends of the whole line on the roof: the outer ones of its first and its last order line. */
export function outsideEnds(group: readonly DraftLine[]): DraftEnds {
  const [first, last] = [group[0]?.ends ?? BOTH_SQUARE, group.at(-1)?.ends ?? BOTH_SQUARE]
  return firstSide(first.lowEnd) === 'left'
    ? { left: first.left, right: last.right, lowEnd: first.lowEnd }
    : { left: last.left, right: first.right, lowEnd: first.lowEnd }
}

/** A pair covers the line on both sides of the gable, so each hand has all of its pieces. */
function counted(line: DraftLine, count: number): Pick<DraftLine, 'quantity' | 'hands'> {
  const { hands } = line
  if (hands === null) return { quantity: count, hands }
  switch (handChoice(hands)) {
    case 'left':
      return { quantity: count, hands: { ...hands, left: count, right: 0 } }
    case 'right':
      return { quantity: count, hands: { ...hands, left: 0, right: count } }
    default:
      return { quantity: 2 * count, hands: { ...hands, left: count, right: count } }
  }
}

/**
 * The draft's lines with a roof line covered: the first of its lines takes the first pieces, lines
 * for the others stand behind it under the next marks. Lines that covered it before are replaced.
 */
export function withRoofLine(
  lines: readonly DraftLine[],
  line: DraftLine,
  groups: readonly PieceGroup[],
  roofLine: DraftRoofLine,
  newKey: () => string,
): DraftLine[] {
  const [base, ...replaced] = linesOfRoofLine(line, lines)
  const [first, ...others] = groups
  if (!base || !first) throw new RangeError('A roof line is covered by at least one piece.')
  const covers = { roofLine: base.covers?.roofLine ?? newKey(), line: roofLine }
  const filled = (into: DraftLine, { length, ends, count }: PieceGroup): DraftLine => ({
    ...into,
    ...counted(base, count),
    length,
    ends: endsToKeep(ends),
    covers,
  })
  const kept = lines.filter((each) => !replaced.includes(each))
  const at = kept.indexOf(base)
  const result = kept.with(at, filled(base, first))
  others.forEach((group, index) => {
    const mark = nextMark({ lines: result })
    result.splice(at + 1 + index, 0, filled({ ...base, key: newKey(), mark }, group))
  })
  return result
}
