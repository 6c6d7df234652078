import type { Order, OrderLine } from '#shared/orders/order.schema'
import type { Profile } from '#shared/profile/profile.schema'
import type { Stock } from '#shared/stock/stock.schema'
import {
  emptyDraft,
  PLAIN_LINE,
  type DraftLine,
  type OrderDraft,
} from '@/features/orders/draft/order-draft'

export const RAKE: Profile = {
  version: 1,
  legs: [4, 4, 0.75],
  bends: [{ turn: -90 }, { turn: 45 }],
  hemA: null,
  hemB: null,
  colorSide: 'left',
}

export const STOCK: Stock = {
  id: '7c4b1f0e-2f6d-4c52-9a0c-0d5be1f7a001',
  thicknessName: '24 ga',
  colorName: 'Kiln 4',
  colorHex: '#8a3b2c',
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

export const ORDER_ID = '7c4b1f0e-2f6d-4c52-9a0c-0d5be1f7b001'
export const JOB_ID = '7c4b1f0e-2f6d-4c52-9a0c-0d5be1f7c001'

export const line = (change: Partial<DraftLine> = {}): DraftLine => ({
  ...PLAIN_LINE,
  key: 'line-a',
  mark: 'A',
  name: 'North rake',
  profile: RAKE,
  stockId: STOCK.id,
  quantity: 6,
  length: 120,
  ...change,
})

/** A draft that may be sent on the days before 2026-12-20. */
export const draft = (change: Partial<OrderDraft> = {}): OrderDraft => ({
  ...emptyDraft('key-of-the-draft'),
  neededBy: '2026-12-20',
  lines: [line()],
  ...change,
})

const orderLine = (change: Partial<OrderLine> = {}): OrderLine => ({
  id: '7c4b1f0e-2f6d-4c52-9a0c-0d5be1f7d001',
  position: 1,
  mark: 'A',
  name: 'North rake',
  profile: RAKE,
  stock: STOCK,
  quantity: 6,
  length: 120,
  ends: null,
  hands: null,
  statedGirth: null,
  strip: { girth: 8.75, stripWidth: 8.65, creases: [] },
  pieceWeight: 8.1,
  price: null,
  noPrice: { code: 'noBook', widest: null },
  bendsOn: [],
  override: null,
  pieces: [],
  ...change,
})

export const order = (change: Partial<Order> = {}): Order => ({
  id: ORDER_ID,
  number: 2047,
  company: { id: '7c4b1f0e-2f6d-4c52-9a0c-0d5be1f7e001', name: 'Wicket & Plume Roofing' },
  job: { id: JOB_ID, name: 'Harrow Lane house', pitchRise: 6 },
  orderedBy: 'Maren Quillfeather',
  poNumber: '',
  neededBy: '2026-12-20',
  submittedAt: '2026-12-01T15:00:00.000Z',
  state: 'submitted',
  pieceCount: 6,
  progress: { queued: 0, bent: 0, bundled: 0, pickedUp: 0, scrapped: 0, withdrawn: 0 },
  version: 1,
  notes: '',
  lines: [orderLine()],
  priceCents: null,
  goods: [],
  events: [],
  ...change,
})
