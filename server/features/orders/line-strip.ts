import { endProblemText } from '#server/features/orders/end-problem-text'
import { layStrip, type LaidStrip } from '#shared/ends/lay-strip'
import type { FieldError } from '#shared/http/problem'
import type { OrderLineInput } from '#shared/orders/order.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import { flatStrip } from '#shared/strip/flat-strip'
import type { Strip } from '#shared/strip/strip.schema'
import { pieceWeight } from '#shared/strip/weight'
import type { Inches, Pounds } from '#shared/units/brands'

type Cut = Pick<OrderLineInput, 'profile' | 'length' | 'ends'>

const layLine = ({ profile, length, ends }: Cut, sheet: Sheet): LaidStrip =>
  layStrip({ profile, sheet, pieceLength: length, ends })

/**
 * What keeps the ends of a line from being cut, named below `path`; empty where they can. A profile
 * with errors has no strip to cut, which stands at the left end.
 */
export const endErrors = (line: Cut, sheet: Sheet, path: string): FieldError[] => {
  const laid = layLine(line, sheet)
  if (laid.ok) return []
  return laid.problems.map((problem) => ({
    path: `${path}.ends.${problem.end}`,
    message: endProblemText(problem),
    code: problem.code,
  }))
}

/** The strip to shear for one piece, in inches: its length and what tabs add; the length where it cannot be cut. */
export function blankLength(line: Cut, sheet: Sheet): Inches {
  if (line.ends === null) return line.length
  const laid = layLine(line, sheet)
  return laid.ok ? laid.layout.blankLength : line.length
}

export interface LineStrip {
  readonly strip: Strip
  /** Of one piece as sheared, tabs included and nothing cut away yet. */
  readonly pieceWeight: Pounds
}

export const lineStrip = (line: Cut, sheet: Sheet): LineStrip => {
  const strip = flatStrip(line.profile, sheet)
  return { strip, pieceWeight: pieceWeight(strip, sheet, blankLength(line, sheet)) }
}
