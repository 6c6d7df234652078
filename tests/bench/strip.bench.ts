import type { Profile } from '#shared/profile/profile.schema'
import { profileProblems } from '#shared/profile/problems'
import type { Sheet } from '#shared/stock/stock.schema'
import { flatStrip } from '#shared/strip/flat-strip'
import type { BenchRow } from './bench-row'
import { sample } from './bench-row'

const SHEET: Sheet = {
  metal: 'steel',
  thickness: 0.024,
  insideRadius: 0.03,
  kFactor: 0.4074,
  density: 0.2836,
  springbackPer90: 2,
}

/** A profile of ten bends and two hems that crosses nothing; a leg changes with every call. */
const tenBends = (index: number): Profile => ({
  version: 1,
  legs: [0.75, 2, 1, 3, 1, 2 + (index % 16) / 16, 1, 3, 1, 2, 0.75],
  bends: [-30, 90, -90, -45, 45, 90, -90, -30, 30, -40].map((turn) => ({ turn })),
  hemA: { style: 'closed', length: 0.5, turn: -1 },
  hemB: { style: 'open', length: 0.5, gap: 0.125, turn: -1 },
  colorSide: 'left',
})

const TIMES = 2000

export const benchStrip = (): BenchRow[] => [
  {
    name: 'strip of a 10-bend profile with two hems',
    unit: 'ms',
    ...sample((index) => flatStrip(tenBends(index), SHEET), TIMES),
  },
  {
    name: 'problems of the same profile',
    unit: 'ms',
    ...sample((index) => profileProblems(tenBends(index), SHEET), TIMES),
    note: 'crossing with true thickness included',
  },
]
