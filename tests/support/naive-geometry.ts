/**
 * Distances and sweeps written once more and plainly, for a second opinion on the planner's exact ones:
 * every pair of sides on its own, moved in steps so small that nothing can be passed over.
 */

export interface Point {
  readonly x: number
  readonly y: number
}

export type Line = readonly Point[]

/** `unsure`: the closest approach is too near to the clearance to tell by steps. */
export type Verdict = 'clear' | 'meets' | 'unsure'

interface Side {
  readonly a: Point
  readonly b: Point
}

/** Closer to the clearance than this is not told apart from it. Inches. */
const FINE = 2e-4

export const sidesOf = (line: Line, isClosed: boolean): Side[] =>
  line.flatMap((a, i) => {
    const b = line[i + 1] ?? (isClosed ? line[0] : undefined)
    return b === undefined ? [] : [{ a, b }]
  })

const toSide = (p: Point, { a, b }: Side): number => {
  const length = Math.hypot(b.x - a.x, b.y - a.y)
  if (length === 0) return Math.hypot(p.x - a.x, p.y - a.y)
  const along = ((p.x - a.x) * (b.x - a.x) + (p.y - a.y) * (b.y - a.y)) / length
  if (along <= 0) return Math.hypot(p.x - a.x, p.y - a.y)
  if (along >= length) return Math.hypot(p.x - b.x, p.y - b.y)
  return Math.abs((p.x - a.x) * (b.y - a.y) - (p.y - a.y) * (b.x - a.x)) / length
}

const isLeft = ({ a, b }: Side, p: Point): boolean =>
  (b.x - a.x) * (p.y - a.y) > (b.y - a.y) * (p.x - a.x)

const apart = (p: Side, q: Side): number => {
  if (isLeft(p, q.a) !== isLeft(p, q.b) && isLeft(q, p.a) !== isLeft(q, p.b)) return 0
  return Math.min(toSide(p.a, q), toSide(p.b, q), toSide(q.a, p), toSide(q.b, p))
}

/** Inside where the border goes once round the point, by the sum of the angles it is seen under. */
const isInside = (p: Point, border: Line): boolean => {
  const seen = sidesOf(border, true).reduce((sum, { a, b }) => {
    const turn = Math.atan2(b.y - p.y, b.x - p.x) - Math.atan2(a.y - p.y, a.x - p.x)
    return sum + Math.atan2(Math.sin(turn), Math.cos(turn))
  }, 0)
  return Math.abs(seen) > Math.PI
}

/** Worst of several. */
export const worst = (verdicts: readonly Verdict[]): Verdict => {
  if (verdicts.includes('meets')) return 'meets'
  return verdicts.includes('unsure') ? 'unsure' : 'clear'
}

/**
 * One pair of sides on the way: `at` gives the moving one, whose points go no faster than `speed`.
 * From any place it is safe to go on by as much as there is room.
 */
const sweepPair = (
  at: (t: number) => Side,
  still: Side,
  end: number,
  speed: number,
  clearance: number,
): Verdict => {
  let isUnsure = false
  for (let t = 0; ;) {
    const room = apart(at(t), still) - clearance
    if (room < -1e-7) return 'meets'
    if (room < FINE) isUnsure = true
    if (t >= end || speed === 0) break
    t = Math.min(end, t + Math.max(room, FINE) / speed)
  }
  return isUnsure ? 'unsure' : 'clear'
}

interface Sweep {
  readonly moving: Line
  readonly isMovingSolid?: boolean
  readonly still: Line
  readonly isStillSolid?: boolean
  readonly clearance: number
  /** The first sides of both are not compared. */
  readonly skipFirst?: boolean
}

const sweep = (
  { moving, still, clearance, isMovingSolid = false, isStillSolid = false, skipFirst }: Sweep,
  at: (p: Point, t: number) => Point,
  end: number,
  speedOf: (p: Point) => number,
): Verdict => {
  const [first, other] = [moving[0], still[0]]
  if (first === undefined || other === undefined) throw new Error('A line without points')
  if (isStillSolid && isInside(at(first, 0), still)) return 'meets'
  if (
    isMovingSolid &&
    isInside(
      other,
      moving.map((p) => at(p, 0)),
    )
  )
    return 'meets'
  const stills = sidesOf(still, isStillSolid)
  return worst(
    sidesOf(moving, isMovingSolid).flatMap(({ a, b }, i) =>
      stills.map((q, j): Verdict => {
        if (skipFirst === true && i === 0 && j === 0) return 'clear'
        const speed = Math.max(speedOf(a), speedOf(b))
        return sweepPair((t) => ({ a: at(a, t), b: at(b, t) }), q, end, speed, clearance)
      }),
    ),
  )
}

export const turned = ({ x, y }: Point, angle: number): Point => ({
  x: x * Math.cos(angle) - y * Math.sin(angle),
  y: x * Math.sin(angle) + y * Math.cos(angle),
})

/** Swung counter-clockwise about the origin, degrees. */
export const swing = (what: Sweep, angle: number): Verdict =>
  sweep(what, turned, (angle * Math.PI) / 180, ({ x, y }) => Math.hypot(x, y))

/** Moved straight from `from` by (dx, dy). */
export const slide = (what: Sweep, from: Point, dx: number, dy: number): Verdict => {
  const length = Math.hypot(dx, dy)
  const [ux, uy] = length === 0 ? [0, 0] : [dx / length, dy / length]
  return sweep(
    what,
    ({ x, y }, t) => ({ x: x + from.x + ux * t, y: y + from.y + uy * t }),
    length,
    () => (length === 0 ? 0 : 1),
  )
}

export const rest = (what: Sweep): Verdict => slide(what, { x: 0, y: 0 }, 0, 0)
