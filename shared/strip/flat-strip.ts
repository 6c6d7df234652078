import type { Profile } from '#shared/profile/profile.schema'
import type { FoldingSheet } from '#shared/strip/flat-parts'
import { flatParts } from '#shared/strip/flat-parts'
import type { Crease, Strip } from '#shared/strip/strip.schema'
import type { Inches } from '#shared/units/brands'

/**
 * The nominal girth (stretch-out) in inches: the sum of legs and hem lengths, before any bend
 * deduction. It is what the trade prices by.
 */
export const girthOf = (profile: Profile): Inches =>
  profile.legs.reduce((sum, leg) => sum + leg, 0) +
  (profile.hemA?.length ?? 0) +
  (profile.hemB?.length ?? 0)

/**
 * Unfolds a profile: the true flat width and its creases, in inches from edge A.
 *
 *     strip width = sum of legs + hem lengths - sum of bend deductions
 *
 * The width is added up run by run and zone by zone, so the creases and the width agree to the
 * last bit. Values are exact; only what is shown is rounded. Nothing is checked here: ask
 * `profileProblems` whether the piece can exist.
 */
export const flatStrip = (profile: Profile, sheet: FoldingSheet): Strip => {
  const { runs, folds } = flatParts(profile, sheet)
  const creases: Crease[] = []
  let reached = 0
  runs.forEach((run, index) => {
    reached += run.straight
    const zone = folds[index]
    if (!zone) return
    const from = reached
    reached += zone.allowance
    creases.push({
      fold: zone.fold,
      at: from + zone.allowance / 2,
      from,
      to: reached,
      turn: zone.turn,
    })
  })
  return { girth: girthOf(profile), stripWidth: reached, creases }
}

/**
 * A width rounded to the nearest 1/32 in. for the shear. For show only: rounded values are never
 * added up or stored.
 */
export const roundToShear = (width: Inches): Inches => Math.round(width * 32) / 32
