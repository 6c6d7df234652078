import type { Vector } from '#shared/geometry/vector'
import { between } from '#shared/geometry/vector'
import { reachOfMetal, runToMetal } from './clearance'
import type { LabelSpace, Line, PlacedLabel } from './label-space'
import { fanOf, isInFrame, isLineFree, reachOfText, ringOf, textAt } from './label-space'
import type { Stream } from './placement'
import { Later } from './placement'

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

/** A number at several parts of a line beside its leg; without lines unless they are given. */
class NumbersAlong implements Stream<PlacedLabel> {
  least: number
  private index = 0

  constructor(
    protected readonly space: LabelSpace,
    protected readonly leg: Measured,
    protected readonly normal: Vector,
    /** From the leg to the middle of the number. */
    private readonly offset: number,
    cost: number,
  ) {
    this.least = cost
  }

  next(): PlacedLabel | undefined {
    return this.nextWith([], false)
  }

  protected nextWith(lines: readonly number[], isDimension: boolean): PlacedLabel | undefined {
    const { space, leg, normal, offset, least } = this
    const along = ALONG[this.index]
    this.index += 1
    this.least = this.index < ALONG.length ? least + ASIDE : Infinity
    if (along === undefined) return undefined
    const aside = offset + (isDimension ? this.pastExtensions(along) : 0)
    const x = leg.from.x + (leg.to.x - leg.from.x) * along + normal.x * aside
    const y = leg.from.y + (leg.to.y - leg.from.y) * along + normal.y * aside
    return textAt(space, leg.text, space.pen.text, x, y, lines, isDimension, least)
  }

  /** How much further out a number stands that reaches over an end of its dimension line. */
  private pastExtensions(along: number): number {
    const { leg, normal, space } = this
    const length = Math.hypot(leg.to.x - leg.from.x, leg.to.y - leg.from.y)
    const half = reachOfText(leg.text, space.pen.text, normal.y, normal.x)
    return Math.min(along, 1 - along) * length > half + 1 ? 0 : OVERSHOOT + 1 - TEXT_GAP
  }
}

/** The same with a dimension line, its extension lines and the slashes that drafters set. */
export class DimensionAt extends NumbersAlong {
  private lines: readonly number[] | undefined

  constructor(
    space: LabelSpace,
    leg: Measured,
    normal: Vector,
    private readonly line: number,
    cost: number,
  ) {
    const reach = reachOfText(leg.text, space.pen.text, normal.x, normal.y)
    super(space, leg, normal, line + reach + TEXT_GAP, cost)
  }

  override next(): PlacedLabel | undefined {
    if (this.lines !== undefined) return this.nextWith(this.lines, true)
    this.lines = this.drawLines()
    return undefined
  }

  /** The lines where there is room for them. What an extension leaves unbridged makes them dearer. */
  private drawLines(): readonly number[] {
    const { space, leg, normal, line } = this
    const fromX = leg.from.x + normal.x * line
    const fromY = leg.from.y + normal.y * line
    const toX = leg.to.x + normal.x * line
    const toY = leg.to.y + normal.y * line
    // The slashes at its ends reach out from the line.
    const isRoom = isLineFree(space, fromX, fromY, toX, toY, TICK + 1)
    const first = isRoom ? this.extensionAt(leg.from) : 0
    const last = first > 0 ? this.extensionAt(leg.to) : 0
    if (last === 0) {
      this.least = Infinity
      return []
    }
    this.least += (2 * this.wholeExtension() - first - last) * 0.06
    // Past its slashes, so that nothing else comes to stand on them.
    const along = unit(toX - fromX, toY - fromY)
    const past = TICK * Math.SQRT1_2
    const lines = [
      fromX - along.x * past,
      fromY - along.y * past,
      toX + along.x * past,
      toY + along.y * past,
    ]
    const tip = line + OVERSHOOT
    for (const end of [0, 1]) {
      const foot = end === 0 ? leg.from : leg.to
      const back = tip - (end === 0 ? first : last)
      lines.push(foot.x + normal.x * tip, foot.y + normal.y * tip)
      lines.push(foot.x + normal.x * back, foot.y + normal.y * back)
    }
    return lines
  }

  private wholeExtension(): number {
    return Math.max(OVERSHOOT, this.line + OVERSHOOT - this.space.metal.half - EXTENSION_GAP)
  }

  /**
   * How long the line is that leads from an end of the dimension back towards its leg: it stops
   * short of the first metal on its way. 0 where there is no room for one.
   */
  private extensionAt(foot: Vector): number {
    const { space, normal, line } = this
    const x = foot.x + normal.x * (line + OVERSHOOT)
    const y = foot.y + normal.y * (line + OVERSHOOT)
    if (!isInFrame(space, x, y)) return 0
    const free = runToMetal(space.metal, x, y, -normal.x, -normal.y, EXTENSION_GAP)
    const run = Math.min(this.wholeExtension(), free)
    return run < OVERSHOOT ? 0 : run
  }
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
    return new Later(cost, () => placesBeside(space, leg, normal, cost, ways.lines))
  })
  const leaders = new Later(LEADER, () => [
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
  const offset = half + reachOfText(leg.text, size, normal.x, normal.y) + 4
  const numbers = new NumbersAlong(space, leg, normal, offset, cost + (withLines ? BARE : 0))
  if (!withLines) return [numbers]
  const beside = half + size * 0.8 + 2
  const linesFrom = (begin: number) =>
    ROWS.map((row) => {
      const line = begin + row * size * 1.6
      return new DimensionAt(space, leg, normal, line, cost + ((line - beside) / size) * 0.5)
    })
  const reach = reachOfMetal(space.metal, mid.x, mid.y, normal.x, normal.y)
  return [
    ...linesFrom(beside),
    ...(reach > 0 ? [new Later(cost + (reach / size) * 0.5, () => linesFrom(beside + reach))] : []),
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
