import { closeEnds, type ClosedEnds } from '#shared/ends/close-ends'
import type { End, PieceEnds, Side } from '#shared/ends/end.schema'
import type { EndOfPiece } from '#shared/ends/folded-end'
import { mirrorEnds } from '#shared/ends/hands'
import { matchingLay } from '#shared/ends/run-frame'
import { isEqual } from '#shared/geometry/tolerance'
import type { Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import { completeEnds, type DraftEnds, type DraftHands } from './draft-end'
import { otherSide } from './end-edits'
import { otherHand } from './hand-edits'

/** An order line as far as its ends may meet another's. */
export interface EndedLine {
  readonly key: string
  readonly mark: string
  readonly name: string
  /** As the shop will make it. */
  readonly profile: Profile
  readonly sheet: Sheet
  readonly ends: DraftEnds | null
  readonly hands: DraftHands | null
}

/** An end that may lie in the same corner: a right end meets a left one. */
export interface Neighbor {
  readonly id: string
  readonly line: EndedLine
  readonly side: Side
  /** The hand of the piece, where the line has hands. */
  readonly hand: Side | null
  readonly end: End
}

/** The pieces of a line: as drawn, and mirrored where the other hand is made too. */
function piecesOf({ ends, hands }: EndedLine): { hand: Side | null; ends: PieceEnds }[] {
  const drawn = ends && completeEnds(ends)
  if (!drawn) return []
  const mirrored = otherHand(hands)
  return [
    { hand: hands?.drawn ?? null, ends: drawn },
    ...(mirrored === null ? [] : [{ hand: mirrored, ends: mirrorEnds(drawn) }]),
  ]
}

/** Every miter that can meet an end of this side, own line included. */
export const neighborsOf = (side: Side, lines: readonly EndedLine[]): Neighbor[] =>
  lines.flatMap((line) =>
    piecesOf(line).flatMap(({ hand, ends }) => {
      const met = otherSide(side)
      const end = ends[met]
      return end.kind === 'miter'
        ? [{ id: `${line.key} ${hand ?? 'none'}`, line, side: met, hand, end }]
        : []
    }),
  )

const namesCorner = (end: End): boolean => end.kind === 'miter' && 'corner' in end.plane

/**
 * The neighbor that closes on most legs, or else the first that is cut for the same corner; null
 * where none is either. Nobody has to be chosen where the drawings leave no doubt.
 */
export function likeliest(own: EndOfPiece, neighbors: readonly Neighbor[]): Neighbor | null {
  let best: { neighbor: Neighbor; closing: number } | null = null
  for (const neighbor of neighbors) {
    const closed = closingWith(own, neighbor)
    if (!closed.ok) continue
    const closing = closed.a.filter(({ closesOn }) => closesOn !== null).length
    if (closing === 0 && !(namesCorner(own.end) && namesCorner(neighbor.end))) continue
    if (best === null || closing > best.closing) best = { neighbor, closing }
  }
  return best?.neighbor ?? null
}

/** How the two close in their corner. */
export const closingWith = (own: EndOfPiece, { line, side, end }: Neighbor): ClosedEnds =>
  closeEnds(own, { profile: line.profile, sheet: line.sheet, side, end })

const sameDrawing = (a: Profile, b: Profile): boolean =>
  a.legs.length === b.legs.length &&
  a.legs.every((leg, index) => isEqual(leg, b.legs[index] ?? NaN)) &&
  a.bends.every(({ turn }, index) => isEqual(turn, b.bends[index]?.turn ?? NaN))

/**
 * The lay at which a neighbor of the same drawing would be the mirror image in the corner, degrees;
 * null where another lay is no cure.
 */
export function layThatCloses(own: EndOfPiece, neighbor: Neighbor): number | null {
  const { end } = own
  if (end.kind !== 'miter' || neighbor.end.kind !== 'miter') return null
  // Legs cut by planes of their own close on no mirror image.
  if (end.legs.length > 0 || neighbor.end.legs.length > 0) return null
  if (!('corner' in end.plane) || !('corner' in neighbor.end.plane)) return null
  if (!sameDrawing(own.profile, neighbor.line.profile)) return null
  const lay = matchingLay(end.plane.corner, own.side, end.lay)
  return isEqual(lay, neighbor.end.lay) ? null : lay
}
