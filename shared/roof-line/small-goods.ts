import { TOLERANCE } from '#shared/geometry/tolerance'
import { fastenerMarks } from '#shared/roof-line/fastener-marks'
import type { GoodsSettings } from '#shared/roof-line/goods-settings.schema'
import type { Good, GoodKind, GoodUnit } from '#shared/roof-line/goods.schema'
import { GOOD_KINDS } from '#shared/roof-line/goods.schema'
import type { RoofPieces } from '#shared/roof-line/roof-pieces'
import type { Stock } from '#shared/stock/stock.schema'
import type { Inches } from '#shared/units/brands'
import { INCHES_PER_FOOT } from '#shared/units/length-units'

/** A line on the roof with the trim that covers it, as far as small goods ask for it. */
export interface GoodsLine {
  readonly run: Pick<RoofPieces, 'length' | 'laps'>
  /** What lies across a lap or tab: the girth of the profile. */
  readonly girth: Inches
  readonly stock: Pick<Stock, 'id' | 'painted'>
  /** Lines of the roof that are alike. */
  readonly times: number
  /** Legs that are fastened, each along the same marks. */
  readonly fastenedLegs: number
  /** Tabs on one such line, at both ends together. */
  readonly tabs: number
  /** Whether tape goes along the line, and closures under it. */
  readonly taped: boolean
  readonly closed: boolean
}

/** An amount not yet counted up to whole units. */
interface Amount {
  readonly kind: GoodKind
  readonly unit: GoodUnit
  /** Where the color must match. */
  readonly stockId: string | null
  readonly amount: number
}

/** A partly covered panel is closed like a whole one. */
const panelsOf = (length: Inches, panelModule: Inches): number =>
  Math.ceil(length / panelModule - TOLERANCE)

const amountsOf = (line: GoodsLine, settings: GoodsSettings): Amount[] => {
  const { run, girth, stock, times, fastenedLegs, tabs, taped, closed } = line
  const { rivetsPerLap, rivetsPerTab, tapeRowsPerLap, tapeRowsAlong } = settings
  const laps = run.laps.length
  const tape = laps * girth * tapeRowsPerLap + (taped ? run.length * tapeRowsAlong : 0)
  const bead = girth * (laps * settings.beadsPerLap + tabs * settings.beadsPerTab)
  const each = (kind: GoodKind, stockId: string | null, amount: number): Amount => ({
    kind,
    unit: 'each',
    stockId,
    amount: amount * times,
  })
  return [
    each('fasteners', stock.id, fastenerMarks(run.length, settings).length * fastenedLegs),
    each('rivets', stock.id, laps * rivetsPerLap + tabs * rivetsPerTab),
    each('closures', null, closed ? panelsOf(run.length, settings.panelModule) : 0),
    {
      kind: 'butylTape',
      unit: 'foot',
      stockId: null,
      amount: (tape * times) / INCHES_PER_FOOT,
    },
    {
      kind: 'sealant',
      unit: 'tube',
      stockId: null,
      amount: (bead * times) / INCHES_PER_FOOT / settings.beadFeetPerTube,
    },
  ]
}

/** Touch-up paint is counted by color, however many lines have it. */
const paintOf = (lines: readonly GoodsLine[], { bottlesPerColor }: GoodsSettings): Amount[] => {
  const painted = lines.filter(({ stock, times }) => stock.painted && times > 0)
  return [...new Set(painted.map(({ stock }) => stock.id))].map((stockId) => ({
    kind: 'touchUpPaint',
    unit: 'bottle',
    stockId,
    amount: bottlesPerColor,
  }))
}

/**
 * The small goods that an order's lines on the roof take: fasteners along the line, rivets through
 * laps and tabs (both in the trim's color), butyl tape in laps and along the line, sealant in laps
 * and tabs, closures, and touch-up paint. What the lines take is added up first and then counted up
 * to whole units, closures apart, which are whole on every line. In the order of `GOOD_KINDS`, and
 * of one kind in the order of the lines; what no line takes is left out. Every rate is a setting of
 * the shop (`goodsSettingsSchema`). Throws RangeError for a count (times, legs, tabs) that is
 * negative or no whole number.
 */
export const smallGoods = (lines: readonly GoodsLine[], settings: GoodsSettings): Good[] => {
  lines.forEach(({ times, fastenedLegs, tabs }, index) => {
    Object.entries({ times, fastenedLegs, tabs }).forEach(([name, count]) => {
      if (!Number.isInteger(count) || count < 0) {
        throw new RangeError(`lines.${index}.${name} must be a whole number, not ${count}.`)
      }
    })
  })
  const amounts = [
    ...lines.flatMap((line) => amountsOf(line, settings)),
    ...paintOf(lines, settings),
  ]
  return GOOD_KINDS.flatMap((kind) => {
    const ofKind = amounts.filter((amount) => amount.kind === kind)
    return [...new Set(ofKind.map(({ stockId }) => stockId))].flatMap((stockId) => {
      const alike = ofKind.filter((amount) => amount.stockId === stockId)
      const sum = alike.reduce((total, { amount }) => total + amount, 0)
      const quantity = Math.ceil(sum - TOLERANCE)
      const [first] = alike
      return first && quantity > 0 ? [{ kind, quantity, unit: first.unit, stockId, note: '' }] : []
    })
  })
}
