import { isEqual, isLess } from '#shared/geometry/tolerance'
import type { Profile } from '#shared/profile/profile.schema'
import { girthOf } from '#shared/strip/flat-strip'
import type { Inches } from '#shared/units/brands'

/** Stated girth less drawn girth in inches; 0 where they agree. */
export const girthDifference = (profile: Profile, stated: Inches): Inches => {
  const drawn = girthOf(profile)
  return isEqual(drawn, stated) ? 0 : stated - drawn
}

/**
 * The length that leg `leg` (from 1) must have for the girth to be as stated; null where the rest
 * of the piece takes all of it. Throws RangeError for a leg that is not there.
 */
export const findLegForGirth = (profile: Profile, leg: number, stated: Inches): Inches | null => {
  const length = profile.legs[leg - 1]
  if (length === undefined) throw new RangeError(`There is no leg ${leg}.`)
  const solved = length + girthDifference(profile, stated)
  return isLess(0, solved) ? solved : null
}
