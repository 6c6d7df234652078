import { closeEnds } from '#shared/ends/close-ends'
import type { End } from '#shared/ends/end.schema'
import { layStrip } from '#shared/ends/lay-strip'
import { matchingLay } from '#shared/ends/run-frame'
import type { Profile } from '#shared/profile/profile.schema'
import type { FoldingSheet } from '#shared/strip/flat-parts'
import type { BenchRow } from './bench-row'
import { sample } from './bench-row'

const SHEET: FoldingSheet = { thickness: 0.024, insideRadius: 0.03, kFactor: 0.4074 }

/** The pitch changes with every call. */
const cornerAt = (index: number) => ({ slopeIn: 10 + (index % 20), slopeOut: 0, plan: -90 })

const miter = (index: number, lay: number): End => ({
  kind: 'miter',
  plane: { corner: cornerAt(index) },
  lay,
  legs: [],
  tabs: [{ leg: 2, length: 1 }],
})

const GABLE: Profile = {
  version: 1,
  legs: [4, 6, 0.75],
  bends: [{ turn: -90 }, { turn: 40 }],
  hemA: null,
  hemB: { style: 'closed', length: 0.5, turn: -1 },
  colorSide: 'left',
}

const TEN_BENDS: Profile = {
  version: 1,
  legs: [0.75, 2, 1, 3, 1, 2, 1, 3, 1, 2, 0.75],
  bends: [-30, 90, -90, -45, 45, 90, -90, -30, 30, -40].map((turn) => ({ turn })),
  hemA: { style: 'closed', length: 0.5, turn: -1 },
  hemB: { style: 'open', length: 0.5, gap: 0.125, turn: -1 },
  colorSide: 'left',
}

const laid = (profile: Profile) => (index: number) =>
  layStrip({
    profile,
    sheet: SHEET,
    pieceLength: 120,
    ends: { left: miter(index + 1, 0), right: miter(index, 0), lowEnd: 'left' },
  })

const closed = (profile: Profile) => (index: number) =>
  closeEnds(
    { profile, sheet: SHEET, end: miter(index, 0), side: 'right' },
    {
      profile,
      sheet: SHEET,
      end: miter(index, matchingLay(cornerAt(index), 'right', 0)),
      side: 'left',
    },
  )

const TIMES = 5000

/** The aim: a mitered outline under 0.2 ms in the median. */
export const benchEnds = (): BenchRow[] => [
  {
    name: 'outline mitered at both ends, 2 bends and a hem',
    unit: 'ms',
    ...sample(laid(GABLE), TIMES),
    note: 'aim 0.2 in the median; marks, tabs and cut-aways included',
  },
  {
    name: 'the same with 10 bends and two hems',
    unit: 'ms',
    ...sample(laid(TEN_BENDS), TIMES),
  },
  {
    name: 'how two 10-bend ends close in their corner',
    unit: 'ms',
    ...sample(closed(TEN_BENDS), TIMES),
  },
]
