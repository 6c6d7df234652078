import type { LabelFacts } from '#server/features/labels/label-content'
import type { SheetLine } from '#server/features/sheets/sheet-line'
import type { PieceEnds } from '#shared/ends/end.schema'
import type { Profile } from '#shared/profile/profile.schema'
import { getStarter } from '#shared/profile/starters'
import type { Stock } from '#shared/stock/stock.schema'
import { flatStrip } from '#shared/strip/flat-strip'
import { pieceWeight } from '#shared/strip/weight'

/** A painted 24 ga steel of the demo shop. */
export const STOCK: Stock = {
  id: 'c4e9d1b6-0f4d-4f6b-9b1e-5a60c2d73301',
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
  kSource: 'shop',
  paintTBend: null,
  alloy: null,
  calibrations: [],
}

/** Twelve bends up and down, a hem of either kind. */
export const TWELVE_BENDS: Profile = {
  version: 1,
  legs: [1, 2, 1.5, 2, 1, 2.25, 1, 2, 1, 2, 1, 2, 1.3125],
  bends: [90, -45, -90, 90, 45, -90, -30, 90, 60, -90, -90, 30].map((turn) => ({ turn })),
  hemA: { style: 'closed', length: 0.5, turn: 1 },
  hemB: { style: 'open', length: 0.5, gap: 0.125, turn: -1 },
  colorSide: 'left',
}

/** What people may type at most. */
export const LONG_WORDS = {
  mark: 'north rake, back 123',
  name: 'The drip of the north rake over the shed roof between the two dormers, back side',
  job: 'Barn and sheds at the corner of the old mill road, second phase, northern half..',
  company: 'Larkspur, Tamsin, Reed & Daughters Roofing and Sheet Metal Company of the Valley',
  poNumber: 'PO-2026-000000000000000000000000-0000040',
}

export const MITER_AND_LAP: PieceEnds = {
  left: {
    kind: 'miter',
    plane: { plumb: 26.565 },
    lay: 0,
    legs: [],
    tabs: [{ leg: 2, length: 1 }],
  },
  right: { kind: 'lap', side: 'over', length: 4, tabs: [] },
  lowEnd: 'left',
}

export function sheetLine(given: Partial<SheetLine> = {}): SheetLine {
  const profile = given.profile ?? getStarter('gableRake').profile
  const strip = flatStrip(profile, STOCK.sheet)
  const length = given.length ?? 126
  return {
    mark: 'C',
    name: 'Gable, north rake',
    profile,
    stock: STOCK,
    strip,
    length,
    quantity: 6,
    ends: null,
    hands: null,
    statedGirth: null,
    pieceWeight: pieceWeight(strip, STOCK.sheet, length),
    brakeName: 'Long brake',
    orderNumber: 2047,
    poNumber: '1187',
    company: 'Tamsin & Reed',
    job: 'Larkspur barn',
    ...given,
  }
}

export const labelFacts = (given: Partial<LabelFacts> = {}): LabelFacts => ({
  code: 'P7K3M9QX',
  mark: 'C',
  sequence: 3,
  quantity: 6,
  name: 'Gable, north rake',
  profile: getStarter('gableRake').profile,
  stock: STOCK,
  length: 126,
  weight: 9.4,
  hand: null,
  lowEnd: null,
  orderNumber: 2047,
  poNumber: '1187',
  company: 'Tamsin & Reed',
  job: 'Larkspur barn',
  ...given,
})
