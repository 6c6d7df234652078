import type { EndProblem } from '#shared/ends/end-layout'
import type { FoundProblem } from '#shared/ends/one-end-problems'
import { foundProblem, oneEndProblems } from '#shared/ends/one-end-problems'
import { hasStrip } from '#shared/ends/mark-places'
import type { PieceToLay, StripBorders } from '#shared/ends/strip-borders'
import { SQUARE_ENDS, stripBorders } from '#shared/ends/strip-borders'
import { narrowest } from '#shared/ends/strip-polygon'
import { isLess } from '#shared/geometry/tolerance'

const ofEnd =
  (end: EndProblem['end']) =>
  (found: FoundProblem): EndProblem => ({ ...found, end })

/** The two cuts leave nothing of the piece somewhere across the strip. */
const meetingProblems = (borders: StripBorders): EndProblem[] => {
  const { at, legs, left, right, blankLength } = borders
  const { at: place, taken } = narrowest(left.border, right.border)
  if (isLess(taken, blankLength)) return []
  const leg = legs[at.findIndex((mark) => mark >= place) - 1] ?? legs[0] ?? null
  return [ofEnd('right')(foundProblem('endsMeet', { leg, found: taken, limit: blankLength }))]
}

export type ExaminedEnds =
  | { readonly ok: true; readonly borders: StripBorders }
  | { readonly ok: false; readonly problems: readonly EndProblem[] }

/** The borders of a piece's ends, or what is wrong with them. Never throws. */
export const examineEnds = (piece: PieceToLay): ExaminedEnds => {
  const { profile, sheet, pieceLength } = piece
  const ends = piece.ends ?? SQUARE_ENDS
  if (!hasStrip(profile, sheet)) {
    return { ok: false, problems: [ofEnd('left')(foundProblem('profileFaulty'))] }
  }
  if (!(pieceLength > 0 && Number.isFinite(pieceLength))) {
    const found = foundProblem('notFinite', { found: pieceLength, limit: 0 })
    return { ok: false, problems: [ofEnd('left')(found)] }
  }
  const legs = profile.legs.length
  const apart = (['left', 'right'] as const).flatMap((side) =>
    oneEndProblems(ends[side], side, legs, pieceLength).map(ofEnd(side)),
  )
  if (apart.length > 0) return { ok: false, problems: apart }
  const borders = stripBorders(piece)
  const meeting = meetingProblems(borders)
  return meeting.length > 0 ? { ok: false, problems: meeting } : { ok: true, borders }
}

/**
 * Everything that keeps a piece's ends from being cut, each with its end, leg and values; none
 * where the strip can be laid out. A fault of the profile or the piece's length stands at the left
 * end. `endsMeet` stands at the right end. Never throws on a value of the right shape, NaN and
 * infinity included, and never mends anything by itself.
 */
export const endProblems = (piece: PieceToLay): readonly EndProblem[] => {
  const examined = examineEnds(piece)
  return examined.ok ? [] : examined.problems
}
