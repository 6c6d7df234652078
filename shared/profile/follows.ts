import type { Bend, Follows, Profile } from '#shared/profile/profile.schema'
import { angleBetweenPlanes, bendOverPlanes } from '#shared/roof-line/roof-slopes'
import { pitchAngle, turnOfIncluded } from '#shared/units/angle'
import type { Degrees } from '#shared/units/brands'

/** What the crest of a rib in a valley bends, degrees. */
const RIB: Degrees = 90

/** Roofs slope from level to short of plumb. */
export const isSlope = (slope: Degrees): boolean => slope >= 0 && slope < 90

/**
 * The included angle that the roof gives a bend, in degrees, a being the slope and a2 the second
 * one. Plane geometry of slopes, plumb faces and square cuts:
 *
 *     ridge            180 - a - a2   (a2 = a where no second slope is given)
 *     hip, valley      180 - acos(cos a cos a2), of planes at a square corner   (a2 likewise)
 *     valley rib       135 less half of what a valley bends: the two beside a rib whose crest bends
 *                      back by 90 bend the whole piece as far as a valley without a rib
 *     high-side peak   90 - a
 *     eave             90 + a with a plumb fascia, 90 square-cut
 *     gable, sidewall  90
 *     headwall         90 + a
 *     transition       180 - |a - a2|
 *
 * Null where the slope is the job's and the job's is not known, where a transition lacks its
 * second, and where a slope is none (`isSlope`).
 */
export const includedFromRoof = (follows: Follows, jobSlope: Degrees | null): Degrees | null => {
  const { rule, second } = follows
  if (rule === 'eaveSquare' || rule === 'gable' || rule === 'sidewall') return 90
  const slope = follows.pitch === 'job' ? jobSlope : follows.pitch
  if (slope === null || !isSlope(slope) || !isSlope(second ?? slope)) return null
  switch (rule) {
    case 'ridge':
      return 180 - slope - (second ?? slope)
    case 'hip':
    case 'valley':
      return angleBetweenPlanes({ slope, otherSlope: second ?? slope, planTurn: 90 })
    case 'valleyRib': {
      const valley = bendOverPlanes({ slope, otherSlope: second ?? slope, planTurn: 90 })
      return 180 - (valley + RIB) / 2
    }
    case 'highSidePeak':
      return 90 - slope
    case 'eave':
    case 'headwall':
      return 90 + slope
    case 'transition':
      return second === undefined ? null : 180 - Math.abs(slope - second)
  }
}

const resolveBend = (bend: Bend, jobSlope: Degrees | null): Bend => {
  if (!bend.follows) return bend
  const included = includedFromRoof(bend.follows, jobSlope)
  return included === null ? bend : { ...bend, turn: turnOfIncluded(included, bend.turn) }
}

/**
 * Gives every bend that follows the roof its turn for a job of pitch `jobRise` in 12 (null where
 * the pitch is not known yet: bends that need it stay as they are). A bend keeps the side it is
 * drawn to. What comes out may be no bend at all (two equal slopes); `profileProblems` tells.
 */
export const resolveFollows = (profile: Profile, jobRise: number | null): Profile => {
  const jobSlope = jobRise === null ? null : pitchAngle(jobRise)
  return { ...profile, bends: profile.bends.map((bend) => resolveBend(bend, jobSlope)) }
}
