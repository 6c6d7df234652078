import { degrees, radians, rotate } from '#shared/geometry/vector'
import type { Degrees } from '#shared/units/brands'
import { sheetOutline, toolOutline } from '../collision/outline'
import type { Outline } from '../collision/outline'

/** Radians: less than a billionth of an inch at any reach. */
const FINENESS = 1e-12

/**
 * Degrees of swing at which something first meets, from an exact test of the swing from 0 to a given
 * angle (radians), by bisection: once met, every longer swing meets. Undefined where nothing does.
 * This is for the picture alone; whether a fold may be made is never decided here.
 */
export const firstContact = (
  meets: (swing: number) => boolean,
  swing: Degrees,
): Degrees | undefined => {
  let high = radians(swing)
  if (!meets(high)) return undefined
  if (meets(0)) return 0
  let low = 0
  while (high - low > FINENESS) {
    const middle = (low + high) / 2
    if (meets(middle)) high = middle
    else low = middle
  }
  return degrees(high)
}

/** An outline turned about the bend line. */
export const swungOutline = ({ points, isSolid }: Outline, swing: Degrees): Outline => {
  const turned = points.map((point) => rotate(point, swing))
  return isSolid ? toolOutline(turned) : sheetOutline(turned)
}
