import { isAtMost, isLess } from '#shared/geometry/tolerance'
import { ALUMINUM_COLUMNS, ALUMINUM_ROWS, STEEL_ROWS } from '#shared/metal/minimum-radius-table'
import type { Metal } from '#shared/stock/stock.schema'
import type { Inches } from '#shared/units/brands'
import { MM_PER_INCH } from '#shared/units/length-units'

export type AluminumAlloy = keyof typeof ALUMINUM_ROWS

/** Steel by tensile strength: up to 390 N/mm², and over that up to 490. */
export const STEEL_STRENGTHS = ['Rm 390', 'Rm 490'] as const

export type SteelStrength = (typeof STEEL_STRENGTHS)[number]

/** What the tables know a sheet by, beyond its metal. */
export type RadiusAlloy = AluminumAlloy | SteelStrength

const isAluminum = (alloy: RadiusAlloy): alloy is AluminumAlloy => alloy in ALUMINUM_ROWS

const checkThickness = (thickness: Inches): void => {
  if (!(thickness > 0 && Number.isFinite(thickness))) {
    throw new RangeError(`thickness must be over 0 in., not ${thickness}.`)
  }
}

/**
 * The smallest inside radius in inches of a bend of 90 degrees in aluminum, linear between the
 * table's thicknesses; null for a sheet thinner or thicker than the alloy's columns.
 */
export const aluminumMinimumRadius = (alloy: AluminumAlloy, thickness: Inches): Inches | null => {
  checkThickness(thickness)
  const row: readonly (number | null)[] = ALUMINUM_ROWS[alloy]
  if (isLess(thickness, ALUMINUM_COLUMNS[0])) return null
  const next = ALUMINUM_COLUMNS.findIndex((head) => isAtMost(thickness, head))
  const right = row[next]
  const rightHead = ALUMINUM_COLUMNS[next]
  if (right === undefined || right === null || rightHead === undefined) return null
  const left = row[next - 1] ?? right
  const leftHead = ALUMINUM_COLUMNS[next - 1] ?? 0
  const times = left + ((right - left) * (thickness - leftHead)) / (rightHead - leftHead)
  return times * thickness
}

/**
 * The smallest inside radius in inches of a bend in steel across the rolling direction, up to 120
 * degrees; null for sheet over 6 mm.
 */
export const steelMinimumRadius = (strength: SteelStrength, thickness: Inches): Inches | null => {
  checkThickness(thickness)
  const row = STEEL_ROWS.find(({ upTo }) => isAtMost(thickness * MM_PER_INCH, upTo))
  if (row === undefined) return null
  return (strength === 'Rm 390' ? row.upTo390 : row.upTo490) / MM_PER_INCH
}

/**
 * The inside radius in inches that a paint of rating nT stands: folded by 180 degrees round n
 * sheets it neither cracks nor comes off (ASTM D4145), which is a fold of inside diameter n T.
 * Throws RangeError on a rating that is negative or no number.
 */
export const radiusOfTBend = (rating: number, thickness: Inches): Inches => {
  checkThickness(thickness)
  if (!(rating >= 0 && Number.isFinite(rating))) {
    throw new RangeError(`paintTBend must be 0 or more sheet thicknesses, not ${rating}.`)
  }
  return (rating * thickness) / 2
}

/**
 * How far the outer face of a bend is stretched, as a part of its length, the neutral line in the
 * middle of the sheet: T / (2 R + T). For the radius of a T-bend n that is 1 / (n + 1).
 */
export const outerFiberStrain = (insideRadius: Inches, thickness: Inches): number => {
  checkThickness(thickness)
  if (!(insideRadius >= 0)) {
    throw new RangeError(`insideRadius must not be negative, but is ${insideRadius} in.`)
  }
  return thickness / (2 * insideRadius + thickness)
}

/**
 * Why a radius may not be smaller: the metal would crack, by its alloy or strength; the paint would
 * crack; or a rule of shop guides for sheet whose alloy is not known, half the thickness.
 */
export type RadiusReason = 'metal' | 'paint' | 'shopGuide'

export interface RadiusLimit {
  readonly reason: RadiusReason
  readonly least: Inches
}

export interface RadiusLimits {
  /** The largest first: the one that counts. */
  readonly limits: readonly RadiusLimit[]
  /** Why the metal's own table could not be asked, though an alloy was named. */
  readonly metalUnknown: 'alloyOfOtherMetal' | 'thicknessOutsideTable' | null
}

const metalRadius = (metal: Metal, alloy: RadiusAlloy, thickness: Inches): Inches | null =>
  metal === 'aluminum' && isAluminum(alloy)
    ? aluminumMinimumRadius(alloy, thickness)
    : metal === 'steel' && !isAluminum(alloy)
      ? steelMinimumRadius(alloy, thickness)
      : null

const belongsTo = (metal: Metal, alloy: RadiusAlloy): boolean =>
  metal === (isAluminum(alloy) ? 'aluminum' : 'steel')

/**
 * How sharp a sheet may be bent, inches, each limit with its reason. Without an alloy the metal
 * answers by the shop guides' T / 2 ("metal-stamping-die news 400", low-carbon steel); without a
 * rating the paint is not judged. Throws RangeError on a thickness or rating that makes no sense.
 */
export const radiusLimits = ({
  metal,
  alloy,
  thickness,
  paintTBend,
}: {
  readonly metal: Metal
  readonly alloy?: RadiusAlloy
  readonly thickness: Inches
  readonly paintTBend?: number
}): RadiusLimits => {
  checkThickness(thickness)
  const own = alloy === undefined ? null : metalRadius(metal, alloy, thickness)
  const limits: RadiusLimit[] = [
    own === null ? { reason: 'shopGuide', least: thickness / 2 } : { reason: 'metal', least: own },
    ...(paintTBend === undefined
      ? []
      : [{ reason: 'paint' as const, least: radiusOfTBend(paintTBend, thickness) }]),
  ]
  return {
    limits: limits.toSorted((a, b) => b.least - a.least),
    metalUnknown:
      alloy === undefined || own !== null
        ? null
        : belongsTo(metal, alloy)
          ? 'thicknessOutsideTable'
          : 'alloyOfOtherMetal',
  }
}
