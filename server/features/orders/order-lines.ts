import { blankLength, endErrors } from '#server/features/orders/line-strip'
import { invalidInput, profileProblem } from '#server/http/errors'
import { profileErrors } from '#server/planning/profile-errors'
import type { FieldError } from '#shared/http/problem'
import type { OrderInput, OrderLineInput } from '#shared/orders/order.schema'
import { resolveFollows } from '#shared/profile/follows'
import type { Good } from '#shared/roof-line/goods.schema'
import type { Stock } from '#shared/stock/stock.schema'
import { printRun } from '#shared/units/print-length'

type Stocks = ReadonlyMap<string, Stock>

/** Lines with every bend that follows the roof at the turn the job's pitch gives it. */
export const linesForPitch = (
  lines: readonly OrderLineInput[],
  pitchRise: number,
): OrderLineInput[] =>
  lines.map((line) => ({ ...line, profile: resolveFollows(line.profile, pitchRise) }))

/** Every stock that lines and goods name. */
export const stocksOf = ({ lines, goods }: Pick<OrderInput, 'lines' | 'goods'>): string[] => [
  ...lines.map(({ stockId }) => stockId),
  ...goods.flatMap(({ stockId }) => stockId ?? []),
]

/**
 * Refuses an order that cannot be made, naming every field at once: first what was filled in wrongly,
 * then the profiles, then their ends, which need a sound profile.
 *
 * @throws invalid-input for marks, stocks, lengths and ends; profile-problem naming legs and bends
 */
export function checkOrder(
  { lines, goods }: Pick<OrderInput, 'lines' | 'goods'>,
  stocks: Stocks,
): void {
  refuse(invalidInput, [
    ...markErrors(lines),
    ...lines.flatMap(fieldErrorsOf(stocks)),
    ...goods.flatMap(goodErrorsOf(stocks)),
  ])
  refuse(
    profileProblem,
    lines.flatMap((line, index) =>
      profileErrors(line.profile, stocks.get(line.stockId) ?? null, `lines.${index}.profile`),
    ),
  )
  refuse(invalidInput, lines.flatMap(cutErrorsOf(stocks)))
}

function refuse(as: (errors: readonly FieldError[]) => Error, errors: readonly FieldError[]): void {
  if (errors.length > 0) throw as(errors)
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

const NO_STOCK = 'There is no such stock. Choose one of the list.'

const fieldErrorsOf =
  (stocks: Stocks) =>
  ({ stockId, length }: OrderLineInput, index: number): FieldError[] => {
    const stock = stocks.get(stockId)
    if (!stock) return [{ path: `lines.${index}.stockId`, message: NO_STOCK }]
    if (length <= stock.longestPiece) return []
    const longest = printRun(stock.longestPiece, 'fraction')
    const message = `The longest piece of this stock is ${longest}. Split the run into shorter pieces.`
    return [{ path: `lines.${index}.length`, message }]
  }

const goodErrorsOf =
  (stocks: Stocks) =>
  ({ stockId }: Good, index: number): FieldError[] =>
    stockId === null || stocks.has(stockId)
      ? []
      : [{ path: `goods.${index}.stockId`, message: NO_STOCK }]

/** Of lines whose stock and profile are sound. */
const cutErrorsOf =
  (stocks: Stocks) =>
  (line: OrderLineInput, index: number): FieldError[] => {
    const stock = stocks.get(line.stockId)
    if (!stock) return []
    const errors = endErrors(line, stock.sheet, `lines.${index}`)
    const blank = blankLength(line, stock.sheet)
    if (errors.length > 0 || blank <= stock.longestPiece) return errors
    const [strip, longest] = [blank, stock.longestPiece].map((each) => printRun(each, 'fraction'))
    const message = `With its tabs the strip is ${strip}; the longest of this stock is ${longest}. Shorten the piece or its tabs.`
    return [{ path: `lines.${index}.length`, message }]
  }
