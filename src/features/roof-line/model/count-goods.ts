import type { GoodsSettings } from '#shared/roof-line/goods-settings.schema'
import type { Good } from '#shared/roof-line/goods.schema'
import { smallGoods, type GoodsLine } from '#shared/roof-line/small-goods'
import type { Stock } from '#shared/stock/stock.schema'
import type { Inches } from '#shared/units/brands'
import { handChoice } from '@/features/ends/model/hand-edits'
import type { DraftGood, DraftLine } from '@/features/orders/draft/order-draft'

/** Inches of lap between the pieces of a line that was not made of a roof line. Common practice, no source. */
const USUAL_LAP: Inches = 4

/** An order line that is written as far as small goods are counted from it. */
export interface CountedLine {
  readonly line: DraftLine
  readonly stock: Stock
  readonly girth: Inches
}

/** Order lines whose pieces cover one line on the roof, or several that are alike. */
export interface CoveredLine {
  readonly key: string
  readonly marks: readonly string[]
  readonly stock: Stock
  readonly girth: Inches
  readonly lap: Inches
  /** Length and number of the pieces, as they stand in the order lines; `tabs` of one piece. */
  readonly pieces: readonly { length: Inches; count: number; tabs: number }[]
  /** Roof lines alike: a pair covers both sides of the gable. */
  readonly usualTimes: number
}

/** What a person says of a covered line. */
export interface CoveredChoice {
  readonly times: number | null
  readonly fastenedLegs: number | null
  readonly taped: boolean
  readonly closed: boolean
}

export const usualChoice = ({ usualTimes }: CoveredLine): CoveredChoice => ({
  times: usualTimes,
  fastenedLegs: 1,
  taped: true,
  closed: false,
})

/** The roof lines that an order's lines cover; lines without number or length are left out. */
export function coveredLines(lines: readonly CountedLine[]): CoveredLine[] {
  const covered = new Map<string, CoveredLine>()
  for (const { line, stock, girth } of lines) {
    const { quantity, length, ends } = line
    if (quantity === null || length === null) continue
    const key = line.covers?.roofLine ?? line.key
    const known = covered.get(key)
    const tabs = (ends?.left.tabs.length ?? 0) + (ends?.right.tabs.length ?? 0)
    covered.set(key, {
      key,
      marks: [...(known?.marks ?? []), line.mark],
      stock: known?.stock ?? stock,
      girth: known?.girth ?? girth,
      lap: line.covers?.line.lap ?? known?.lap ?? USUAL_LAP,
      pieces: [...(known?.pieces ?? []), { length, count: quantity, tabs }],
      usualTimes: known?.usualTimes ?? (handChoice(line.hands) === 'pair' ? 2 : 1),
    })
  }
  return [...covered.values()]
}

/** Whether the pieces can be shared out over so many lines alike. */
export const canShare = ({ pieces }: CoveredLine, times: number | null): times is number =>
  times !== null && times >= 1 && pieces.every(({ count }) => count % times === 0)

/** One of the lines alike: what its pieces reach over, the points of miters included, and its laps. */
export function runOf({ pieces, lap }: CoveredLine, times: number): GoodsLine['run'] {
  const lengths = pieces.flatMap(({ length, count }) =>
    Array.from({ length: count / times }, () => length),
  )
  const laps: Inches[] = []
  let reached = 0
  for (const length of lengths) {
    if (reached > 0) {
      reached -= lap
      laps.push(reached)
    }
    reached += length
  }
  return { length: reached, laps }
}

/** The goods of all covered lines; null while a choice is missing or cannot be shared out. */
export function countGoods(
  lines: readonly CoveredLine[],
  choiceOf: (line: CoveredLine) => CoveredChoice,
  settings: GoodsSettings,
): Good[] | null {
  const asked: GoodsLine[] = []
  for (const line of lines) {
    const { times, fastenedLegs, taped, closed } = choiceOf(line)
    if (!canShare(line, times) || fastenedLegs === null) return null
    asked.push({
      run: runOf(line, times),
      girth: line.girth,
      stock: line.stock,
      times,
      fastenedLegs,
      tabs: line.pieces.reduce((sum, { count, tabs }) => sum + (count * tabs) / times, 0),
      taped,
      closed,
    })
  }
  return smallGoods(asked, settings)
}

const isAlike = (a: Pick<Good, 'kind' | 'unit' | 'stockId'>, b: typeof a): boolean =>
  a.kind === b.kind && a.unit === b.unit && a.stockId === b.stockId

/** Counted goods take the place of those of their kind and color; what else was written stays. */
export function withCounted(
  goods: readonly DraftGood[],
  counted: readonly Good[],
  newKey: () => string,
): DraftGood[] {
  const kept = goods.map((good) => {
    const found = counted.find((each) => isAlike(each, good))
    return found ? { ...good, quantity: found.quantity } : good
  })
  const added = counted
    .filter((each) => !goods.some((good) => isAlike(each, good)))
    .map((good) => ({ ...good, key: newKey() }))
  return [...kept, ...added]
}
