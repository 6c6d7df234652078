import type { Vector } from '#shared/geometry/vector'
import { between } from '#shared/geometry/vector'
import { reachOfMetal, runToMetal } from './clearance'
import type { LabelSpace, Line, PlacedLabel } from './label-space'
import { fanOf, isInFrame, isLineFree, reachOfText, ringOf, textAt } from './label-space'
import { later, Stream } from './placement'

/** A leg as a dimension sees it, in pixels: its middle line out to the ends of its dimension. */
export interface Measured {
  readonly text: string
  readonly from: Vector
  readonly to: Vector
}

/** How far the extension lines run past the dimension line. */
const OVERSHOOT = 4

/** Room between a dimension line and its number. */
const TEXT_GAP = 3

/** Half the length of the slash at the end of a dimension line. */
const TICK = 3.5

/** Room between the metal and an extension line. */
const EXTENSION_GAP = 3

/** Parts of the dimension line over which its number may stand, best first. */
const ALONG = [0.5, 0.3, 0.7, 0.1, 0.9]

/** What the next best part costs. */
const ASIDE = 0.8

/** What it costs to stand on the side of the figure's middle, or where metal encloses the place. */
const INWARD = 1.5
const ENCLOSED = 5

/** What a number without lines costs, and what one with a leader. */
const BARE = 8
const LEADER = 14

/**
 * What is drawn of a dimension's three lines: the dimension line between its slashes, the slashes
 * as drafters set them, the two extension lines.
 */
export const dimensionLines = ([line, ...extensions]: readonly Line[]): Line[] => {
  if (line === undefined) return []
  const [from, to] = line
  const along = unit(to.x - from.x, to.y - from.y)
  const past = TICK * Math.SQRT1_2
  const ends = [
    { x: from.x + along.x * past, y: from.y + along.y * past },
    { x: to.x - along.x * past, y: to.y - along.y * past },
  ] as const
  const slant = unit(along.x - along.y, along.y + along.x)
  const ticks = ends.map(({ x, y }): Line => [
    { x: x - slant.x * TICK, y: y - slant.y * TICK },
    { x: x + slant.x * TICK, y: y + slant.y * TICK },
  ])
  return [ends, ...extensions, ...ticks]
}

const unit = (x: number, y: number): Vector => {
  const length = Math.hypot(x, y)
  return length === 0 ? { x: 1, y: 0 } : { x: x / length, y: y / length }
}

/** A line beside a leg that numbers may stand on. */
interface Beside {
  readonly space: LabelSpace
  readonly leg: Measured
  /** Away from the leg (unit). */
  readonly normal: Vector
}

/** The number `offset` off its leg, at a part of its length. */
const numberAt = (
  { space, leg, normal }: Beside,
  along: number,
  offset: number,
  lines: readonly number[],
  isDimension: boolean,
  cost: number,
): PlacedLabel | undefined =>
  textAt(
    space,
    leg.text,
    space.pen.text,
    leg.from.x + (leg.to.x - leg.from.x) * along + normal.x * offset,
    leg.from.y + (leg.to.y - leg.from.y) * along + normal.y * offset,
    lines,
    isDimension,
    cost,
  )

/** The number beside the leg at several parts of its length, without lines. */
const bareNumbers = (beside: Beside, cost: number): Stream<PlacedLabel> => {
  const { space, leg, normal } = beside
  const reach = reachOfText(leg.text, space.pen.text, normal.x, normal.y)
  const offset = space.metal.half + reach + 4
  let index = 0
  return new Stream(cost, (stream) => {
    const along = ALONG[index]
    const here = stream.least
    index += 1
    stream.least = index < ALONG.length ? here + ASIDE : Infinity
    return along === undefined ? undefined : numberAt(beside, along, offset, [], false, here)
  })
}

/** How much further out a number stands that reaches over an end of its dimension line. */
const pastExtensions = ({ space, leg, normal }: Beside, along: number): number => {
  const dx = leg.to.x - leg.from.x
  const dy = leg.to.y - leg.from.y
  const half = reachOfText(leg.text, space.pen.text, normal.y, normal.x)
  const room = Math.min(along, 1 - along) * Math.sqrt(dx * dx + dy * dy)
  return room > half + 1 ? 0 : OVERSHOOT + 1 - TEXT_GAP
}

/** The whole way of an extension line back to its leg. */
const wholeExtension = (space: LabelSpace, line: number): number =>
  Math.max(OVERSHOOT, line + OVERSHOOT - space.metal.half - EXTENSION_GAP)

/**
 * How long the line is that leads from an end of the dimension back towards its leg: it stops short
 * of the first metal on its way. 0 where there is no room for one.
 */
const extensionAt = ({ space, normal }: Beside, foot: Vector, line: number): number => {
  const x = foot.x + normal.x * (line + OVERSHOOT)
  const y = foot.y + normal.y * (line + OVERSHOOT)
  if (!isInFrame(space, x, y)) return 0
  const free = runToMetal(space.metal, x, y, -normal.x, -normal.y, EXTENSION_GAP)
  const run = Math.min(wholeExtension(space, line), free)
  return run < OVERSHOOT ? 0 : run
}

/** The three lines of a dimension, and how much of its extensions is missing; undefined without room. */
const linesAt = (
  beside: Beside,
  line: number,
): { readonly lines: readonly number[]; readonly unbridged: number } | undefined => {
  const { space, leg, normal } = beside
  const fromX = leg.from.x + normal.x * line
  const fromY = leg.from.y + normal.y * line
  const toX = leg.to.x + normal.x * line
  const toY = leg.to.y + normal.y * line
  // The slashes at its ends reach out from the line.
  if (!isLineFree(space, fromX, fromY, toX, toY, TICK + 1)) return undefined
  const first = extensionAt(beside, leg.from, line)
  const last = first > 0 ? extensionAt(beside, leg.to, line) : 0
  if (last === 0) return undefined
  // Past its slashes, so that nothing else comes to stand on them.
  const along = unit(toX - fromX, toY - fromY)
  const past = TICK * Math.SQRT1_2
  const tip = line + OVERSHOOT
  return {
    unbridged: 2 * wholeExtension(space, line) - first - last,
    lines: [
      fromX - along.x * past,
      fromY - along.y * past,
      toX + along.x * past,
      toY + along.y * past,
      leg.from.x + normal.x * tip,
      leg.from.y + normal.y * tip,
      leg.from.x + normal.x * (tip - first),
      leg.from.y + normal.y * (tip - first),
      leg.to.x + normal.x * tip,
      leg.to.y + normal.y * tip,
      leg.to.x + normal.x * (tip - last),
      leg.to.y + normal.y * (tip - last),
    ],
  }
}

/**
 * A dimension line `line` off what it measures, with its number at several parts of it. What its
 * extension lines leave unbridged makes it dearer.
 */
export const dimensionAt = (
  space: LabelSpace,
  leg: Measured,
  normal: Vector,
  line: number,
  cost: number,
): Stream<PlacedLabel> => {
  const beside = { space, leg, normal }
  let drawn: ReturnType<typeof linesAt>
  let index = -1
  return new Stream(cost, (stream) => {
    const here = stream.least
    if (index < 0) {
      drawn = linesAt(beside, line)
      stream.least = drawn === undefined ? Infinity : here + drawn.unbridged * 0.06
      index = 0
      return undefined
    }
    const along = ALONG[index]
    index += 1
    stream.least = index < ALONG.length ? here + ASIDE : Infinity
    if (along === undefined || drawn === undefined) return undefined
    const reach = reachOfText(leg.text, space.pen.text, normal.x, normal.y)
    const offset = line + reach + TEXT_GAP + pastExtensions(beside, along)
    return numberAt(beside, along, offset, drawn.lines, true, here)
  })
}

/**
 * Ways to dimension a leg: a dimension line on either side, from beside the metal to beyond the
 * whole figure; the bare number beside the leg; a number with a leader.
 */
export const dimensionPlaces = (
  space: LabelSpace,
  leg: Measured,
  middle: Vector,
  ways: { readonly lines: boolean },
): Stream<PlacedLabel>[] => {
  const along = unit(leg.to.x - leg.from.x, leg.to.y - leg.from.y)
  const mid = between(leg.from, leg.to, 0.5)
  const out = { x: mid.x - middle.x, y: mid.y - middle.y }
  // Out from the figure; where the leg lies in its middle there is no out.
  const away = Math.hypot(out.x, out.y) > 1 ? out : { x: 0 - out.x, y: 0 - out.y }
  const sides = [
    { x: 0 - along.y, y: along.x },
    { x: along.y, y: 0 - along.x },
  ].map((normal) => {
    const isInward = (middle.x - mid.x) * normal.x + (middle.y - mid.y) * normal.y > 1
    const cost = isInward ? INWARD : 0
    return later(cost, () => placesBeside(space, leg, normal, cost, ways.lines))
  })
  const leaders = later(LEADER, () => [
    leaderPlaces(space, leg, 0.5, away, LEADER),
    leaderPlaces(space, leg, 0.25, away, LEADER + 2),
    leaderPlaces(space, leg, 0.75, away, LEADER + 2),
  ])
  return [...sides, leaders]
}

const ROWS = [0, 1, 2, 3]

const placesBeside = (
  space: LabelSpace,
  leg: Measured,
  normal: Vector,
  side: number,
  withLines: boolean,
): Stream<PlacedLabel>[] => {
  const size = space.pen.text
  const { half } = space.metal
  const mid = between(leg.from, leg.to, 0.5)
  const face = { x: mid.x + normal.x * (half + 2), y: mid.y + normal.y * (half + 2) }
  const isEnclosed = runToMetal(space.metal, face.x, face.y, normal.x, normal.y, 0) < Infinity
  const cost = side + (isEnclosed ? ENCLOSED : 0)
  const numbers = bareNumbers({ space, leg, normal }, cost + (withLines ? BARE : 0))
  if (!withLines) return [numbers]
  const beside = half + size * 0.8 + 2
  const linesFrom = (begin: number) =>
    ROWS.map((row) => {
      const line = begin + row * size * 1.6
      return dimensionAt(space, leg, normal, line, cost + ((line - beside) / size) * 0.5)
    })
  const reach = reachOfMetal(space.metal, mid.x, mid.y, normal.x, normal.y)
  return [
    ...linesFrom(beside),
    ...(reach > 0 ? [later(cost + (reach / size) * 0.5, () => linesFrom(beside + reach))] : []),
    numbers,
  ]
}

const LEADER_FAN = fanOf(18)

const LEADER_ROWS = [1, 2, 3, 4.5, 6, 8, 11]

const leaderPlaces = (
  space: LabelSpace,
  leg: Measured,
  part: number,
  first: Vector,
  cost: number,
): Stream<PlacedLabel> =>
  ringOf(space, {
    text: leg.text,
    size: space.pen.text,
    anchor: between(leg.from, leg.to, part),
    first,
    fan: LEADER_FAN,
    gaps: LEADER_ROWS.map((rows) => space.metal.half + rows * space.pen.text),
    leaderFrom: 0,
    widest: 180,
    cost,
    costPerTurn: 0.01,
    costPerGap: 1,
  })
