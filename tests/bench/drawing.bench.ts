import { sectionFigure } from '#shared/drawing/section-figure'
import { stripFigure } from '#shared/drawing/strip-figure'
import type { Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import { flatStrip } from '#shared/strip/flat-strip'
import { printAngle } from '#shared/units/angle'
import { printSize } from '#shared/units/print-length'
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

const FRAME = {
  width: 390,
  height: 300,
  labels: {
    length: (inches: number) => printSize(inches, 'fraction'),
    angle: (turn: number) => printAngle(180 - Math.abs(turn)),
  },
}

/** A gable whose second leg changes with every call, as under a dragging finger. */
const gable = (index: number): Profile => ({
  version: 1,
  legs: [4, 4 + (index % 32) / 16, 0.75],
  bends: [{ turn: -90 }, { turn: 45 }],
  hemA: null,
  hemB: { style: 'closed', length: 0.5, turn: -1 },
  colorSide: 'left',
})

const coping = (index: number): Profile => ({
  version: 1,
  legs: [0.75, 4, 12 + (index % 32) / 16, 3.5, 0.75],
  bends: [45, -90, -90, 45].map((turn) => ({ turn })),
  hemA: { style: 'closed', length: 0.5, turn: -1 },
  hemB: { style: 'closed', length: 0.5, turn: -1 },
  colorSide: 'left',
})

const THUMBNAIL = { dimensions: false, angles: false, edges: false }

export const benchDrawing = (): BenchRow[] => [
  {
    name: 'section of a gable with all dimensions, 390 x 300',
    unit: 'ms',
    ...sample((index) => sectionFigure(gable(index), SHEET, FRAME), 300),
  },
  {
    name: 'section of a coping with two hems, 390 x 300',
    unit: 'ms',
    ...sample((index) => sectionFigure(coping(index), SHEET, FRAME), 300),
    note: 'hard to label: several layouts are tried',
  },
  {
    name: 'thumbnail of a gable',
    unit: 'ms',
    ...sample(
      (index) =>
        sectionFigure(gable(index), SHEET, { ...FRAME, width: 96, height: 64, show: THUMBNAIL }),
      300,
    ),
  },
  {
    name: 'strip of a coping with running dimensions',
    unit: 'ms',
    ...sample((index) => {
      const profile = coping(index)
      return stripFigure(profile, flatStrip(profile, SHEET), { ...FRAME, mode: 'layout' })
    }, 300),
  },
]
