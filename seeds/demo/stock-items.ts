import type { StockItemInsert } from '#server/db/tables/stock-items'
import type { Calendar } from './calendar'
import { createDemoRandom } from './demo-random'
import { DEMO_STOCKS, type DemoStock } from './stocks'

/** Beside the ids of orders and pieces, so that neither shifts the other. */
const SEED = 20_263

/** A foot, inches. */
const FT = 12

type Item = Omit<StockItemInsert, 'stock_id' | 'received_on'> & {
  /** Working days before today. */
  readonly received: number
}

const coil = (lot: string, width: number, feet: number, received: number): Item => ({
  kind: 'coil',
  lot,
  width,
  length: feet * FT,
  film: 'painted',
  received,
})

const sheets = (lot: string, width: number, length: number, count: number): Item => ({
  kind: 'sheet',
  lot,
  width,
  length,
  count,
  film: 'painted',
  received: -9,
})

const drop = (lot: string, rackMark: string, width: number, length: number): Item => ({
  kind: 'drop',
  lot,
  width,
  length,
  film: 'painted',
  rack_mark: rackMark,
  received: -4,
})

/** Lots and marks are invented. */
const ITEMS: Partial<Record<DemoStock, readonly Item[]>> = {
  kiln: [
    coil('KIL-0417', 48, 312, -11),
    coil('KIL-0502', 24, 640, -3),
    sheets('KIL-0398', 48, 120, 14),
    drop('KIL-0417', 'D1', 9.5, 120),
    drop('KIL-0398', 'D2', 14.25, 88.5),
  ],
  slate: [coil('SLA-1126', 48, 455, -10), drop('SLA-1126', 'D3', 11, 126)],
  barley: [
    coil('BAR-0081', 48, 210, -12),
    sheets('BAR-0077', 48, 126, 6),
    drop('BAR-0081', 'D4', 6.75, 118),
  ],
  harbor: [coil('HAR-3305', 48, 290, -8), { ...coil('HAR-3311', 48, 500, -1), film: 'none' }],
  chalk: [{ ...coil('CHA-0640', 48, 175, -11), film: 'bare' }, drop('CHA-0640', 'D5', 16, 96)],
  copper: [
    { ...sheets('COP-2209', 36, 120, 11), film: 'none' },
    { ...drop('COP-2209', 'D6', 12.5, 120), film: 'none' },
  ],
  moss: [
    coil('MOS-0733', 48, 388, -12),
    coil('MOS-0760', 24, 520, -2),
    drop('MOS-0733', 'D7', 13, 126),
  ],
  rook: [
    coil('ROO-0214', 48, 265, -11),
    sheets('ROO-0209', 48, 126, 9),
    drop('ROO-0214', 'D8', 8.25, 74),
  ],
  foxglove: [{ ...coil('FOX-1508', 48, 150, -10), film: 'bare' }, sheets('FOX-1499', 48, 120, 7)],
  stainless: [
    { ...sheets('STA-6120', 36, 120, 8), film: 'none' },
    { ...drop('STA-6120', 'D9', 10.75, 120), film: 'none' },
  ],
}

const isDemoStock = (key: string): key is DemoStock => key in DEMO_STOCKS

/** What lies in the demo shop. */
export function stockItemRows({ day }: Calendar): StockItemInsert[] {
  const { nextId } = createDemoRandom(SEED)
  return Object.entries(ITEMS).flatMap(([key, items]) =>
    isDemoStock(key)
      ? items.map(({ received, ...item }) => ({
          ...item,
          id: nextId(),
          stock_id: DEMO_STOCKS[key].id,
          received_on: day(received),
        }))
      : [],
  )
}
