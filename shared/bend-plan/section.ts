import { TOLERANCE } from '#shared/geometry/tolerance'
import { radians } from '#shared/geometry/vector'
import type { Hem, Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import type { Degrees, Inches } from '#shared/units/brands'
import type { Section } from './plan.schema'

/** The centre-line hem of a section: lip on the left of the walk when `turn` is +1. */
export type SectionHem = NonNullable<Section['hemA']>

const hemRadius = (hem: Hem): Inches => (hem.style === 'open' ? hem.gap / 2 : 0)

/** Outside set-back of one bend: what a tape reads past the straight part (see the strip's formulas). */
const setBack = (turn: Degrees, radius: Inches, thickness: Inches): Inches =>
  Math.abs(turn) <= 90
    ? (radius + thickness) * Math.tan(radians(Math.abs(turn) / 2))
    : radius + thickness

/** From the end of the straight part to the sharp corner of the centre line. */
const centreReach = (turn: Degrees, radius: Inches, thickness: Inches): Inches =>
  (radius + thickness / 2) * Math.tan(radians(Math.abs(turn) / 2))

/** What an end adds to a leg's outside dimension to make it a planning length. */
const atBend = (turn: Degrees, sheet: Sheet): { straight: Inches; reach: Inches } => ({
  straight: setBack(turn, sheet.insideRadius, sheet.thickness),
  reach: centreReach(turn, sheet.insideRadius, sheet.thickness),
})

const atHem = (hem: Hem, sheet: Sheet): { straight: Inches; reach: Inches } => ({
  straight: hemRadius(hem) + sheet.thickness,
  reach: hemRadius(hem) + sheet.thickness / 2,
})

const RAW_EDGE = { straight: 0, reach: 0 }

const planningLength = (
  outside: Inches,
  ends: readonly { straight: Inches; reach: Inches }[],
  name: string,
): Inches => {
  const straight = ends.reduce((rest, end) => rest - end.straight, outside)
  if (!(straight > -TOLERANCE)) {
    throw new RangeError(`${name} (${outside} in.) is shorter than its bends consume.`)
  }
  const length = ends.reduce((sum, end) => sum + end.reach, straight)
  if (!(length > 0)) throw new RangeError(`${name} (${outside} in.) has no length to plan with.`)
  return length
}

const sectionHem = (hem: Hem | null, sheet: Sheet, name: string): SectionHem | null =>
  hem === null
    ? null
    : {
        lip: planningLength(hem.length, [atHem(hem, sheet)], name),
        gap: hem.style === 'open' ? hem.gap : 0,
        turn: hem.turn,
      }

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
  const turns = profile.bends.map((bend) => bend.turn)
  const endAt = (turn: Degrees | undefined, hem: Hem | null) => {
    if (turn !== undefined) return atBend(turn, sheet)
    return hem === null ? RAW_EDGE : atHem(hem, sheet)
  }
  return {
    legs: profile.legs.map((leg, i) =>
      planningLength(
        leg,
        [endAt(turns[i - 1], profile.hemA), endAt(turns[i], profile.hemB)],
        `Leg ${i + 1}`,
      ),
    ),
    turns,
    hemA: sectionHem(profile.hemA, sheet, 'The hem at edge A'),
    hemB: sectionHem(profile.hemB, sheet, 'The hem at edge B'),
  }
}
