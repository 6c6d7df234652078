import { vector } from '#shared/geometry/vector'
import type { Vector } from '#shared/geometry/vector'
import type { Inches } from '#shared/units/brands'
import type { OpenTools } from '../collision/open-tools'
import { movedOutline } from '../collision/outline'
import type { Outline } from '../collision/outline'
import { meetsSliding } from '../collision/slide'
import { nearestPoints } from './nearest-points'

/** What catches: the place on the piece as it lies in the clamp, and the tool. */
export interface Caught {
  readonly at: Vector
  readonly against: 'inner' | 'outer'
}

/** The piece is out when its rear is this far in front of the bend line. Inches. */
const OUT: Inches = 2

/** Parts of a move tried to find where on it something first meets: 2^-30 of the move. */
const HALVINGS = 30

const isHigher = (a: Vector, b: Vector): boolean => a.y > b.y

/**
 * What keeps a piece in the clamp when the clamp opens where it is and the piece is drawn straight
 * out: the first thing met, marked on the piece in its place. Where the clamp cannot open far enough,
 * the rear's highest or lowest point. Undefined where this simplest way out is free.
 *
 * For the picture alone: whether a piece comes out is decided by the exact test, which tries more ways.
 */
export const findCaught = (
  rear: Outline,
  front: Outline | undefined,
  { inner, outer }: OpenTools,
  opening: Inches,
  clearance: Inches,
): Caught | undefined => {
  const height = Math.max(0, rear.box.top)
  const depth = Math.max(0, 0 - rear.box.bottom)
  if (height + depth > opening) {
    const isUp = height >= depth
    const at = rear.points.reduce((best, point) =>
      (isUp ? isHigher(point, best) : isHigher(best, point)) ? point : best,
    )
    return { at, against: isUp ? 'inner' : 'outer' }
  }
  const out = Math.max(0, OUT - rear.box.left)
  const moves = [
    { against: 'inner', tool: inner, dx: 0, dy: 0 - height },
    { against: 'outer', tool: outer, dx: 0, dy: depth },
    { against: 'inner', tool: movedOutline(inner, 0, height), dx: out, dy: 0 },
    { against: 'outer', tool: movedOutline(outer, 0, 0 - depth), dx: out, dy: 0 },
  ] as const
  for (const { against, tool, dx, dy } of moves) {
    for (const part of front === undefined ? [rear] : [front, rear]) {
      const meets = (share: number) => meetsSliding(part, tool, dx * share, dy * share, clearance)
      if (!meets(1)) continue
      let [low, high] = [0, meets(0) ? 0 : 1]
      for (let i = 0; i < HALVINGS && high > 0; i++) {
        const middle = (low + high) / 2
        if (meets(middle)) high = middle
        else low = middle
      }
      const { at } = nearestPoints(movedOutline(part, dx * high, dy * high), tool)
      return { at: vector(at.x - dx * high, at.y - dy * high), against }
    }
  }
  return undefined
}
