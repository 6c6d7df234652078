import type { Bundle } from '#shared/bundles/bundles.contract'
import type { HandOffSheet } from '#shared/hand-off/hand-off.contract'
import type { Order, OrderLine, OrderSummary } from '#shared/orders/order.schema'
import { checkCharacter } from '#shared/pieces/codes'
import type { Profile } from '#shared/profile/profile.schema'
import type { Stock } from '#shared/stock/stock.schema'
import { flatStrip } from '#shared/strip/flat-strip'

const id = (kind: number, number: number): string =>
  `00000000-0000-4000-8${String(kind).padStart(3, '0')}-${String(number).padStart(12, '0')}`

const withCheck = (text: string): string => text + checkCharacter(text)

export const bundleCode = (number: number): string =>
  withCheck(`B${String(number).padStart(6, '0')}`)
export const pieceCode = (number: number): string =>
  withCheck(`P${String(number).padStart(6, '0')}`)

export const ORDER_ID = id(1, 2047)
export const OTHER_ORDER_ID = id(1, 2050)

export const NO_PIECES = { queued: 0, bent: 0, bundled: 0, pickedUp: 0, scrapped: 0, withdrawn: 0 }

export const orderSummaryOf = (more: Partial<OrderSummary> = {}): OrderSummary => ({
  id: ORDER_ID,
  number: 2047,
  company: { id: id(2, 1), name: 'Tamsin & Reed Roofing' },
  job: { id: id(3, 1), name: 'Larkspur barn', pitchRise: 6 },
  orderedBy: 'Pell Aster',
  poNumber: 'LB-7',
  neededBy: '2099-06-01',
  submittedAt: '2026-03-02T14:00:00.000Z',
  state: 'ready',
  pieceCount: 6,
  version: 3,
  ...more,
  progress: { ...NO_PIECES, bundled: 6, ...more.progress },
})

/** Bundle B`number` of the order, with two pieces, ten feet long. */
export const bundleOf = (number: number, more: Partial<Bundle> = {}): Bundle => ({
  id: id(4, number),
  code: bundleCode(number),
  number,
  orderId: ORDER_ID,
  orderNumber: 2047,
  company: 'Tamsin & Reed Roofing',
  job: 'Larkspur barn',
  rackPlace: `R${number}`,
  pieces: [1, 2].map((sequence) => ({
    code: pieceCode(number * 10 + sequence),
    mark: 'A',
    name: 'Gable trim',
    sequence,
    hand: null,
    length: 120,
    weight: 8,
    state: 'bundled',
  })),
  weight: 16,
  longest: 120,
  createdAt: '2026-03-03T09:00:00.000Z',
  by: 'Wren Ashgrove',
  pickedUpAt: null,
  ...more,
})

export const sheetOf = (more: Partial<HandOffSheet> = {}): HandOffSheet => ({
  order: orderSummaryOf(),
  bundles: [bundleOf(1), bundleOf(2), bundleOf(3)],
  looseCount: 0,
  handOffs: [],
  ...more,
})

const STOCK: Stock = {
  id: id(5, 1),
  thicknessName: '24 ga',
  colorName: 'Kiln 4',
  colorHex: '#8a3b2e',
  painted: true,
  widestStrip: 48,
  longestPiece: 126,
  sheet: {
    metal: 'steel',
    thickness: 0.0276,
    insideRadius: 0.0394,
    kFactor: 0.408,
    density: 0.2836,
    springbackPer90: 0.9,
  },
  kSource: 'handbookHard',
  paintTBend: null,
  alloy: null,
  calibrations: [],
}

const PROFILE: Profile = {
  version: 1,
  legs: [4, 2],
  bends: [{ turn: 90 }],
  hemA: null,
  hemB: null,
  colorSide: 'left',
}

export const lineOf = (mark: string, more: Partial<OrderLine> = {}): OrderLine => ({
  id: id(6, mark.charCodeAt(0)),
  position: 1,
  mark,
  name: `Trim ${mark}`,
  profile: PROFILE,
  stock: STOCK,
  quantity: 3,
  length: 120,
  ends: null,
  hands: null,
  statedGirth: null,
  strip: flatStrip(PROFILE, STOCK.sheet),
  pieceWeight: 5.6,
  price: null,
  noPrice: { code: 'noBook', widest: null },
  bendsOn: ['Long folder'],
  override: null,
  pieces: [],
  ...more,
})

/** An order that came in and waits to be checked. */
export const orderOf = (more: Partial<Order> = {}): Order => ({
  ...orderSummaryOf({ state: 'submitted', progress: NO_PIECES }),
  notes: '',
  lines: [lineOf('A'), lineOf('C')],
  priceCents: null,
  goods: [],
  events: [
    { id: 1, kind: 'submitted', at: '2026-03-02T14:00:00.000Z', by: 'Pell Aster', text: '' },
  ],
  ...more,
})
