import { contains } from '#shared/geometry/bounds'
import type { Segment } from '#shared/geometry/segment'
import { segment } from '#shared/geometry/segment'
import type { Vector } from '#shared/geometry/vector'
import { add, between, distance, dot, leftOf, scale, subtract } from '#shared/geometry/vector'
import { runToMetal } from './clearance'
import type { LabelSpace, PlacedLabel } from './label-space'
import { isFree, isLineFree, reachOfText, ringCandidates } from './label-space'
import { textBox } from './text-box'

/** A leg as a dimension sees it, in pixels: its middle line out to the ends of its dimension. */
export interface Measured {
  readonly text: string
  readonly from: Vector
  readonly to: Vector
}

/** How far the extension lines run past the dimension line. */
const OVERSHOOT = 4

/** With so many places around its middle, a leg needs no leader to its quarters. */
const ENOUGH_AROUND = 30

/** Half the length of the slash at the end of a dimension line. */
const TICK = 3.5

/** Room between the metal and an extension line. */
const EXTENSION_GAP = 3

const unit = (v: Vector): Vector => {
  const length = Math.hypot(v.x, v.y)
  return length === 0 ? { x: 1, y: 0 } : scale(v, 1 / length)
}

/** How far the drawing reaches beyond the leg's line in a direction. */
const reachOfFigure = (space: LabelSpace, from: Vector, normal: Vector): number =>
  Math.max(
    0,
    ...space.metal.chords.flatMap((chord) => [
      dot(subtract(chord.from, from), normal),
      dot(subtract(chord.to, from), normal),
    ]),
  )

/**
 * The line that leads from the end of a dimension back towards its leg. It stops short of the
 * first metal on its way; `unbridged` is what is left to the leg.
 */
const extension = (
  space: LabelSpace,
  foot: Vector,
  normal: Vector,
  offset: number,
): { readonly line: Segment; readonly unbridged: number } | undefined => {
  const tip = add(foot, scale(normal, offset + OVERSHOOT))
  if (!contains(space.frame, tip)) return undefined
  const whole = offset + OVERSHOOT - space.metal.half - EXTENSION_GAP
  const run = Math.min(whole, runToMetal(space.metal, tip, scale(normal, -1), EXTENSION_GAP))
  if (run < OVERSHOOT) return undefined
  return { line: segment(tip, add(tip, scale(normal, -run))), unbridged: whole - run }
}

/** A slash at either end of a dimension line, as drafters set it. */
const ticks = (line: Segment): Segment[] => {
  const along = unit(subtract(line.to, line.from))
  const slant = scale(unit(add(along, leftOf(along))), TICK)
  return [line.from, line.to].map((end) => segment(subtract(end, slant), add(end, slant)))
}

/** Parts of the dimension line over which its number may stand, best first. */
const ALONG = [0.5, 0.3, 0.7, 0.1, 0.9]

const dimensionOn = (
  space: LabelSpace,
  leg: Measured,
  normal: Vector,
  offset: number,
  cost: number,
): PlacedLabel[] => {
  const from = add(leg.from, scale(normal, offset))
  const to = add(leg.to, scale(normal, offset))
  const line = segment(from, to)
  // The slashes at its ends reach out from the line.
  if (!isLineFree(space, line, TICK + 1)) return []
  const ends = [leg.from, leg.to].map((foot) => extension(space, foot, normal, offset))
  const [first, second] = ends
  if (first === undefined || second === undefined) return []
  const unbridged = Math.max(0, first.unbridged) + Math.max(0, second.unbridged)
  const size = space.pen.text
  const aside = reachOfText(leg.text, size, normal) + 3
  const lines = [line, first.line, second.line, ...ticks(line)]
  return ALONG.flatMap((along, index) => {
    const at = add(between(from, to, along), scale(normal, aside))
    const box = textBox(leg.text, size, at)
    if (!isFree(space, box)) return []
    const total = cost + index * 0.8 + unbridged * 0.06
    return { text: leg.text, at, size, boxes: [box], lines, cost: total }
  })
}

/**
 * Ways to dimension a leg: a dimension line on either side, from beside the metal to beyond the
 * whole figure; the bare number beside the leg; a number with a leader.
 */
export const dimensionCandidates = (
  space: LabelSpace,
  leg: Measured,
  middle: Vector,
  ways: { readonly lines: boolean; readonly leaders: boolean },
): PlacedLabel[] => {
  const size = space.pen.text
  const along = unit(subtract(leg.to, leg.from))
  const mid = between(leg.from, leg.to, 0.5)
  const found: PlacedLabel[] = []
  for (const normal of [leftOf(along), scale(leftOf(along), -1)]) {
    const beside = space.metal.half + size * 0.8 + 2
    const beyond = reachOfFigure(space, mid, normal) + beside
    const face = add(mid, scale(normal, space.metal.half + 2))
    const enclosed = runToMetal(space.metal, face, normal, 0) < Infinity ? 5 : 0
    const inward = dot(subtract(middle, mid), normal) > 1 ? 1.5 : 0
    const offsets = new Set([
      ...[0, 1, 2, 3].map((row) => beside + row * size * 1.6),
      ...[0, 1, 2, 3].map((row) => beyond + row * size * 1.6),
    ])
    if (ways.lines) {
      for (const offset of offsets) {
        const far = ((offset - beside) / size) * 0.5
        found.push(...dimensionOn(space, leg, normal, offset, far + enclosed + inward))
      }
    }
    found.push(...bareNumbers(space, leg, normal, (ways.lines ? 8 : 0) + enclosed + inward))
  }
  if (!ways.leaders) return found
  const first = scale(unit(subtract(mid, middle)), distance(mid, middle) > 1 ? 1 : -1)
  for (const part of [0.5, 0.25, 0.75]) {
    const around = ringCandidates(space, {
      text: leg.text,
      size,
      anchor: between(leg.from, leg.to, part),
      first,
      step: 18,
      gaps: [1, 2, 3, 4.5, 6, 8, 11].map((rows) => space.metal.half + rows * size),
      leaderFrom: 0,
      widest: 180,
      cost: part === 0.5 ? 14 : 16,
      costPerTurn: 0.01,
      costPerGap: 1,
    })
    found.push(...around)
    if (around.length >= ENOUGH_AROUND) break
  }
  return found
}

const bareNumbers = (
  space: LabelSpace,
  leg: Measured,
  normal: Vector,
  cost: number,
): PlacedLabel[] => {
  const size = space.pen.text
  const aside = space.metal.half + reachOfText(leg.text, size, normal) + 4
  return ALONG.flatMap((part, index) => {
    const at = add(between(leg.from, leg.to, part), scale(normal, aside))
    const box = textBox(leg.text, size, at)
    if (!isFree(space, box)) return []
    return { text: leg.text, at, size, boxes: [box], lines: [], cost: cost + index * 0.8 }
  })
}
