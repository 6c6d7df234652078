import { isAtMost, isLess } from '#shared/geometry/tolerance'
import type { Metal } from '#shared/stock/stock.schema'
import type { Degrees, Inches } from '#shared/units/brands'

/** A bend round a tool, before the sheet springs back. Stresses in one unit, psi for instance. */
export interface SprungBend {
  /** Inside radius of the bend while it is held. */
  readonly insideRadius: Inches
  readonly thickness: Inches
  readonly yieldStress: number
  readonly elasticModulus: number
}

const checkPositive = (name: string, value: number): void => {
  if (!(value > 0 && Number.isFinite(value))) {
    throw new RangeError(`${name} must be over 0, not ${value}.`)
  }
}

/**
 * The radius held over the radius that is left, Ri/Rf = 4 x³ - 3 x + 1 with x = Ri Y / (E T): near
 * 1 the bend stays, near 0 it opens all the way. Source: Kalpakjian and Schmid, Manufacturing
 * Engineering and Technology; MIT 2.008, homework 5. Throws RangeError on a value that is not
 * positive, and where x is 1/2 or more: the sheet bends elastically and keeps no bend at all.
 */
export const springbackRatio = (bend: SprungBend): number => {
  for (const name of ['insideRadius', 'thickness', 'yieldStress', 'elasticModulus'] as const) {
    checkPositive(name, bend[name])
  }
  const x = (bend.insideRadius * bend.yieldStress) / (bend.elasticModulus * bend.thickness)
  if (x >= 0.5) {
    throw new RangeError(
      `insideRadius ${bend.insideRadius} in. is too large for ${bend.thickness} in. of this metal: it springs back flat.`,
    )
  }
  return 4 * x ** 3 - 3 * x + 1
}

/** The inside radius in inches that is left of a bend. Throws as `springbackRatio`. */
export const radiusAfterSpringback = (bend: SprungBend): Inches =>
  bend.insideRadius / springbackRatio(bend)

/**
 * The turn to bend to, in degrees, so that `wanted` is left: the arc on the middle of the
 * thickness keeps its length, (2 Ri/T + 1) held = (2 Rf/T + 1) left. Source: same chapter. Throws
 * as `springbackRatio`.
 */
export const turnBeforeSpringback = (bend: SprungBend, wanted: Degrees): Degrees =>
  (wanted * (2 * radiusAfterSpringback(bend) + bend.thickness)) /
  (2 * bend.insideRadius + bend.thickness)

/**
 * Tabellenbuch Metall, springback factor kR = wanted angle / angle at the tool by inside radius
 * over thickness. The values were seen in print; the column heads are from memory.
 */
export const SPRINGBACK_COLUMNS = [1, 1.6, 2.5, 4, 6.3, 10, 16, 25, 40, 63, 100] as const

export const SPRINGBACK_ROWS = {
  DC04: [0.99, 0.99, 0.99, 0.98, 0.97, 0.97, 0.96, 0.94, 0.91, 0.87, 0.83],
  DC01: [0.99, 0.99, 0.99, 0.97, 0.96, 0.96, 0.93, 0.9, 0.85, 0.77, 0.66],
  'X12CrNi18-8': [0.99, 0.98, 0.97, 0.95, 0.93, 0.89, 0.84, 0.76, 0.63],
  'E-Cu-R20': [0.98, 0.97, 0.97, 0.96, 0.95, 0.93, 0.9, 0.85, 0.79, 0.72, 0.6],
  'CuZn33-R29': [0.97, 0.97, 0.96, 0.95, 0.94, 0.93, 0.89, 0.86, 0.83, 0.77, 0.73],
  'EN-AW-Al99.0': [0.99, 0.99, 0.99, 0.99, 0.98, 0.98, 0.97, 0.97, 0.96, 0.95, 0.93],
} as const satisfies Record<string, readonly number[]>

export type SpringbackMaterial = keyof typeof SPRINGBACK_ROWS

/**
 * The row that stands for a metal: of the two steels the one that springs more. The rows of
 * aluminum and copper are of soft metal; harder sheet springs more. The table has no zinc.
 */
const ROW_OF: Readonly<Record<Metal, SpringbackMaterial | null>> = {
  steel: 'DC01',
  stainless: 'X12CrNi18-8',
  aluminum: 'EN-AW-Al99.0',
  copper: 'E-Cu-R20',
  zinc: null,
}

export type SpringbackResult =
  | {
      readonly ok: true
      readonly material: SpringbackMaterial
      readonly factor: number
      /** Degrees to bend beyond 90 so that 90 are left, as in `springbackPer90` of a sheet. */
      readonly springbackPer90: Degrees
    }
  | { readonly ok: false; readonly code: 'metalNotInTable' }
  | {
      readonly ok: false
      readonly code: 'ratioOutsideTable'
      /** Inside radius over thickness. */
      readonly found: number
      readonly least: number
      readonly most: number
    }

/** The factor of a row at a ratio between its first and last column, linear between columns. */
const interpolated = (row: readonly number[], ratio: number): number => {
  const next = SPRINGBACK_COLUMNS.findIndex((head) => isAtMost(ratio, head))
  const [right, rightHead] = [row[next] ?? NaN, SPRINGBACK_COLUMNS[next] ?? NaN]
  const [left, leftHead] = [row[next - 1], SPRINGBACK_COLUMNS[next - 1]]
  if (left === undefined || leftHead === undefined) return right
  return left + ((right - left) * (ratio - leftHead)) / (rightHead - leftHead)
}

/**
 * Springback for each 90 degrees of bend after the factor table, 90 / kR - 90: to be left with 90
 * at kR 0.99 the sheet is bent to 90.9. Inches. Outside the columns of its row nothing is guessed:
 * a bend sharper than its thickness is not in the table. Throws RangeError on a radius or
 * thickness that is not positive.
 */
export const springbackPer90FromTable = (
  metal: Metal,
  insideRadius: Inches,
  thickness: Inches,
): SpringbackResult => {
  checkPositive('insideRadius', insideRadius)
  checkPositive('thickness', thickness)
  const material = ROW_OF[metal]
  if (material === null) return { ok: false, code: 'metalNotInTable' }
  const row = SPRINGBACK_ROWS[material]
  const least = SPRINGBACK_COLUMNS[0]
  const most = SPRINGBACK_COLUMNS[row.length - 1] ?? least
  const found = insideRadius / thickness
  if (isLess(found, least) || isLess(most, found)) {
    return { ok: false, code: 'ratioOutsideTable', found, least, most }
  }
  const factor = interpolated(row, found)
  return { ok: true, material, factor, springbackPer90: 90 / factor - 90 }
}
