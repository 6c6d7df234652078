import type { ProfileProblem } from '#shared/profile/problem'
import type { Inches } from '#shared/units/brands'
import type { LengthUnits } from '#shared/units/length-units'
import { printSize } from '#shared/units/print-length'
import { tapeStep } from '#shared/units/tape-step'

/** What a translated text of a problem is filled with; keys are those of the namespace `profile`. */
export interface ProblemMessage {
  readonly key: `problem.${ProfileProblem['code']}`
  readonly cureKey: `cure.${ProfileProblem['cure']}`
  readonly values: {
    /** The part concerned; some texts differ by it. */
    readonly context: 'leg' | 'bend' | 'hem' | 'piece'
    readonly leg: number | null
    readonly otherLeg: number | null
    readonly bend: number | null
    readonly hem: 'A' | 'B' | null
    readonly found: string
    readonly limit: string
  }
}

/** `limit` is the most that is allowed; for all others the least. */
const AT_MOST: readonly ProfileProblem['code'][] = [
  'hemTooLong',
  'stripTooWide',
  'stripWiderThanStock',
]

/** Measures of the sheet itself, which nobody reads in fractions. */
const OF_THE_SHEET: readonly ProfileProblem['code'][] = [
  'radiusTight',
  'radiusBelowMetal',
  'radiusBelowPaint',
  'hemBelowPaint',
  'gapTight',
]

/** The limit on the next step that still keeps it: following the text must cure the problem. */
const tapeLimit = ({ code, limit }: ProfileProblem, units: LengthUnits): Inches | null =>
  limit === null ? null : tapeStep(limit, AT_MOST.includes(code) ? 'down' : 'up', units)

const printInches = (inches: Inches | null, units: LengthUnits): string => {
  if (inches === null) return ''
  if (Number.isNaN(inches)) return '?'
  return Number.isFinite(inches) ? printSize(inches, units, 64) : '∞'
}

const printedValues = (
  problem: ProfileProblem,
  units: LengthUnits,
): { found: string; limit: string } => {
  const { code, found, limit, unit } = problem
  if (unit === 'inches') {
    if (!OF_THE_SHEET.includes(code)) {
      return {
        found: printInches(found, units),
        limit: printInches(tapeLimit(problem, units), units),
      }
    }
    const read = units === 'fraction' ? 'decimal' : units
    return { found: printInches(found, read), limit: printInches(limit, read) }
  }
  const sign = unit === 'degrees' ? '°' : ''
  const print = (value: number | null) => {
    if (value === null) return ''
    return Number.isFinite(value) ? `${Math.round(value * 10) / 10}${sign}` : '?'
  }
  return { found: print(found), limit: print(limit) }
}

const contextOf = (problem: ProfileProblem): ProblemMessage['values']['context'] => {
  if (problem.bend !== null) return 'bend'
  if (problem.hem !== null) return 'hem'
  return problem.leg !== null ? 'leg' : 'piece'
}

/** The keys and printed values of a problem and its cure, for the person's units. Never throws. */
export const problemMessage = (problem: ProfileProblem, units: LengthUnits): ProblemMessage => ({
  key: `problem.${problem.code}`,
  cureKey: `cure.${problem.cure}`,
  values: {
    context: contextOf(problem),
    leg: problem.leg,
    otherLeg: problem.otherLeg,
    bend: problem.bend,
    hem: problem.hem,
    ...printedValues(problem, units),
  },
})
