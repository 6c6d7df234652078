import type { CutPlane, End, Hands, PieceEnds, Side } from '#shared/ends/end.schema'

const otherSide = (side: Side): Side => (side === 'left' ? 'right' : 'left')

/**
 * The plane with its sign along the piece changed: u and v stay, t counts the other way. Signs are
 * changed by subtracting, so that 0 stays 0 and never becomes -0.
 */
const mirrorPlane = (plane: CutPlane): CutPlane => {
  if ('plumb' in plane) return { plumb: 0 - plane.plumb }
  if ('normal' in plane) {
    const [t, u, v] = plane.normal
    return { normal: [0 - t, u, v] }
  }
  const { slopeIn, slopeOut, plan } = plane.corner
  return { corner: { slopeIn: 0 - slopeOut, slopeOut: 0 - slopeIn, plan } }
}

const mirrorEnd = (end: End): End =>
  end.kind === 'miter'
    ? {
        ...end,
        plane: mirrorPlane(end.plane),
        legs: end.legs.map(({ leg, plane }) => ({ leg, plane: mirrorPlane(plane) })),
      }
    : end

/**
 * The ends of the other hand: the same profile seen in a mirror across the piece. The ends change
 * places, each plane its sign along t, and the low end is the other one. Twice gives the same again.
 */
export const mirrorEnds = ({ left, right, lowEnd }: PieceEnds): PieceEnds => ({
  left: mirrorEnd(right),
  right: mirrorEnd(left),
  lowEnd: lowEnd && otherSide(lowEnd),
})

/**
 * The hand of a piece of a line, by its number from 1: the first ones are left. Null where the line
 * has no hands. A number beyond the quantity is nobody's, which throws a RangeError.
 */
export const handOf = (hands: Hands | null, sequence: number): Side | null => {
  if (hands === null) return null
  if (!(sequence >= 1 && sequence <= hands.left + hands.right)) {
    throw new RangeError(`There is no piece ${sequence} of ${hands.left + hands.right}.`)
  }
  return sequence <= hands.left ? 'left' : 'right'
}

/** The ends of a piece of this hand: as drawn, or mirrored. Null: square and level. */
export const endsOfHand = (
  ends: PieceEnds | null,
  hands: Hands | null,
  hand: Side | null,
): PieceEnds | null => {
  if (ends === null || hands === null || hand === null || hand === hands.drawn) return ends
  return mirrorEnds(ends)
}
