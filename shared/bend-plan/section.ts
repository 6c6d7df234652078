import { TOLERANCE } from '#shared/geometry/tolerance'
import type { Hem, Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import { centerLengths } from '#shared/strip/center-line'
import type { FlatRun } from '#shared/strip/flat-parts'
import { flatParts } from '#shared/strip/flat-parts'
import type { Inches } from '#shared/units/brands'
import type { Section } from './plan.schema'

/** The centre-line hem of a section: lip on the left of the walk when `turn` is +1. */
export type SectionHem = NonNullable<Section['hemA']>

const named = (of: FlatRun['of']): string =>
  of === 'lipA' ? 'The hem at edge A' : of === 'lipB' ? 'The hem at edge B' : `Leg ${of}`

const checkLength = ({ of, outside, straight }: FlatRun, length: Inches): Inches => {
  if (!(straight > -TOLERANCE)) {
    throw new RangeError(`${named(of)} (${outside} in.) is shorter than its bends consume.`)
  }
  if (!(length > 0)) {
    throw new RangeError(`${named(of)} (${outside} in.) has no length to plan with.`)
  }
  return length
}

const sectionHem = (hem: Hem | null, lip: Inches | undefined): SectionHem | null =>
  hem === null || lip === undefined
    ? null
    : { lip, gap: hem.style === 'open' ? hem.gap : 0, turn: hem.turn }

/**
 * The section the planner works on: legs along the centre line to sharp corners (inches), signed
 * turns (degrees, positive folds to the left of the walk), hems with their lips apart.
 *
 * A planning length is the leg's straight part plus (R + T/2) tan(|turn|/2) at each bent end, and
 * plus R + T/2 at a hem's fold, for leg and lip alike; R = gap/2 for an open hem, 0 for a closed one.
 *
 * Throws RangeError where a leg is shorter than its bends consume: ask for the profile's problems first.
 */
export const sectionOf = (profile: Profile, sheet: Sheet): Section => {
  const parts = flatParts(profile, sheet)
  const along = centerLengths(parts)
  const lengths = new Map(
    parts.runs.map((run, index) => [run.of, checkLength(run, along[index] ?? NaN)]),
  )
  return {
    legs: profile.legs.map((_, index) => lengths.get(index + 1) ?? NaN),
    turns: profile.bends.map((bend) => bend.turn),
    hemA: sectionHem(profile.hemA, lengths.get('lipA')),
    hemB: sectionHem(profile.hemB, lengths.get('lipB')),
  }
}
