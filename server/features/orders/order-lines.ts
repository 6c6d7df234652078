import { invalidInput, profileProblem } from '#server/http/errors'
import { profileErrors } from '#server/planning/profile-errors'
import type { FieldError } from '#shared/http/problem'
import type { OrderLineInput } from '#shared/orders/order.schema'
import { resolveFollows } from '#shared/profile/follows'
import type { Stock } from '#shared/stock/stock.schema'
import { printRun } from '#shared/units/print-length'

/** Lines with every bend that follows the roof at the turn the job's pitch gives it. */
export const linesForPitch = (
  lines: readonly OrderLineInput[],
  pitchRise: number,
): OrderLineInput[] =>
  lines.map((line) => ({ ...line, profile: resolveFollows(line.profile, pitchRise) }))

/**
 * Refuses lines that cannot be made, naming every field at once.
 *
 * @throws invalid-input for marks, stocks and lengths; profile-problem naming legs and bends
 */
export function checkLines(
  lines: readonly OrderLineInput[],
  stocks: ReadonlyMap<string, Stock>,
): void {
  const inputErrors = [...markErrors(lines), ...lines.flatMap(fieldErrorsOf(stocks))]
  if (inputErrors.length > 0) throw invalidInput(inputErrors)
  const profiles = lines.flatMap((line, index) =>
    profileErrors(line.profile, stocks.get(line.stockId) ?? null, `lines.${index}.profile`),
  )
  if (profiles.length > 0) throw profileProblem(profiles)
}

/** A mark names one line on drawing and label; on a label `a` and `A` are one. */
function markErrors(lines: readonly OrderLineInput[]): FieldError[] {
  const seen = new Set<string>()
  return lines.flatMap(({ mark }, index) => {
    const folded = mark.toLowerCase()
    if (!seen.has(folded)) {
      seen.add(folded)
      return []
    }
    const message = `Another line has the mark ${mark} already. Give each line its own.`
    return [{ path: `lines.${index}.mark`, message }]
  })
}

const fieldErrorsOf =
  (stocks: ReadonlyMap<string, Stock>) =>
  ({ stockId, length }: OrderLineInput, index: number): FieldError[] => {
    const stock = stocks.get(stockId)
    if (!stock) {
      const message = 'There is no such stock. Choose one of the list.'
      return [{ path: `lines.${index}.stockId`, message }]
    }
    if (length <= stock.longestPiece) return []
    const longest = printRun(stock.longestPiece, 'fraction')
    const message = `The longest piece of this stock is ${longest}. Split the run into shorter pieces.`
    return [{ path: `lines.${index}.length`, message }]
  }
