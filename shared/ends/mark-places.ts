import { isAtMost, isLess } from '#shared/geometry/tolerance'
import { hasErrors } from '#shared/profile/problem'
import type { Profile } from '#shared/profile/profile.schema'
import { valueProblems } from '#shared/profile/value-problems'
import type { FoldingSheet } from '#shared/strip/flat-parts'
import { flatParts } from '#shared/strip/flat-parts'
import { flatStrip } from '#shared/strip/flat-strip'
import type { Strip } from '#shared/strip/strip.schema'
import type { Inches } from '#shared/units/brands'

/** Where marks lie across the strip: at edge A, at each crease, at edge B. Inches from edge A. */
export const markPlaces = (strip: Strip): Inches[] => [
  0,
  ...strip.creases.map((crease) => crease.at),
  strip.stripWidth,
]

/**
 * False where there is no strip to cut: values that mean nothing, or legs their bends use up. Never
 * throws, NaN included.
 */
export const hasStrip = (profile: Profile, sheet: FoldingSheet): boolean => {
  if (hasErrors(valueProblems(profile))) return false
  if (flatParts(profile, sheet).runs.some(({ straight }) => !isAtMost(0, straight))) return false
  const places = markPlaces(flatStrip(profile, sheet))
  return places.every((place, index) => index === 0 || isLess(places[index - 1] ?? NaN, place))
}
