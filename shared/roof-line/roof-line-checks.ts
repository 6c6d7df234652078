import { isAtMost, isLess } from '#shared/geometry/tolerance'
import type { RoofCut } from '#shared/roof-line/roof-cuts'
import type { RoofLine } from '#shared/roof-line/roof-line.schema'
import type { RoofLineProblem } from '#shared/roof-line/roof-line-problem'
import { roofLineProblem } from '#shared/roof-line/roof-line-problem'
import type { Inches } from '#shared/units/brands'

/** An order line takes no more pieces. */
const MOST_ROOF_PIECES = 500

/** Measures that contradict each other, whatever the line's length. */
export const settingProblems = ({ pieceLength, lap, minimum }: RoofLine): RoofLineProblem[] => {
  const limit = pieceLength
  const longLap = isLess(lap, pieceLength)
    ? []
    : [
        roofLineProblem({
          code: 'lapOverPiece',
          field: 'lap',
          found: lap,
          limit,
          cure: 'shortenLap',
        }),
      ]
  const longMinimum = isAtMost(minimum, pieceLength)
    ? []
    : [
        roofLineProblem({
          code: 'minimumOverPiece',
          field: 'minimum',
          found: minimum,
          limit,
          cure: 'lowerMinimum',
        }),
      ]
  return [...longLap, ...longMinimum]
}

export const countProblems = (count: number): RoofLineProblem[] =>
  count <= MOST_ROOF_PIECES
    ? []
    : [
        roofLineProblem({
          code: 'tooManyPieces',
          field: 'pieceLength',
          found: count,
          limit: MOST_ROOF_PIECES,
          unit: 'count',
          cure: 'lengthenPieces',
        }),
      ]

/** A tab or miter point must end before the lap of its piece begins. */
const extraProblems = (
  field: 'leftExtra' | 'rightExtra',
  found: Inches,
  limit: Inches,
): RoofLineProblem[] =>
  isLess(limit, found)
    ? [roofLineProblem({ code: 'lapInExtra', field, found, limit, cure: 'shortenExtra' })]
    : []

/** What is wrong with the pieces that the count gave. A piece that is alone is as long as it is. */
export const cutProblems = (cuts: readonly RoofCut[], line: RoofLine): RoofLineProblem[] => {
  const [first, last] = [cuts[0], cuts.at(-1)]
  if (!first || !last || cuts.length === 1) return []
  const { minimum, lap, leftExtra, rightExtra } = line
  const shortest = Math.min(...cuts.map(({ length }) => length))
  if (isLess(shortest, minimum)) {
    return [
      roofLineProblem({
        code: 'pieceUnderMinimum',
        field: 'minimum',
        found: shortest,
        limit: minimum,
        cure: 'lowerMinimum',
      }),
    ]
  }
  return [
    ...extraProblems('leftExtra', leftExtra, first.length - lap),
    ...extraProblems('rightExtra', rightExtra, last.length - lap),
  ]
}
