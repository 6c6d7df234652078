import { resolveFollows } from '#shared/profile/follows'
import type { Bend, Follows, Hem, Profile } from '#shared/profile/profile.schema'
import type { Degrees } from '#shared/units/brands'

export const STARTER_KEYS = [
  'gableRake',
  'eaveDrip',
  'ridge',
  'highSidePeak',
  'valley',
  'headwall',
  'sidewall',
  'zClosure',
] as const

export type StarterKey = (typeof STARTER_KEYS)[number]

/** Where on the roof a profile belongs. */
export const STARTER_KINDS = ['edge', 'ridge', 'valley', 'wall', 'closure'] as const

export interface Starter {
  /** Also the key of its name and description in the locales, namespace `starters`. */
  readonly key: StarterKey
  readonly kind: (typeof STARTER_KINDS)[number]
  /** Bends that follow the roof are resolved for `STARTER_PITCH`. */
  readonly profile: Profile
}

/** Rise in 12 for which the starters are drawn until a job gives its own. */
export const STARTER_PITCH = 6

const LEFT = 1
const RIGHT = -1

const closedHem = (turn: Hem['turn']): Hem => ({ style: 'closed', length: 0.5, turn })

const bend = (turn: Degrees): Bend => ({ turn })

/** A bend that the roof sets, drawn to a side of the walk. */
const roofBend = (side: 1 | -1, rule: Follows['rule']): Bend => ({
  turn: 90 * side,
  follows: { rule, pitch: 'job' },
})

const starter = (
  key: StarterKey,
  kind: Starter['kind'],
  parts: Pick<Profile, 'legs' | 'bends'> & Partial<Pick<Profile, 'hemA' | 'hemB' | 'colorSide'>>,
): Starter => ({
  key,
  kind,
  profile: resolveFollows(
    { version: 1, hemA: null, hemB: null, colorSide: 'left', ...parts },
    STARTER_PITCH,
  ),
})

/**
 * The shop's starter profiles, in the order in which a roof is closed. Common practice, no
 * source: closed half-inch hems on exposed edges, a kick that throws water off a face, the color
 * on the weather side. The dimensions are round figures to begin with, meant to be changed. Each
 * is walked with the weather side on its left.
 */
export const STARTERS: readonly Starter[] = [
  // Roof flange, plumb face, kick.
  starter('eaveDrip', 'edge', {
    legs: [4.5, 2.5, 0.75],
    bends: [roofBend(RIGHT, 'eave'), bend(30)],
    hemB: closedHem(RIGHT),
  }),
  // Roof flange, face over the rake board, kick.
  starter('gableRake', 'edge', {
    legs: [3.5, 5.5, 0.75],
    bends: [roofBend(RIGHT, 'gable'), bend(40)],
    hemB: closedHem(RIGHT),
  }),
  // Two wings with edges kicked down on the panels.
  starter('ridge', 'ridge', {
    legs: [0.75, 6.5, 6.5, 0.75],
    bends: [bend(-30), roofBend(RIGHT, 'ridge'), bend(-30)],
    hemA: closedHem(RIGHT),
    hemB: closedHem(RIGHT),
  }),
  // Roof wing over the top of a single slope, plumb face, kick.
  starter('highSidePeak', 'ridge', {
    legs: [6, 4.5, 0.75],
    bends: [roofBend(RIGHT, 'highSidePeak'), bend(40)],
    hemB: closedHem(RIGHT),
  }),
  // Two wings with hems that turn water back.
  starter('valley', 'valley', {
    legs: [10, 10],
    bends: [roofBend(LEFT, 'valley')],
    hemA: closedHem(LEFT),
    hemB: closedHem(LEFT),
  }),
  // Apron with a kicked edge on the panels, leg up the wall.
  starter('headwall', 'wall', {
    legs: [0.75, 5.5, 3.5],
    bends: [bend(-20), roofBend(LEFT, 'headwall')],
    hemA: closedHem(RIGHT),
  }),
  // Flange beside the panels with a hem that turns water back, leg up the wall.
  starter('sidewall', 'wall', {
    legs: [4.5, 5],
    bends: [roofBend(LEFT, 'sidewall')],
    hemA: closedHem(LEFT),
  }),
  // Flange on the roof, web, flange under the cover.
  starter('zClosure', 'closure', {
    legs: [1.25, 2, 1.25],
    bends: [bend(90), bend(-90)],
  }),
]

/** Throws RangeError for a key that is no starter's. */
export const getStarter = (key: StarterKey): Starter => {
  const found = STARTERS.find((candidate) => candidate.key === key)
  if (!found) throw new RangeError(`There is no starter profile ${key}.`)
  return found
}
