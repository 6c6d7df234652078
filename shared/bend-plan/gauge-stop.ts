import { between } from '#shared/geometry/vector'
import type { Vector } from '#shared/geometry/vector'
import type { Inches } from '#shared/units/brands'
import type { Chain } from './fold-frame'
import type { PlanStep } from './plan.schema'
import { bendsBeside, closedHemsOf } from './workpiece'
import type { PieceBend, Side, Workpiece } from './workpiece'

/** The gauge stop is this high above and below the sheet's plane. */
const STOP_REACH = 0.5

/** The part of a segment within the stop's height; undefined when none is. */
const clipToStop = (a: Vector, b: Vector): readonly [Vector, Vector] | undefined => {
  const rise = b.y - a.y
  if (rise === 0) return Math.abs(a.y) <= STOP_REACH ? [a, b] : undefined
  const low = (-STOP_REACH - a.y) / rise
  const high = (STOP_REACH - a.y) / rise
  const from = Math.max(0, Math.min(low, high))
  const to = Math.min(1, Math.max(low, high))
  return from <= to ? [between(a, b, from), between(a, b, to)] : undefined
}

/** The rearmost point of the rear chain within half an inch of the sheet's plane: inches behind the bend. */
export const gaugeDistance = (rear: Chain): Inches => {
  let least = 0
  rear.points.forEach((to, i) => {
    const from = rear.points[i - 1]
    if (from === undefined) return
    clipToStop(from, to)?.forEach((point) => {
      least = Math.min(least, point.x)
    })
  })
  return -least
}

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
