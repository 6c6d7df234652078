import type { EndProblem, StripLayout, StripPoint } from '#shared/ends/end-layout'
import type { Side } from '#shared/ends/end.schema'
import { examineEnds } from '#shared/ends/end-problems'
import { layEnd } from '#shared/ends/lay-end'
import type { PieceToLay } from '#shared/ends/strip-borders'
import { SQUARE_ENDS } from '#shared/ends/strip-borders'
import { tidyPolygon } from '#shared/ends/strip-polygon'

export type LaidStrip =
  | { readonly ok: true; readonly layout: StripLayout }
  | { readonly ok: false; readonly problems: readonly EndProblem[] }

/**
 * Lays a piece out flat with both ends dressed, in inches: the blank to shear, the outline that is
 * left of it, and for each end its marks, tabs, cut-aways, slits and hem openings.
 *
 * The strip lies left side up, edge A nearest; `along` counts from the blank's left end and `at`
 * from edge A, but a mark's `along` from the end it belongs to. A right end's mark lies at the
 * greatest t of its cut less its own, a left end's at its own t less the least. On a leg the cut
 * is a straight line from crease to crease, laid out at the sharp corners of the sheet's middle;
 * within a bend the sheet really cuts along a curve, which lies off the mark by at most the cut's
 * slope times (R + T/2)(1 / cos(turn / 2) - 1). `pieceLength` counts from tip to tip, laps included;
 * tabs make the blank longer.
 *
 * An end that cannot be cut gives its problems instead, by code and with values. Never throws.
 */
export const layStrip = (piece: PieceToLay): LaidStrip => {
  const examined = examineEnds(piece)
  if (!examined.ok) return examined
  const { strip, at, blankLength, left, right } = examined.borders
  const fromRight = (point: StripPoint): StripPoint => ({
    at: point.at,
    along: blankLength - point.along,
  })
  const endOf = (side: Side) =>
    layEnd({
      profile: piece.profile,
      thickness: piece.sheet.thickness,
      end: (piece.ends ?? SQUARE_ENDS)[side],
      side,
      at,
      depth: side === 'left' ? left : right,
      onBlank: side === 'left' ? (point) => point : fromRight,
    })
  return {
    ok: true,
    layout: {
      blankLength,
      stripWidth: strip.stripWidth,
      outline: tidyPolygon([...left.border, ...right.border.toReversed().map(fromRight)]),
      left: endOf('left'),
      right: endOf('right'),
    },
  }
}
