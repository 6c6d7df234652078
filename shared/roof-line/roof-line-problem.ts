/** Why a roof line has no answer. The texts live in the locales, namespace `roof-line`. */
export const ROOF_LINE_PROBLEM_CODES = [
  /** Laps as long as the pieces: the next piece gains nothing. */
  'lapOverPiece',
  /** A least length that no piece may have. */
  'minimumOverPiece',
  /** As few pieces as cover the line leave one under the least length, however they are shared out. */
  'pieceUnderMinimum',
  /** The lap would fall on the tab or miter point of an end. */
  'lapInExtra',
  'tooManyPieces',
] as const

/** What would put it right. */
export const ROOF_LINE_CURE_CODES = [
  'shortenLap',
  'lowerMinimum',
  'shortenExtra',
  'lengthenPieces',
] as const

/** What deserves a look although there is an answer. */
export const ROOF_LINE_NOTES = [
  /** One piece, shorter than the shop's least length, because the line is. */
  'lineUnderMinimum',
  /** A piece is shorter than its two laps: three sheets lie on one another there. */
  'lapsMeet',
] as const

export type RoofLineProblemCode = (typeof ROOF_LINE_PROBLEM_CODES)[number]
export type RoofLineCureCode = (typeof ROOF_LINE_CURE_CODES)[number]
export type RoofLineNote = (typeof ROOF_LINE_NOTES)[number]

export interface RoofLineProblem {
  readonly code: RoofLineProblemCode
  /** The field of the roof line that is named with it. */
  readonly field: 'lap' | 'minimum' | 'leftExtra' | 'rightExtra' | 'pieceLength'
  readonly found: number
  /**
   * The most that `found` may be, in its own unit; the least length for `pieceUnderMinimum`, whose
   * `found` is the longest that the shortest piece can be.
   */
  readonly limit: number
  readonly unit: 'inches' | 'count'
  readonly cure: RoofLineCureCode
}

export const roofLineProblem = (
  given: Omit<RoofLineProblem, 'unit'> & Partial<RoofLineProblem>,
): RoofLineProblem => ({ unit: 'inches', ...given })
