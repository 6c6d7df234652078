import type { Bounds } from '#shared/geometry/bounds'
import { contains, holds } from '#shared/geometry/bounds'
import type { Segment } from '#shared/geometry/segment'
import { clipToBox, segment } from '#shared/geometry/segment'
import type { Vector } from '#shared/geometry/vector'
import { add, degrees, distance, heading, scale, subtract } from '#shared/geometry/vector'
import type { Metal } from './clearance'
import { isBoxClear, isLineClear } from './clearance'
import type { Point } from './display-list'
import type { Pen } from './pen'
import type { Candidate } from './placement'
import { textBox, textWidth } from './text-box'

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

/** Directions fanned out from a first one, nearest first: 0, +step, -step, +2 step … to ±180. */
export const fan = (first: Vector, step: number): { direction: Vector; turned: number }[] => {
  const base = degrees(Math.atan2(first.y, first.x))
  const directions = [{ direction: heading(base), turned: 0 }]
  for (let turned = step; turned <= 180; turned += step) {
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
  /** The widest turn from the first direction, degrees. */
  readonly widest: number
  readonly cost: number
  readonly costPerTurn: number
  readonly costPerGap: number
}

/** The leader from the border of the text to the anchor, short of the metal by a hair. */
const leaderTo = (space: LabelSpace, at: Vector, box: Bounds, anchor: Vector): Segment => {
  const inside = clipToBox(segment(at, anchor), box)
  const from = inside?.to ?? at
  const back = subtract(from, anchor)
  const length = distance(from, anchor)
  const stop = Math.min(length, space.metal.half + 2)
  return segment(from, length === 0 ? anchor : add(anchor, scale(back, stop / length)))
}

/** Places around an anchor, nearer and straighter ones cheaper. */
export const ringCandidates = (space: LabelSpace, options: RingOptions): PlacedLabel[] => {
  const { text, size, anchor } = options
  const found: PlacedLabel[] = []
  for (const gap of options.gaps) {
    for (const { direction, turned } of fan(options.first, options.step)) {
      if (turned > options.widest) continue
      const at = add(anchor, scale(direction, gap + reachOfText(text, size, direction)))
      const box = textBox(text, size, at)
      if (!isFree(space, box)) continue
      const lines = gap >= options.leaderFrom ? [leaderTo(space, at, box, anchor)] : []
      if (!lines.every((line) => isLineFree(space, line, 1))) continue
      const cost =
        options.cost + options.costPerTurn * turned + options.costPerGap * (gap / space.pen.text)
      found.push({ text, at, size, boxes: [box], lines, cost })
    }
  }
  return found
}

/** The letter of an edge in its circle. */
export const letterCandidates = (
  space: LabelSpace,
  letter: string,
  anchor: Vector,
  first: Vector,
): PlacedLabel[] => {
  const size = space.pen.text * 0.85
  const radius = Math.max(textWidth(letter, size), size) * 0.68
  const found: PlacedLabel[] = []
  for (const gap of [4, 10, 18, 30, 46]) {
    for (const { direction, turned } of fan(first, 30)) {
      const at = add(anchor, scale(direction, space.metal.half + radius + gap))
      const around = {
        minX: at.x - radius,
        minY: at.y - radius,
        maxX: at.x + radius,
        maxY: at.y + radius,
      }
      if (!isFree(space, around)) continue
      const cost = turned / 20 + gap / 4
      found.push({ text: letter, at, size, radius, boxes: [around], lines: [], cost })
    }
  }
  return found
}
