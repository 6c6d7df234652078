import { isEqual } from '#shared/geometry/tolerance'
import { between, vector } from '#shared/geometry/vector'
import type { Vector } from '#shared/geometry/vector'
import type { Inches } from '#shared/units/brands'
import type { Chain } from './fold-frame'
import type { PlanStep } from './plan.schema'
import { bendsBeside, closedHemsOf } from './workpiece'
import type { PieceBend, Side, Workpiece } from './workpiece'

/** The gauge stop is this high above and below the sheet's plane. */
const STOP_REACH = 0.5

/** A height just at the stop's end is at it: whether a face counts must not hang on rounding. */
const toStopEnd = (y: Inches): Inches =>
  isEqual(Math.abs(y), STOP_REACH) ? Math.sign(y) * STOP_REACH : y

/** The part of a segment within the stop's height; undefined when none is. */
const clipToStop = (a: Vector, b: Vector): readonly [Vector, Vector] | undefined => {
  const start = toStopEnd(a.y)
  const rise = toStopEnd(b.y) - start
  if (rise === 0) return Math.abs(start) <= STOP_REACH ? [a, b] : undefined
  const low = (-STOP_REACH - start) / rise
  const high = (STOP_REACH - start) / rise
  const from = Math.max(0, Math.min(low, high))
  const to = Math.min(1, Math.max(low, high))
  return from <= to ? [between(a, b, from), between(a, b, to)] : undefined
}

/** The greatest x of a run of points within the stop's height; 0 where none is further. */
export const stopReach = (points: readonly Vector[]): Inches => {
  let most = 0
  for (let i = 1; i < points.length; i++) {
    const [from, to] = [points[i - 1], points[i]]
    if (from === undefined || to === undefined || (from.x <= most && to.x <= most)) continue
    clipToStop(from, to)?.forEach(({ x }) => {
      most = Math.max(most, x)
    })
  }
  return most
}

/** The rearmost point of the rear chain within half an inch of the sheet's plane: inches behind the bend. */
export const gaugeDistance = ({ points, firstRun }: Chain): Inches =>
  points.length === 2 ? firstRun : stopReach(points.map(({ x, y }) => vector(0 - x, y)))

/** Whether the bends made behind are more than a single closed hem. */
export const isFormedFace = (bentBehind: number, closedHems: number): boolean =>
  bentBehind !== 0 && ((bentBehind & ~closedHems) !== 0 || (bentBehind & (bentBehind - 1)) !== 0)

/**
 * A raw edge if nothing behind is bent, a hem if a closed hem is the only bend made behind, else a
 * formed face; an open hem is one.
 */
export const restsOn = (
  piece: Workpiece,
  bend: PieceBend,
  rear: Side,
  made: number,
): NonNullable<PlanStep['restsOn']> => {
  const bentBehind = made & bendsBeside(piece, bend, rear)
  if (bentBehind === 0) return 'rawEdge'
  return isFormedFace(bentBehind, closedHemsOf(piece)) ? 'formedFace' : 'hem'
}
