import type { Bounds } from '#shared/geometry/bounds'
import { radians } from '#shared/geometry/vector'
import type { Vector } from '#shared/geometry/vector'
import type { Metal } from './clearance'
import { isBoxClear, isLineClear } from './clearance'
import type { Point } from './display-list'
import type { Pen } from './pen'
import type { Candidate } from './placement'
import { Stream } from './placement'
import { TEXT_HEIGHT, textWidth } from './text-box'

/** A level line. */
export interface Bar {
  readonly y: number
  readonly from: number
  readonly to: number
}

/** Where labels may go: inside the frame and off the metal. Pixels, y down. */
export interface LabelSpace {
  readonly metal: Metal
  readonly frame: Bounds
  readonly pen: Pen
  /** A few more lines to keep off. */
  readonly bars?: readonly Bar[]
}

/** True when a box keeps `gap` away from all level lines. */
const isOffBars = (
  bars: readonly Bar[],
  minX: number,
  minY: number,
  maxX: number,
  maxY: number,
  gap: number,
): boolean => {
  for (const { y, from, to } of bars) {
    if (y > minY - gap && y < maxY + gap && to > minX - gap && from < maxX + gap) return false
  }
  return true
}

/**
 * A label in place: its text fills its one box. A leader's one line runs from the text to the part
 * it means; for the three lines of a dimension see `dimensionLines`.
 */
export interface PlacedLabel extends Candidate {
  readonly text: string
  readonly size: number
  /** Lettered edges stand in a circle. */
  readonly radius: number | undefined
  readonly isDimension: boolean
}

export type Line = readonly [Point, Point]

/** Where the text of a label is centred. */
export const middleOfLabel = ({
  boxes: [minX = 0, minY = 0, maxX = 0, maxY = 0],
}: Candidate): Point => ({
  x: (minX + maxX) / 2,
  y: (minY + maxY) / 2,
})

export const linesOfLabel = ({ lines }: Candidate): Line[] => {
  const found: Line[] = []
  for (let at = 0; at < lines.length; at += 4) {
    const [x1 = 0, y1 = 0, x2 = 0, y2 = 0] = lines.slice(at, at + 4)
    found.push([
      { x: x1, y: y1 },
      { x: x2, y: y2 },
    ])
  }
  return found
}

/** Room between text and metal. */
export const TEXT_CLEARANCE = 3

/** True when a box lies in the frame and off the metal. */
export const isFree = (
  { frame, metal, bars }: LabelSpace,
  minX: number,
  minY: number,
  maxX: number,
  maxY: number,
): boolean =>
  minX >= frame.minX &&
  minY >= frame.minY &&
  maxX <= frame.maxX &&
  maxY <= frame.maxY &&
  (bars === undefined || isOffBars(bars, minX, minY, maxX, maxY, TEXT_CLEARANCE + 1)) &&
  isBoxClear(metal, minX, minY, maxX, maxY, TEXT_CLEARANCE)

export const isInFrame = ({ frame }: LabelSpace, x: number, y: number): boolean =>
  x >= frame.minX && x <= frame.maxX && y >= frame.minY && y <= frame.maxY

/** True when a line lies in the frame and keeps `gap` away from the metal. */
export const isLineFree = (
  space: LabelSpace,
  ax: number,
  ay: number,
  bx: number,
  by: number,
  gap: number,
): boolean =>
  isInFrame(space, ax, ay) &&
  isInFrame(space, bx, by) &&
  (space.bars === undefined ||
    isOffBars(
      space.bars,
      Math.min(ax, bx),
      Math.min(ay, by),
      Math.max(ax, bx),
      Math.max(ay, by),
      gap,
    )) &&
  isLineClear(space.metal, ax, ay, bx, by, gap)

/** How far a text reaches from its middle along the unit (ux, uy). */
export const reachOfText = (text: string, size: number, ux: number, uy: number): number =>
  (Math.abs(ux) * textWidth(text, size) + Math.abs(uy) * size * TEXT_HEIGHT) / 2

/** A text centred on (x, y), if it is free there. */
export const textAt = (
  space: LabelSpace,
  text: string,
  size: number,
  x: number,
  y: number,
  lines: readonly number[],
  isDimension: boolean,
  cost: number,
): PlacedLabel | undefined => {
  const halfWidth = textWidth(text, size) / 2
  const halfHeight = (size * TEXT_HEIGHT) / 2
  if (!isFree(space, x - halfWidth, y - halfHeight, x + halfWidth, y + halfHeight)) return undefined
  const boxes = [x - halfWidth, y - halfHeight, x + halfWidth, y + halfHeight]
  return { text, size, radius: undefined, isDimension, boxes, lines, cost }
}

/** A text at the first of several places that is free; the later the dearer. */
export const textPlaces = (
  space: LabelSpace,
  text: string,
  size: number,
  places: readonly Point[],
  cost = 0,
): Stream<PlacedLabel> => {
  let index = 0
  return new Stream(places.length === 0 ? Infinity : cost, (stream) => {
    const place = places[index]
    const here = stream.least
    index += 1
    stream.least = index < places.length ? here + NEXT_PLACE : Infinity
    return place && textAt(space, text, size, place.x, place.y, [], false, here)
  })
}

const NEXT_PLACE = 0.25

/** Directions fanned out from a first one, nearest first: 0, +step, -step, +2 step … to 180. */
export interface Fan {
  /** Degrees from the first. */
  readonly turned: readonly number[]
  readonly cos: readonly number[]
  readonly sin: readonly number[]
}

export const fanOf = (step: number): Fan => {
  const turns = [0]
  for (let turned = step; turned <= 180; turned += step) {
    turns.push(turned)
    if (turned < 180) turns.push(0 - turned)
  }
  return {
    turned: turns.map(Math.abs),
    cos: turns.map((turn) => Math.cos(radians(turn))),
    sin: turns.map((turn) => Math.sin(radians(turn))),
  }
}

/**
 * Tries a place in a direction (unit): undefined where there is no room, `shut` where there is none
 * further out that way either.
 */
type Place = (row: number, ux: number, uy: number, cost: number) => PlacedLabel | undefined | 'shut'

/** True where a box has left the frame on the side that it moves to. */
const isBeyond = (
  { frame }: LabelSpace,
  ux: number,
  uy: number,
  minX: number,
  minY: number,
  maxX: number,
  maxY: number,
): boolean =>
  (ux > 0 ? maxX > frame.maxX : minX < frame.minX) ||
  (uy > 0 ? maxY > frame.maxY : minY < frame.minY)

/** Places in rows, each row over the directions of one fan; of all rows the cheapest place first. */
const rowsOfPlaces = (
  /** What the rows begin with, rising. */
  costs: readonly number[],
  fan: Fan,
  first: Vector,
  widest: number,
  costPerTurn: number,
  place: Place,
): Stream<PlacedLabel> => {
  const length = Math.sqrt(first.x * first.x + first.y * first.y)
  const ux = length === 0 ? 1 : first.x / length
  const uy = length === 0 ? 0 : first.y / length
  /** How many directions of each row have been tried. */
  const tried = costs.map(() => 0)
  /** Directions in which there is no room any more. */
  const shut: boolean[] = []
  let row = 0
  const goOn = (): number => {
    let least = Infinity
    for (let at = 0; at < costs.length; at += 1) {
      const begun = tried[at] ?? 0
      let index = begun
      while (shut[index] === true) index += 1
      tried[at] = index
      const turned = fan.turned[index] ?? Infinity
      const cost = (costs[at] ?? Infinity) + costPerTurn * turned
      if (turned <= widest && cost < least) {
        least = cost
        row = at
      }
      // The rows rise, so behind a row that was not begun nothing is cheaper.
      if (begun === 0) break
    }
    return least
  }
  return new Stream(costs[0] ?? Infinity, (stream) => {
    const index = tried[row] ?? 0
    const c = fan.cos[index] ?? 1
    const s = fan.sin[index] ?? 0
    tried[row] = index + 1
    const placed = place(row, ux * c - uy * s, ux * s + uy * c, stream.least)
    if (placed === 'shut') shut[index] = true
    stream.least = goOn()
    return placed === 'shut' ? undefined : placed
  })
}

interface RingOptions {
  readonly text: string
  readonly size: number
  /** What the label means, on or beside the metal. */
  readonly anchor: Vector
  /** Where it would best stand. */
  readonly first: Vector
  readonly fan: Fan
  /** Distances from the anchor to the near border of the text, rising. */
  readonly gaps: readonly number[]
  /** From this gap on a leader is drawn. */
  readonly leaderFrom: number
  /** How near to the anchor a leader ends; the metal's half weight and a hair unless given. */
  readonly stop?: number
  /** The widest turn from the first direction, degrees. */
  readonly widest: number
  readonly cost: number
  readonly costPerTurn: number
  readonly costPerGap: number
}

/** Places around an anchor, nearer and straighter ones cheaper. */
export const ringOf = (space: LabelSpace, options: RingOptions): Stream<PlacedLabel> => {
  const { text, size, anchor, gaps, fan, first, widest, costPerTurn, leaderFrom } = options
  const stop = options.stop ?? space.metal.half + 2
  const width = textWidth(text, size)
  const height = size * TEXT_HEIGHT
  const costs = gaps.map((gap) => options.cost + options.costPerGap * (gap / space.pen.text))
  const place: Place = (row, ux, uy, cost) => {
    const gap = gaps[row] ?? 0
    const reach = (Math.abs(ux) * width + Math.abs(uy) * height) / 2
    const x = anchor.x + ux * (gap + reach)
    const y = anchor.y + uy * (gap + reach)
    const [minX, minY, maxX, maxY] = [x - width / 2, y - height / 2, x + width / 2, y + height / 2]
    if (isBeyond(space, ux, uy, minX, minY, maxX, maxY)) return 'shut'
    if (!isFree(space, minX, minY, maxX, maxY)) return undefined
    // The leader begins where it leaves the text and ends before the metal.
    const leaves = Math.min(
      ux === 0 ? Infinity : width / 2 / Math.abs(ux),
      uy === 0 ? Infinity : height / 2 / Math.abs(uy),
    )
    const from = Math.max(0, gap + reach - leaves)
    const to = Math.min(stop, from)
    const ax = anchor.x + ux * from
    const ay = anchor.y + uy * from
    const bx = anchor.x + ux * to
    const by = anchor.y + uy * to
    // Even without its leader drawn, nothing may stand between a label and what it means.
    if (!isLineFree(space, ax, ay, bx, by, 1)) return 'shut'
    const boxes = [minX, minY, maxX, maxY]
    const lines = gap >= leaderFrom ? [ax, ay, bx, by] : []
    return { text, size, radius: undefined, isDimension: false, boxes, lines, cost }
  }
  return rowsOfPlaces(costs, fan, first, widest, costPerTurn, place)
}

/** Room between an edge and its letter's circle; from the third on a leader leads there. */
const LETTER_GAPS = [4, 9, 18, 30, 46, 70, 100]

const LETTER_FAN = fanOf(15)

/** The letter of an edge in its circle, close to the edge or tied to it. */
export const letterPlaces = (
  space: LabelSpace,
  letter: string,
  anchor: Vector,
  first: Vector,
  cost = 0,
): Stream<PlacedLabel> => {
  const size = space.pen.text * 0.85
  const radius = size * 0.68
  const { half } = space.metal
  const costs = LETTER_GAPS.map((_, row) => cost + row * 2)
  const place: Place = (row, ux, uy, here) => {
    const away = half + radius + (LETTER_GAPS[row] ?? 0)
    const x = anchor.x + ux * away
    const y = anchor.y + uy * away
    if (isBeyond(space, ux, uy, x - radius, y - radius, x + radius, y + radius)) return 'shut'
    if (!isFree(space, x - radius, y - radius, x + radius, y + radius)) return undefined
    const ax = x - ux * radius
    const ay = y - uy * radius
    const bx = anchor.x + ux * (half + 2)
    const by = anchor.y + uy * (half + 2)
    if (!isLineFree(space, ax, ay, bx, by, 0.5)) return 'shut'
    const boxes = [x - radius, y - radius, x + radius, y + radius]
    const lines = row < 2 ? [] : [ax, ay, bx, by]
    return { text: letter, size, radius, isDimension: false, boxes, lines, cost: here }
  }
  return rowsOfPlaces(costs, LETTER_FAN, first, 180, 1 / 20, place)
}
