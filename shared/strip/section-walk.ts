import type { Arc } from '#shared/geometry/arc'
import { flattenArc, pointOnArc } from '#shared/geometry/arc'
import { withoutRepeats } from '#shared/geometry/polyline'
import { findMeeting } from '#shared/geometry/segment'
import type { Vector } from '#shared/geometry/vector'
import { add, between, heading, leftOf, scale } from '#shared/geometry/vector'
import type { FlatRun } from '#shared/strip/flat-parts'
import type { Fold } from '#shared/strip/strip.schema'
import type { Degrees, Inches } from '#shared/units/brands'

export interface RunToWalk {
  readonly of: FlatRun['of']
  readonly straight: Inches
}

/** `radius` is that of the line walked. */
export interface FoldToWalk {
  readonly fold: Fold
  readonly turn: Degrees
  readonly radius: Inches
}

export interface StraightPart {
  readonly kind: 'straight'
  readonly of: FlatRun['of']
  readonly from: Vector
  readonly to: Vector
  readonly heading: Degrees
}

export interface RoundPart {
  readonly kind: 'round'
  readonly fold: Fold
  readonly turn: Degrees
  readonly arc: Arc
  readonly from: Vector
  readonly to: Vector
  /** Where the straight parts on either side would meet; for a fold of 180 the middle of the arc. */
  readonly corner: Vector
  /** The middle of the arc. */
  readonly mid: Vector
}

export type WalkedPart = StraightPart | RoundPart

const roundPart = (fold: FoldToWalk, from: Vector, startHeading: Degrees): RoundPart => {
  const side = fold.turn < 0 ? -1 : 1
  const toCenter = scale(leftOf(heading(startHeading)), side)
  const arc: Arc = {
    center: add(from, scale(toCenter, fold.radius)),
    radius: fold.radius,
    start: startHeading - 90 * side,
    sweep: fold.turn,
  }
  const to = pointOnArc(arc, 1)
  const mid = pointOnArc(arc, 0.5)
  const corner =
    Math.abs(fold.turn) < 179
      ? findMeeting(from, heading(startHeading), to, heading(startHeading + fold.turn))
      : undefined
  return {
    kind: 'round',
    fold: fold.fold,
    turn: fold.turn,
    arc,
    from,
    to,
    corner: corner ?? mid,
    mid,
  }
}

const moved = (part: WalkedPart, by: Vector): WalkedPart => {
  const from = add(part.from, by)
  const to = add(part.to, by)
  if (part.kind === 'straight') return { ...part, from, to }
  return {
    ...part,
    from,
    to,
    arc: { ...part.arc, center: add(part.arc.center, by) },
    corner: add(part.corner, by),
    mid: add(part.mid, by),
  }
}

/**
 * Walks straight runs and round folds from edge A to edge B (inches; a positive turn goes left).
 * Leg 1 heads along +x and its straight part begins at `leg1From`; a hem's lip before it follows
 * from that.
 */
export const walkSection = (
  runs: readonly RunToWalk[],
  folds: readonly FoldToWalk[],
  leg1From: Vector,
): WalkedPart[] => {
  const parts: WalkedPart[] = []
  let at: Vector = { x: 0, y: 0 }
  let turned: Degrees = runs[0]?.of === 'lipA' ? 0 - (folds[0]?.turn ?? 0) : 0
  runs.forEach((run, index) => {
    const to = add(at, scale(heading(turned), run.straight))
    parts.push({ kind: 'straight', of: run.of, from: at, to, heading: turned })
    at = to
    const fold = folds[index]
    if (fold === undefined) return
    const round = roundPart(fold, at, turned)
    parts.push(round)
    at = round.to
    turned += fold.turn
  })
  const leg1 = parts.find((part) => part.kind === 'straight' && part.of === 1)
  if (leg1 === undefined) throw new RangeError('A section without a first leg.')
  const by = add(leg1From, scale(leg1.from, -1))
  return parts.map((part) => moved(part, by))
}

/** How finely arcs become chords. */
export interface Flatness {
  readonly maxStep: Degrees
  readonly tolerance: Inches
}

const offsetRound = (part: RoundPart, left: Inches, flatness: Flatness): Vector[] => {
  const inward = left * Math.sign(part.turn)
  const radius = part.arc.radius - inward
  if (radius >= 0) {
    return flattenArc({ ...part.arc, radius }, flatness.maxStep, flatness.tolerance)
  }
  // The offset lies beyond the center: the two straight offsets meet there in a sharp corner.
  const half = Math.abs(part.turn) / 2
  if (half > 80) return [part.arc.center]
  const out = heading(part.arc.start + part.arc.sweep / 2)
  return [add(part.arc.center, scale(out, radius / Math.cos((half * Math.PI) / 180)))]
}

/**
 * The chain that runs beside the walked line, `left` inches to its left (negative: right), from
 * edge A to edge B. Inside a bend tighter than the offset the chain turns in a sharp corner.
 */
export const offsetChain = (
  parts: readonly WalkedPart[],
  left: Inches,
  flatness: Flatness,
): Vector[] => {
  const points: Vector[] = []
  parts.forEach((part, index) => {
    if (part.kind === 'round') {
      points.push(...offsetRound(part, left, flatness))
      return
    }
    const aside = scale(leftOf(heading(part.heading)), left)
    if (isOpenEnd(parts[index - 1], left)) points.push(add(part.from, aside))
    if (isOpenEnd(parts[index + 1], left)) points.push(add(part.to, aside))
  })
  return withoutRepeats(points)
}

/** True where the straight offset really begins or ends there, and not in a sharp inside corner. */
const isOpenEnd = (neighbor: WalkedPart | undefined, left: Inches): boolean =>
  neighbor?.kind !== 'round' || neighbor.arc.radius - left * Math.sign(neighbor.turn) >= 0

export const middleOfPart = (part: StraightPart): Vector => between(part.from, part.to, 0.5)
