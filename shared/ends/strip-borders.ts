import { endCut, legOf } from '#shared/ends/end-cut'
import type { EndDepth } from '#shared/ends/end-depth'
import { endDepth } from '#shared/ends/end-depth'
import type { End, PieceEnds } from '#shared/ends/end.schema'
import { markPlaces } from '#shared/ends/mark-places'
import type { Profile } from '#shared/profile/profile.schema'
import type { FoldingSheet } from '#shared/strip/flat-parts'
import { flatStrip } from '#shared/strip/flat-strip'
import type { Strip } from '#shared/strip/strip.schema'
import type { Inches } from '#shared/units/brands'

export const SQUARE_END: End = { kind: 'square', tabs: [] }

/** Both ends square, the piece level: what a line without ends has. */
export const SQUARE_ENDS: PieceEnds = { left: SQUARE_END, right: SQUARE_END, lowEnd: null }

/** A piece to lay out. `ends` null: both square. Inches. */
export interface PieceToLay {
  readonly profile: Profile
  readonly sheet: FoldingSheet
  /** Of the finished piece from tip to tip, laps included; tabs stand out beyond. */
  readonly pieceLength: Inches
  readonly ends: PieceEnds | null
}

export interface StripBorders {
  readonly strip: Strip
  /** Edge A, each crease, edge B. */
  readonly at: readonly Inches[]
  /** The leg between each two of them; a lip counts to the leg it lies on. */
  readonly legs: readonly number[]
  readonly left: EndDepth
  readonly right: EndDepth
  readonly blankLength: Inches
}

/** The borders of both ends on the strip. Nothing is checked here: ask `endProblems` first. */
export const stripBorders = ({ profile, sheet, pieceLength, ends }: PieceToLay): StripBorders => {
  const strip = flatStrip(profile, sheet)
  const at = markPlaces(strip)
  const { left, right } = ends ?? SQUARE_ENDS
  const leftCut = endCut(profile, sheet, left, 'left')
  const leftDepth = endDepth(leftCut, at, left, 'left')
  const rightDepth = endDepth(endCut(profile, sheet, right, 'right'), at, right, 'right')
  return {
    strip,
    at,
    legs: leftCut.runs.map(({ of }) => legOf(of, profile.legs.length)),
    left: leftDepth,
    right: rightDepth,
    blankLength: pieceLength + leftDepth.standsOut + rightDepth.standsOut,
  }
}
