import type { DisplayList } from '#shared/drawing/display-list'
import { endTemplate } from '#shared/drawing/end-template'
import { outlineFigure } from '#shared/drawing/outline-figure'
import { sectionFigure } from '#shared/drawing/section-figure'
import { stripFigure } from '#shared/drawing/strip-figure'
import type { StripLayout } from '#shared/ends/end-layout'
import type { PieceEnds, Side } from '#shared/ends/end.schema'
import { layStrip } from '#shared/ends/lay-strip'
import type { Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import { flatStrip } from '#shared/strip/flat-strip'
import type { Strip } from '#shared/strip/strip.schema'
import { printAngle } from '#shared/units/angle'
import { printRun, printSize } from '#shared/units/print-length'
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

/** A cornice of ten bends and a hem, hard to label at its small lower return. */
const tenBends = (index: number): Profile => ({
  version: 1,
  legs: [0.75, 1.25, 3, 1.5, 6 + (index % 32) / 16, 1.5, 3, 4, 1.25, 2, 0.75],
  bends: [90, -90, 90, -90, -90, 90, -90, -60, -30, 45].map((turn) => ({ turn })),
  hemA: null,
  hemB: { style: 'closed', length: 0.5, turn: -1 },
  colorSide: 'left',
})

/** A rake: tabs at the low end, cut plumb at the high one. */
const ENDS: PieceEnds = {
  left: { kind: 'square', tabs: [{ leg: 5, length: 1 }] },
  right: { kind: 'miter', plane: { plumb: 26.565 }, lay: 0, legs: [], tabs: [] },
  lowEnd: 'left',
}

interface Dressed {
  readonly profile: Profile
  readonly strip: Strip
  readonly layout: StripLayout
}

const dressed = Array.from({ length: 32 }, (_, index): Dressed => {
  const profile = tenBends(index)
  const laid = layStrip({ profile, sheet: SHEET, pieceLength: 126, ends: ENDS })
  if (!laid.ok) throw new Error(`The strip was refused: ${laid.problems[0]?.code}.`)
  return { profile, strip: flatStrip(profile, SHEET), layout: laid.layout }
})

const LABELS = {
  ...FRAME.labels,
  run: (inches: number) => printRun(inches, 'fraction'),
  end: (side: Side) => `${side} end`,
}

/** Section, strip and one outline of the same piece, as a screen or a page shows them. */
const drawAll = (
  index: number,
  width: number,
  heights: { readonly section: number; readonly strip: number; readonly outline: number },
  side?: Side,
): DisplayList[] => {
  const piece = dressed[index % dressed.length]
  if (piece === undefined) return []
  const { profile, strip, layout } = piece
  const frame = (height: number) => ({ width, height, labels: LABELS })
  return [
    sectionFigure(profile, SHEET, frame(heights.section)).display,
    stripFigure(profile, strip, { ...frame(heights.strip), mode: 'layout' }).display,
    outlineFigure(layout, strip, { ...frame(heights.outline), ...(side ? { side } : {}) }).display,
  ]
}

/** So much code is only compiled after a while. */
const LONG = 3000

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
  {
    name: 'section, strip and one end of a piece of 10 bends, phone (390 wide)',
    unit: 'ms',
    ...sample(
      (index) => drawAll(index, 390, { section: 300, strip: 140, outline: 300 }, 'right'),
      LONG,
    ),
    note: 'together',
  },
  {
    name: 'section, strip and whole outline of a piece of 10 bends, page (720 wide)',
    unit: 'ms',
    ...sample((index) => drawAll(index, 720, { section: 370, strip: 140, outline: 190 }), LONG),
    note: 'together',
  },
  {
    name: 'full-size template of an end of 10 bends, on letter paper',
    unit: 'ms',
    ...sample((index) => {
      const piece = dressed[index % dressed.length]
      return (
        piece &&
        endTemplate(piece.layout, piece.strip, {
          side: 'right',
          width: 540,
          height: 640,
          words: { mark: 'F-2047 rake', angle: FRAME.labels.angle, check: (length) => length },
        })
      )
    }, 100),
  },
]
