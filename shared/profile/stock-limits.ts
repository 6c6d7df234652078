import type { RadiusAlloy } from '#shared/metal/minimum-radius'
import { radiusLimits, STEEL_STRENGTHS } from '#shared/metal/minimum-radius'
import { ALUMINUM_ROWS } from '#shared/metal/minimum-radius-table'
import type { ProfileLimits } from '#shared/profile/problems'
import type { Sheet } from '#shared/stock/stock.schema'
import type { Inches } from '#shared/units/brands'

/** What a stock says of itself, as far as profiles are held against it; what is absent is not known. */
export interface LimitingStock {
  readonly sheet: Pick<Sheet, 'metal' | 'thickness'>
  readonly widestStrip?: Inches | undefined
  readonly painted?: boolean
  readonly paintTBend?: number | null | undefined
  readonly alloy?: string | null | undefined
}

const plain = (name: string): string => name.toLowerCase().replace(/[\s-]/g, '')

const ALLOYS: ReadonlyMap<string, RadiusAlloy> = new Map(
  [...keysOf(ALUMINUM_ROWS), ...STEEL_STRENGTHS].map((alloy) => [plain(alloy), alloy]),
)

function keysOf<Key extends string>(table: Readonly<Record<Key, unknown>>): Key[] {
  const isKey = (name: string): name is Key => Object.hasOwn(table, name)
  return Object.keys(table).filter(isKey)
}

/**
 * The limits that a stock sets to a profile, for `profileProblems`: the widest strip, and the
 * smallest inside radius (inches) that its alloy bears, where the tables know it, and its paint,
 * where it is rated. An alloy is found by the name the mill gives it, spaces and hyphens apart.
 * Throws RangeError on a thickness or rating that makes no sense.
 */
export const stockLimits = (stock: LimitingStock): ProfileLimits => {
  const { sheet, widestStrip, painted = true, paintTBend, alloy } = stock
  const known = typeof alloy === 'string' ? ALLOYS.get(plain(alloy)) : undefined
  const { limits } = radiusLimits({
    metal: sheet.metal,
    thickness: sheet.thickness,
    ...(known === undefined ? {} : { alloy: known }),
    ...(painted && typeof paintTBend === 'number' ? { paintTBend } : {}),
  })
  const metal = limits.find(({ reason }) => reason === 'metal')
  const paint = limits.find(({ reason }) => reason === 'paint')
  return {
    ...(widestStrip === undefined ? {} : { widestStrip }),
    ...(metal === undefined ? {} : { metalRadius: metal.least }),
    ...(paint === undefined ? {} : { paintRadius: paint.least }),
  }
}
