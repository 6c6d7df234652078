import { isAtMost } from '#shared/geometry/tolerance'
import { radians } from '#shared/geometry/vector'
import { bendAllowance } from '#shared/strip/bend-allowance'
import type { Degrees } from '#shared/units/brands'

/*
 * DIN 6935, as Tabellenbuch Metall gives it: a second opinion of our own strip, for sheet whose K
 * nobody has measured. Lengths in one unit, inches or millimeters alike.
 */

/** Where the factor has reached 1 and the neutral line the middle of the sheet. */
const FULL_RATIO = 5

/**
 * The standard's factor k for an inside radius over thickness: 0.65 + 0.5 log10(r/s), and 1 above
 * 5. The neutral line has the radius r + k s / 2. Throws RangeError where the formula puts the
 * neutral line outside the sheet (r/s under 0.0501), a bend with no radius included.
 */
export const dinFactor = (insideRadius: number, thickness: number): number => {
  if (!(thickness > 0 && Number.isFinite(thickness))) {
    throw new RangeError(`thickness must be over 0, not ${thickness}.`)
  }
  const ratio = insideRadius / thickness
  if (ratio > FULL_RATIO) return 1
  const factor = 0.65 + 0.5 * Math.log10(ratio)
  if (!(factor > 0)) {
    throw new RangeError(
      `insideRadius ${insideRadius} is too sharp for DIN 6935 at thickness ${thickness}: give 0.06 thicknesses or more.`,
    )
  }
  return factor
}

/** The K of our own formulas: half the standard's factor, which counts in half thicknesses. */
export const dinKFactor = (insideRadius: number, thickness: number): number =>
  dinFactor(insideRadius, thickness) / 2

export interface DinBend {
  /** Between the faces, 0 folded shut to 180 flat. */
  readonly openingAngle: Degrees
  readonly insideRadius: number
  readonly thickness: number
  /** The factor k where it is not the formula's: the handbook works with one decimal. */
  readonly factor?: number
}

/**
 * What a bend takes off the sum of the outside dimensions, v, for the standard's three ranges of
 * opening angle: up to 90 measured to the outermost tangents, up to 165 to the sharp outside
 * corner, above nothing at all. Flat length = a + b - v. Throws RangeError on an angle outside 0
 * to 180, and as `dinFactor`.
 */
export const dinCompensation = ({
  openingAngle,
  insideRadius,
  thickness,
  factor = dinFactor(insideRadius, thickness),
}: DinBend): number => {
  if (!(openingAngle >= 0 && openingAngle <= 180)) {
    throw new RangeError(`openingAngle must be from 0 to 180 degrees, not ${openingAngle}.`)
  }
  const turn = 180 - openingAngle
  const outsideRadius = insideRadius + thickness
  const arc = bendAllowance({ turn, insideRadius, thickness, kFactor: factor / 2 })
  if (isAtMost(openingAngle, 90)) return 2 * outsideRadius - arc
  if (isAtMost(openingAngle, 165)) return 2 * outsideRadius * Math.tan(radians(turn) / 2) - arc
  return 0
}
