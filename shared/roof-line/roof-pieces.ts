import { isLess } from '#shared/geometry/tolerance'
import type { RoofCut } from '#shared/roof-line/roof-cuts'
import { cutsOf, fewestPieces } from '#shared/roof-line/roof-cuts'
import type { RoofLine } from '#shared/roof-line/roof-line.schema'
import { countProblems, cutProblems, settingProblems } from '#shared/roof-line/roof-line-checks'
import type { RoofLineNote, RoofLineProblem } from '#shared/roof-line/roof-line-problem'
import type { Inches } from '#shared/units/brands'

/** A piece where it lies: inches along the line from its low or left end. */
export interface RoofPiece {
  readonly kind: RoofCut['kind']
  /** From tip to tip, laps and the end's tab or miter point included. */
  readonly length: Inches
  /** Under 0 for a tab or miter point at the low end, over the line's length at the other. */
  readonly from: Inches
  readonly to: Inches
}

export interface RoofPieces {
  /** Pieces of one length together, in the order of their first one from the low or left end. */
  readonly pieces: readonly { readonly length: Inches; readonly count: number }[]
  /** Where the laps begin, from the line's low or left end: the next piece is laid from there. */
  readonly laps: readonly Inches[]
  /** The line on the roof, without what is added at its ends. */
  readonly length: Inches
  readonly extras: { readonly left: Inches; readonly right: Inches }
  /** What the pieces reach over, less their laps: the line and what is added at its ends. */
  readonly covered: Inches
  /** Every piece from the low or left end. */
  readonly order: readonly RoofPiece[]
  readonly notes: readonly RoofLineNote[]
}

export type RoofPiecesAnswer =
  | { readonly ok: true; readonly answer: RoofPieces }
  | { readonly ok: false; readonly problems: readonly RoofLineProblem[] }

/**
 * The length on the roof in inches: as given, or of a rake's level run, planRun √(1 + (rise/12)²).
 * Throws RangeError for a line that has neither, which its schema refuses.
 */
export const lineLength = ({ length, planRun, rise }: RoofLine): Inches => {
  if (length !== undefined) return length
  if (planRun === undefined || rise === undefined) {
    throw new RangeError('A roof line has a length, or a planRun and a rise.')
  }
  return (planRun * Math.sqrt(144 + rise * rise)) / 12
}

const layOut = (cuts: readonly RoofCut[], { lap, leftExtra }: RoofLine): RoofPiece[] => {
  // Not -leftExtra, which makes -0 of nothing.
  let from = 0 - leftExtra
  return cuts.map((cut) => {
    const piece = { ...cut, from, to: from + cut.length }
    from = piece.to - lap
    return piece
  })
}

const countAlike = (cuts: readonly RoofCut[]): { length: Inches; count: number }[] => {
  const alike: { length: Inches; count: number }[] = []
  for (const { length } of cuts) {
    const found = alike.find((known) => known.length === length)
    if (found) found.count += 1
    else alike.push({ length, count: 1 })
  }
  return alike
}

const notesOf = (order: readonly RoofPiece[], { minimum, lap }: RoofLine): RoofLineNote[] => {
  const between = order.slice(1, -1)
  return [
    ...(order.length === 1 && order.some(({ length }) => isLess(length, minimum))
      ? (['lineUnderMinimum'] as const)
      : []),
    ...(between.some(({ length }) => isLess(length, 2 * lap)) ? (['lapsMeet'] as const) : []),
  ]
}

/**
 * The pieces that cover a line on the roof, inches, and where they lap: as few as will do,
 * n = ceil((X - l) / (P - l)) of pieces P with laps l for a line X that includes the overhang and
 * what tabs and miter points add. `full` gives full pieces from the low or left end and a
 * remainder, `equal` pieces of one length. No piece is under the line's `minimum` unless it covers
 * the line alone: a short remainder is shared out with the piece before it, and with more of them
 * where the two would still be short. Lengths are exact; they are rounded where they are shown.
 *
 * What has no answer is refused with a code, the field and a cure. Throws RangeError for what the
 * schema of a roof line refuses. Source of the count: plane arithmetic, each lap is lost once.
 */
export const roofPieces = (line: RoofLine): RoofPiecesAnswer => {
  const wrong = settingProblems(line)
  if (wrong.length > 0) return { ok: false, problems: wrong }
  const { lap, leftExtra, rightExtra } = line
  const length = lineLength(line)
  const total = leftExtra + length + rightExtra
  const count = fewestPieces(total, line)
  const tooMany = countProblems(count)
  if (tooMany.length > 0) return { ok: false, problems: tooMany }
  const cuts = cutsOf(total, count, line)
  const problems = cutProblems(cuts, line)
  if (problems.length > 0) return { ok: false, problems }
  const order = layOut(cuts, line)
  return {
    ok: true,
    answer: {
      pieces: countAlike(cuts),
      laps: order.slice(1).map(({ from }) => from),
      length,
      extras: { left: leftExtra, right: rightExtra },
      covered: cuts.reduce((sum, cut) => sum + cut.length, 0) - (count - 1) * lap,
      order,
      notes: notesOf(order, line),
    },
  }
}
