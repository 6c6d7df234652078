import type { PlanCheck, Section } from '#shared/bend-plan/plan.schema'
import type { PlanRequest } from '#shared/bend-plan/planner'
import { rest, slide, swing, turned, worst } from './naive-geometry'
import type { Line, Point, Verdict } from './naive-geometry'

/**
 * The tests of one fold written once more from the text of the model, sharing nothing with the planner:
 * the piece is walked from edge A to B as it lies with the bends made so far, set down in the brake,
 * and moved in small steps.
 */

interface Bend {
  readonly turn: number
  readonly hem: { readonly lip: number; readonly gap: number; readonly edge: 'A' | 'B' } | null
}

interface Row {
  readonly legs: readonly number[]
  readonly bends: readonly Bend[]
}

/** Legs and bends from A to B, lips and hems among them; bends of no turn left out. */
export const rowOf = ({ legs, turns, hemA, hemB }: Section): Row => {
  const row: { legs: number[]; bends: Bend[] } = { legs: [...legs.slice(0, 1)], bends: [] }
  turns.forEach((turn, i) => {
    const leg = legs[i + 1] ?? NaN
    if (Math.abs(turn) < 1e-6) {
      row.legs.push((row.legs.pop() ?? NaN) + leg)
      return
    }
    row.bends.push({ turn, hem: null })
    row.legs.push(leg)
  })
  if (hemA !== null) {
    row.legs.unshift(hemA.lip)
    row.bends.unshift({ turn: 180 * hemA.turn, hem: { ...hemA, edge: 'A' } })
  }
  if (hemB !== null) {
    row.legs.push(hemB.lip)
    row.bends.push({ turn: 180 * hemB.turn, hem: { ...hemB, edge: 'B' } })
  }
  return row
}

export interface State {
  readonly made: ReadonlySet<number>
  readonly bend: number
  readonly leftUp: boolean
  readonly aBack: boolean
}

/** Both sides of the bend line in the brake: the front to the right and swinging up. */
const setDown = (row: Row, thickness: number, { made, bend, leftUp, aBack }: State) => {
  const points: Point[] = []
  let at: Point = { x: 0, y: 0 }
  let heading = 0
  let line = { at, heading, place: -1 }
  const go = (length: number) => {
    at = {
      x: at.x + length * Math.cos((heading * Math.PI) / 180),
      y: at.y + length * Math.sin((heading * Math.PI) / 180),
    }
  }
  const isFlatHem = (index: number) => {
    const hem = made.has(index) ? row.bends[index]?.hem : undefined
    return hem !== null && hem !== undefined && hem.gap <= 0.06
  }
  const isHiddenLip = (leg: number) =>
    (leg === 0 && row.bends[0]?.hem?.edge === 'A' && isFlatHem(0)) ||
    (leg === row.legs.length - 1 && row.bends.at(-1)?.hem?.edge === 'B' && isFlatHem(leg - 1))
  if (!isHiddenLip(0)) points.push(at)
  row.legs.forEach((leg, i) => {
    if (!isHiddenLip(i)) go(leg)
    const next = row.bends[i]
    if (next === undefined) {
      if (!isHiddenLip(i)) points.push(at)
      return
    }
    if (i === bend) line = { at, heading, place: points.length }
    if (i !== bend && !made.has(i)) return
    points.push(at)
    if (i === bend || isFlatHem(i)) return
    if (next.hem === null) {
      heading += next.turn
      return
    }
    heading += next.turn / 2
    go(next.hem.gap + thickness)
    points.push(at)
    heading += next.turn / 2
  })
  const isUp = (row.bends[bend]?.turn ?? NaN) > 0 === leftUp
  const toBrake = (p: Point): Point => {
    const flat = turned({ x: p.x - line.at.x, y: p.y - line.at.y }, (-line.heading * Math.PI) / 180)
    return { x: flat.x * (aBack ? 1 : -1), y: flat.y * (leftUp ? 1 : -1) * (isUp ? 1 : -1) }
  }
  const towardsA = points
    .slice(0, line.place + 1)
    .toReversed()
    .map(toBrake)
  const towardsB = points.slice(line.place).map(toBrake)
  return aBack
    ? { rear: towardsA, front: towardsB, isUp }
    : { rear: towardsB, front: towardsA, isUp }
}

const lengthOf = (a: Point | undefined, b: Point | undefined): number =>
  Math.hypot((b?.x ?? NaN) - (a?.x ?? NaN), (b?.y ?? NaN) - (a?.y ?? NaN))

const SLACK = 1e-9

/** The line without its first inches; undefined where nothing is left. */
const without = (line: Line, inches: number): Line | undefined => {
  const [a, b, ...more] = line
  if (a === undefined || b === undefined) return undefined
  const run = lengthOf(a, b)
  if (run <= inches + SLACK) return without([b, ...more], inches - run)
  const part = inches / run
  return [{ x: a.x + (b.x - a.x) * part, y: a.y + (b.y - a.y) * part }, b, ...more]
}

const within = (value: number, least: number, most: number): Verdict =>
  value >= least - SLACK && value <= most + SLACK ? 'clear' : 'meets'

/** The rearmost place within half an inch of the sheet, by looking every thousandth of an inch. */
const rearmost = (rear: Line): number => {
  let least = 0
  rear.forEach((b, i) => {
    const a = rear[i - 1]
    if (a === undefined) return
    const steps = Math.ceil(lengthOf(a, b) * 1000)
    for (let step = 0; step <= steps; step++) {
      const t = step / steps
      if (Math.abs(a.y + (b.y - a.y) * t) <= 0.5 + SLACK)
        least = Math.min(least, a.x + (b.x - a.x) * t)
    }
  })
  return 0 - least
}

const nearLimit = (value: number, limit: number): boolean => Math.abs(value - limit) < 0.003

interface Tools {
  readonly inner: Line
  readonly outer: Line
}

/** Forward a little, the clamp opens, out. */
const drawOut = (
  rear: Line,
  front: Line | undefined,
  { inner, outer }: Tools,
  opening: number,
  clearance: number,
): Verdict => {
  const height = Math.max(...rear.map(({ y }) => y), 0)
  const depth = Math.max(...rear.map(({ y }) => 0 - y), 0)
  if (height + depth > opening + SLACK) return 'meets'
  const left = Math.min(...rear.map(({ x }) => x))
  const parts = front === undefined ? [rear] : [rear, front]
  const moved = (tool: Line, x: number, y: number, dx: number, dy: number): Verdict =>
    worst(
      parts.map((moving) =>
        slide({ moving, still: tool, isStillSolid: true, clearance }, { x, y }, dx, dy),
      ),
    )
  /** The best that any slide could do: clear, perhaps, or not. */
  let best: Verdict = 'meets'
  for (const s of [0, 0.25, 0.5, 1, 2, 4]) {
    const start = worst([moved(inner, 0, 0, s, 0), moved(outer, 0, 0, s, 0)])
    if (start === 'meets') return best
    const on = Math.max(0, 2 - left - s)
    const open = worst([
      start,
      // Seen from the tool.
      moved(inner, s, 0, 0, 0 - height),
      moved(outer, s, 0, 0, depth),
      moved(inner, s, 0 - height, on, 0),
      moved(outer, s, depth, on, 0),
    ])
    if (open === 'clear') return 'clear'
    if (open === 'unsure') best = 'unsure'
  }
  return best
}

/** Every test of the fold; those of tools are left out where the brake does not fold that way. */
export const naiveFold = (request: PlanRequest, state: State): Map<PlanCheck, Verdict> => {
  const { brake, sheet, section } = request
  const row = rowOf(section)
  const own = row.bends[state.bend]
  if (own === undefined) throw new Error(`No bend ${state.bend}`)
  const { rear, front, isUp } = setDown(row, sheet.thickness, state)
  const theta =
    own.hem === null ? Math.abs(own.turn) * (1 + sheet.springbackPer90 / 90) : brake.hemAngle
  const found = new Map<PlanCheck, Verdict>()
  const say = (check: PlanCheck, isFine: boolean) => found.set(check, isFine ? 'clear' : 'meets')

  say('direction', isUp || brake.down !== null)
  say('hemSide', own.hem === null || (own.hem.edge === 'B') === state.aBack)
  const hasUnmadeHem = row.bends.some(({ hem }, i) => hem !== null && !state.made.has(i))
  say('policy', !(brake.hemsFirst && own.hem === null && hasUnmadeHem))
  if (own.hem === null) found.set('angle', within(theta, 0, brake.maxFold))
  else {
    const rise = own.hem.lip * Math.sin((brake.hemAngle * Math.PI) / 180)
    found.set(
      'angle',
      worst([within(own.hem.lip, brake.hemMin, brake.hemMax), within(rise, 0, brake.opening)]),
    )
  }
  const least = own.hem === null ? brake.minFlange : brake.hemMin
  found.set('flange', within(lengthOf(front[0], front[1]), least, Infinity))
  found.set('clamp', within(lengthOf(rear[0], rear[1]), brake.minClamp, Infinity))
  found.set('throat', within(0 - Math.min(...rear.map(({ x }) => x)), 0, brake.throat))
  if (brake.gauge === null) say('gauge', true)
  else {
    const stop = rearmost(rear)
    const isNear = nearLimit(stop, brake.gauge.min) || nearLimit(stop, brake.gauge.max)
    found.set('gauge', isNear ? 'unsure' : within(stop, brake.gauge.min, brake.gauge.max))
  }
  found.set(
    'meetsItself',
    swing({ moving: front, still: rear, clearance: sheet.thickness, skipFirst: true }, theta),
  )

  const set = isUp ? brake.up : brake.down
  if (set === null) return found
  const clearance = sheet.thickness / 2 + brake.safety
  const e = clearance + 0.001
  const shifted = (polygon: readonly (readonly [number, number])[], dx: number, dy: number): Line =>
    polygon.map(([x, y]) => ({ x: x + dx, y: y + dy }))
  const inner = shifted(set.inner, 0 - e, e)
  const outer = shifted(set.outer, 0, 0 - e)
  const apron = shifted(set.apron, 0, 0 - e)
  const beyondNose = without(front, brake.noseZone)

  found.set(
    'rearMeetsTool',
    worst(
      [inner, outer].map((still) => rest({ moving: rear, still, isStillSolid: true, clearance })),
    ),
  )
  found.set(
    'frontMeetsTool',
    beyondNose === undefined
      ? 'clear'
      : worst(
          [inner, outer, apron].map((still) =>
            swing({ moving: beyondNose, still, isStillSolid: true, clearance }, theta),
          ),
        ),
  )
  found.set(
    'apronMeetsRear',
    swing({ moving: apron, isMovingSolid: true, still: rear, clearance }, theta),
  )
  const tools = { inner, outer }
  const folded = beyondNose?.map((p) => turned(p, (Math.abs(own.turn) * Math.PI) / 180))
  const out = (part: Line | undefined): Verdict =>
    brake.checkRemoval ? drawOut(rear, part, tools, brake.opening, clearance) : 'clear'
  found.set('cannotLoad', out(beyondNose))
  found.set('trapped', out(own.hem === null ? folded : undefined))
  return found
}
