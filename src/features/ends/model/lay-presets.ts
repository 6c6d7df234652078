import { isLess } from '#shared/geometry/tolerance'
import { profileCorners } from '#shared/profile/corners'
import type { Profile } from '#shared/profile/profile.schema'
import { rotate } from '#shared/geometry/vector'
import type { Degrees } from '#shared/units/brands'
import type { Run, TurnsTo } from './corner-presets'

/**
 * How a leg lies on the roof, walked from edge A to edge B: level, up or down the slope of the roof
 * beside a level piece, or plumb.
 */
export const LEG_LIES = ['level', 'upSlope', 'downSlope', 'plumb', 'own'] as const
export type LegLies = (typeof LEG_LIES)[number]

/** Within this many degrees a typed lay is that of a preset. */
const SAME_LAY = 0.01

/** From -180 up to, but not at, 180. */
const wrapped = (angle: Degrees): Degrees => ((((angle + 180) % 360) + 360) % 360) - 180

/** How far leg `leg` (from 1) is turned from leg 1, degrees. */
export const turnOfLeg = ({ bends }: Profile, leg: number): Degrees =>
  bends.slice(0, leg - 1).reduce((sum, { turn }) => sum + turn, 0)

/** The directions from A to B that a leg may have for a preset, degrees from u. */
const directions: Record<Exclude<LegLies, 'own'>, (slope: Degrees) => readonly Degrees[]> = {
  level: () => [0, 180],
  upSlope: (slope) => [slope, 180 - slope],
  downSlope: (slope) => [0 - slope, 180 + slope],
  plumb: () => [90, -90],
}

/** A sloped piece has the roof level across it, so only level and plumb are roof directions there. */
export const liesOf = ({ lowEnd, slope }: Run): readonly LegLies[] =>
  lowEnd === null && slope > 0 ? LEG_LIES : ['level', 'plumb', 'own']

/** How a leg lies when the piece has this lay; the first that fits. */
export function legLies(profile: Profile, leg: number, lay: Degrees | null, run: Run): LegLies {
  if (lay === null) return 'own'
  const direction = lay + turnOfLeg(profile, leg)
  const found = liesOf(run).find(
    (lies) =>
      lies !== 'own' &&
      directions[lies](run.slope).some(
        (wanted) => Math.abs(wrapped(wanted - direction)) <= SAME_LAY,
      ),
  )
  return found ?? 'own'
}

/** The lay at which a leg lies so: of those that do, the one that turns the piece least from `lay`. */
export function layFor(
  profile: Profile,
  leg: number,
  lies: Exclude<LegLies, 'own'>,
  lay: Degrees,
  { slope }: Run,
): Degrees {
  const turns = directions[lies](slope).map((wanted) =>
    wrapped(wanted - turnOfLeg(profile, leg) - lay),
  )
  const least = turns.reduce((best, turn) => (Math.abs(turn) < Math.abs(best) ? turn : best))
  return wrapped(lay + least)
}

/**
 * The lay a piece begins with: by its first bend that follows the roof, whose rule says which leg
 * lies on the roof and which stands plumb; leg 1 level where none does. Edge A is taken to lie on
 * the roof, as in the starters.
 */
export function usualLay(profile: Profile, run: Run): Degrees {
  const bend = profile.bends.findIndex(({ follows }) => !!follows) + 1
  const drawn = profile.bends[bend - 1]
  if (!drawn?.follows) return 0
  const before = turnOfLeg(profile, bend)
  switch (drawn.follows.rule) {
    case 'eave':
    case 'highSidePeak':
    case 'headwall':
      return run.lowEnd === null
        ? wrapped((drawn.turn < 0 ? -90 : 90) - before - drawn.turn)
        : 0 - before
    case 'eaveSquare':
      return run.lowEnd === null ? wrapped(0 - run.slope - before) : 0 - before
    case 'ridge':
      return run.lowEnd === null ? wrapped(run.slope - before) : 0 - before
    case 'hip':
    case 'valley':
      return wrapped(drawn.turn / -2 - before)
    case 'valleyRib':
      // The wing before the rib falls by half of what the whole valley bends.
      return wrapped(Math.sign(drawn.turn) * (45 - Math.abs(drawn.turn)) - before)
    case 'gable':
    case 'sidewall':
    case 'transition':
      return wrapped(0 - before)
  }
}

/**
 * The edge that lies lower and so, as a rule, on the outside of the building: B where both lie
 * equally high. Tells an outside corner from an inside one.
 */
export function outerEdge(profile: Profile, lay: Degrees | null): TurnsTo {
  const corners = profileCorners(profile)
  const end = corners.at(-1)
  if (!end) return 'B'
  return isLess(0, rotate(end, lay ?? 0).y) ? 'A' : 'B'
}

/** Legs that lie in the plane of the roof at a corner where gable and level piece meet. */
export function legsOnRoof(profile: Profile, lay: Degrees | null, run: Run): readonly number[] {
  if (lay === null) return []
  // Beside a level piece the roof rises away from its outer edge; along a gable it is level across.
  const rise = run.lowEnd === null ? run.slope * (outerEdge(profile, lay) === 'B' ? -1 : 1) : 0
  return profile.legs.flatMap((_, index) => {
    const off = wrapped(2 * (lay + turnOfLeg(profile, index + 1) - rise)) / 2
    return Math.abs(off) <= SAME_LAY ? [index + 1] : []
  })
}
