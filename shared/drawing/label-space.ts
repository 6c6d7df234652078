import type { Bounds } from '#shared/geometry/bounds'
import { boxAround, contains, holds } from '#shared/geometry/bounds'
import type { Segment } from '#shared/geometry/segment'
import { clipToBox, segment } from '#shared/geometry/segment'
import type { Vector } from '#shared/geometry/vector'
import { add, degrees, distance, heading, scale, subtract } from '#shared/geometry/vector'
import type { Metal } from './clearance'
import { isBoxClear, isLineClear } from './clearance'
import type { Point } from './display-list'
import type { Pen } from './pen'
import type { Candidate } from './placement'
import { TEXT_HEIGHT, textBox, textWidth } from './text-box'

/** Where labels may go: inside the frame and off the metal. Pixels, y down. */
export interface LabelSpace {
  readonly metal: Metal
  readonly frame: Bounds
  readonly pen: Pen
}

/** A label in place. `lines[0]` of a leader runs from the text to the part it means. */
export interface PlacedLabel extends Candidate {
  readonly text: string
  readonly at: Point
  readonly size: number
  /** Lettered edges stand in a circle. */
  readonly radius?: number
}

/** Room between text and metal. */
export const TEXT_CLEARANCE = 3

export const isFree = (space: LabelSpace, box: Bounds): boolean =>
  holds(space.frame, box) && isBoxClear(space.metal, box, TEXT_CLEARANCE)

export const isLineFree = (space: LabelSpace, line: Segment, gap: number): boolean =>
  contains(space.frame, line.from) &&
  contains(space.frame, line.to) &&
  isLineClear(space.metal, line, gap)

/** How far a box of text reaches from its middle in a direction (unit). */
export const reachOfText = (text: string, size: number, along: Vector): number => {
  const box = textBox(text, size, { x: 0, y: 0 })
  return Math.abs(along.x) * box.maxX + Math.abs(along.y) * box.maxY
}

/** Directions fanned out from a first one, nearest first: 0, +step, -step, +2 step … to the widest. */
export const fan = (
  first: Vector,
  step: number,
  widest: number,
): { direction: Vector; turned: number }[] => {
  const base = degrees(Math.atan2(first.y, first.x))
  const directions = [{ direction: heading(base), turned: 0 }]
  for (let turned = step; turned <= widest; turned += step) {
    directions.push({ direction: heading(base + turned), turned })
    if (turned < 180) directions.push({ direction: heading(base - turned), turned })
  }
  return directions
}

interface RingOptions {
  readonly text: string
  readonly size: number
  /** What the label means, on or beside the metal. */
  readonly anchor: Vector
  /** Where it would best stand. */
  readonly first: Vector
  readonly step: number
  /** Distances from the anchor to the near border of the text. */
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

/** The leader from the border of the text towards the anchor, up to `stop` from it. */
const leaderTo = (at: Vector, box: Bounds, anchor: Vector, stop: number): Segment => {
  const inside = clipToBox(segment(at, anchor), box)
  const from = inside?.to ?? at
  const back = subtract(from, anchor)
  const length = distance(from, anchor)
  const left = Math.min(length, stop)
  return segment(from, length === 0 ? anchor : add(anchor, scale(back, left / length)))
}

/** Places around an anchor, nearer and straighter ones cheaper. */
export const ringCandidates = (space: LabelSpace, options: RingOptions): PlacedLabel[] => {
  const { text, size, anchor } = options
  const stop = options.stop ?? space.metal.half + 2
  const width = textWidth(text, size)
  const height = size * TEXT_HEIGHT
  const directions = fan(options.first, options.step, options.widest)
  const found: PlacedLabel[] = []
  for (const gap of options.gaps) {
    for (const { direction, turned } of directions) {
      const reach = (Math.abs(direction.x) * width + Math.abs(direction.y) * height) / 2
      const at = add(anchor, scale(direction, gap + reach))
      const box = boxAround(at, width, height)
      if (!isFree(space, box)) continue
      // Even without its leader drawn, nothing may stand between a label and what it means.
      const leader = leaderTo(at, box, anchor, stop)
      if (!isLineFree(space, leader, 1)) continue
      const lines = gap >= options.leaderFrom ? [leader] : []
      const cost =
        options.cost + options.costPerTurn * turned + options.costPerGap * (gap / space.pen.text)
      found.push({ text, at, size, boxes: [box], lines, cost })
    }
  }
  return found
}

/** Room between an edge and its letter's circle; from the third on a leader leads there. */
const LETTER_GAPS = [4, 9, 18, 30, 46, 70, 100]

/** The letter of an edge in its circle, close to the edge or tied to it. */
export const letterCandidates = (
  space: LabelSpace,
  letter: string,
  anchor: Vector,
  first: Vector,
): PlacedLabel[] => {
  const size = space.pen.text * 0.85
  const radius = size * 0.68
  const directions = fan(first, 15, 180)
  const found: PlacedLabel[] = []
  for (const [row, gap] of LETTER_GAPS.entries()) {
    for (const { direction, turned } of directions) {
      const at = add(anchor, scale(direction, space.metal.half + radius + gap))
      const around = boxAround(at, 2 * radius, 2 * radius)
      if (!isFree(space, around)) continue
      const leader = segment(
        add(at, scale(direction, 0 - radius)),
        add(anchor, scale(direction, space.metal.half + 2)),
      )
      if (!isLineFree(space, leader, 0.5)) continue
      const lines = row < 2 ? [] : [leader]
      const cost = turned / 20 + row * 2
      found.push({ text: letter, at, size, radius, boxes: [around], lines, cost })
    }
  }
  return found
}
