import { degrees, radians } from '#shared/geometry/vector'
import { printAngle } from '#shared/units/angle'
import type { Degrees } from '#shared/units/brands'

/** Rises are told apart to a quarter of an inch in 12. */
const RISE_STEP = 0.25

/** `6/12` where it is a pitch of whole or quarter inches, degrees otherwise; without its sign. */
export function printSlope(slope: Degrees): string {
  const rise = 12 * Math.tan(radians(Math.abs(slope)))
  const near = Math.round(rise / RISE_STEP) * RISE_STEP
  const same = Math.abs(degrees(Math.atan2(near, 12)) - Math.abs(slope)) < 1e-6
  return same && near <= 24 ? `${near}/12` : printAngle(Math.abs(slope))
}
