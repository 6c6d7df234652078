import type { Side } from '#shared/ends/end.schema'
import { isEqual } from '#shared/geometry/tolerance'
import type { Degrees } from '#shared/units/brands'
import type { DraftPlane } from './draft-end'

/** How a piece runs on the roof: the job's slope and the end that lies lower. */
export interface Run {
  /** Degrees of the job's roof. */
  readonly slope: Degrees
  readonly lowEnd: Side | null
}

/**
 * The corners a roof has: where level pieces meet, where a gable comes up from a level piece or
 * down to one. `own` is any other.
 */
export const CORNER_KINDS = ['level', 'gableUp', 'gableDown', 'own'] as const
export type CornerKind = (typeof CORNER_KINDS)[number]

/** Walked from the left end to the right, the next piece turns to the side of edge A or of B. */
export type TurnsTo = 'A' | 'B'

/** The turn of a square corner, degrees; positive to the left of the walk, the side of edge B. */
const SQUARE_TURN: Record<TurnsTo, Degrees> = { A: -90, B: 90 }

export const turnsTo = (plan: Degrees | null): TurnsTo => ((plan ?? 0) > 0 ? 'B' : 'A')

export const withTurn = (plan: Degrees | null, to: TurnsTo): Degrees =>
  plan === null || plan === 0 ? SQUARE_TURN[to] : Math.abs(plan) * (to === 'B' ? 1 : -1)

/** The piece's own rise from its left end to its right, degrees. */
export const riseOf = ({ slope, lowEnd }: Run): Degrees =>
  lowEnd === null ? 0 : lowEnd === 'left' ? slope : 0 - slope

/** The vertical cut of a piece that runs like this. */
export const plumbPlane = (run: Run): DraftPlane => ({ plumb: riseOf(run) })

/** What meets a piece that runs like this; a sloped piece meets a level one or something of its own. */
export const cornersOf = ({ lowEnd }: Run): readonly CornerKind[] =>
  lowEnd === null ? CORNER_KINDS : ['level', 'own']

/** The rise of the piece that is met, walked away from the corner. */
const riseAway: Record<Exclude<CornerKind, 'own'>, (slope: Degrees) => Degrees> = {
  level: () => 0,
  gableUp: (slope) => slope,
  gableDown: (slope) => 0 - slope,
}

/**
 * The square corner at an end of the piece. A right end runs into its corner and the other piece
 * leads on; at a left end it is the other way round, so the other's rise counts towards the corner.
 */
export function cornerPlane(
  kind: Exclude<CornerKind, 'own'>,
  to: TurnsTo,
  side: Side,
  run: Run,
): DraftPlane {
  const own = riseOf(run)
  const other = riseAway[kind](run.slope)
  const plan = SQUARE_TURN[to]
  return side === 'right'
    ? { corner: { slopeIn: own, slopeOut: other, plan } }
    : { corner: { slopeIn: 0 - other, slopeOut: own, plan } }
}

const isSame = (a: number | null, b: number | null): boolean =>
  a !== null && b !== null && isEqual(a, b)

/** Which of the roof's corners a plane is for this piece, whatever its turn in plan. */
export function cornerKind(plane: DraftPlane, side: Side, run: Run): CornerKind {
  if (!('corner' in plane)) return 'own'
  const { slopeIn, slopeOut } = plane.corner
  const known = cornersOf(run).find((kind) => {
    if (kind === 'own') return false
    const usual = cornerPlane(kind, 'A', side, run)
    return (
      'corner' in usual &&
      isSame(usual.corner.slopeIn, slopeIn) &&
      isSame(usual.corner.slopeOut, slopeOut)
    )
  })
  return known ?? 'own'
}

/** True for a gable that meets a level piece, seen from either of them. */
export const isGableCorner = (kind: CornerKind, { lowEnd }: Run): boolean =>
  kind === 'gableUp' || kind === 'gableDown' || (kind === 'level' && lowEnd !== null)
