import type { RoofLineProblem } from '#shared/roof-line/roof-line-problem'
import type { LengthUnits } from '#shared/units/length-units'
import { printRun } from '#shared/units/print-length'
import { tapeStep } from '#shared/units/tape-step'

/** What a translated text of a problem is filled with; keys are those of the namespace `roof-line`. */
export interface RoofLineMessage {
  readonly key: `problem.${RoofLineProblem['code']}`
  readonly cureKey: `cure.${RoofLineProblem['cure']}`
  readonly values: {
    /** The end concerned; some texts differ by it. */
    readonly context: 'left' | 'right' | 'line'
    readonly found: string
    readonly limit: string
    /** The measure that the cure names, such that following it cures. */
    readonly cured: string
  }
}

/** The most that the field may be for the line to have an answer. */
const curedValue = ({ code, found, limit }: RoofLineProblem): number =>
  code === 'pieceUnderMinimum' ? found : limit

/** The keys and printed values of a problem and its cure, for the person's units. Never throws. */
export const roofLineMessage = (problem: RoofLineProblem, units: LengthUnits): RoofLineMessage => {
  const { code, cure, field, found, limit, unit } = problem
  const print = (value: number) => (unit === 'count' ? `${value}` : printRun(value, units, 64))
  const cured = curedValue(problem)
  return {
    key: `problem.${code}`,
    cureKey: `cure.${cure}`,
    values: {
      context: field === 'leftExtra' ? 'left' : field === 'rightExtra' ? 'right' : 'line',
      found: print(found),
      limit: print(limit),
      cured: print(unit === 'count' ? cured : tapeStep(cured, 'down', units)),
    },
  }
}
