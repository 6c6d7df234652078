import { isAtMost } from '#shared/geometry/tolerance'
import { radians } from '#shared/geometry/vector'
import type { Degrees, Inches } from '#shared/units/brands'

/** One bend in the sheet. Inches and degrees; the sign of `turn` plays no part here. */
export interface BendShape {
  readonly turn: Degrees
  readonly insideRadius: Inches
  readonly thickness: Inches
  /** Where the neutral axis lies: 0 at the inside face, 1 at the outside. */
  readonly kFactor: number
}

/**
 * Machinery's Handbook, 31st ed., eq. 33: soft steel, half-hard copper and brass, aluminum. The
 * handbook's 0.64 T at 90 degrees is (π/2) K T.
 */
export const K_HALF_HARD = 0.64 / (Math.PI / 2)

/** Machinery's Handbook, 31st ed., eq. 32: soft copper and soft brass, 0.55 T at 90 degrees. */
export const K_SOFT = 0.55 / (Math.PI / 2)

/**
 * The length of sheet that a bend uses up, in inches: the arc of the neutral axis,
 * BA = rad(|turn|) (R + K T). Source: shop formula sheets, "Fabrication Formulas"; the same form
 * stands behind the handbook's tables.
 */
export const bendAllowance = ({ turn, insideRadius, thickness, kFactor }: BendShape): Inches =>
  radians(Math.abs(turn)) * (insideRadius + kFactor * thickness)

/**
 * What an outside dimension holds beyond the leg's straight part at one bent end, in inches.
 * Up to 90 degrees the dimension runs to the sharp outside corner, (R + T) tan(|turn| / 2). Over
 * 90 it runs to the outermost tangent, R + T (DIN 6935 changes over at the same angle, and the
 * two agree there). A hem's fold is a turn of 180.
 */
export const outsideSetback = ({ turn, insideRadius, thickness }: BendShape): Inches => {
  const outsideRadius = insideRadius + thickness
  return isAtMost(Math.abs(turn), 90)
    ? outsideRadius * Math.tan(radians(Math.abs(turn)) / 2)
    : outsideRadius
}

/**
 * What a bend takes off the sum of the outside dimensions, in inches: BD = 2 OSSB - BA. Negative
 * where a sharp wide bend needs more sheet than the dimensions say.
 */
export const bendDeduction = (bend: BendShape): Inches =>
  2 * outsideSetback(bend) - bendAllowance(bend)
