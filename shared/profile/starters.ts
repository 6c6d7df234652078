import { isLess } from '#shared/geometry/tolerance'
import { resolveFollows } from '#shared/profile/follows'
import type { Profile } from '#shared/profile/profile.schema'
import { CLOSURE_STARTERS } from '#shared/profile/starters/closure.starters'
import { CORNER_STARTERS } from '#shared/profile/starters/corner.starters'
import { EDGE_STARTERS } from '#shared/profile/starters/edge.starters'
import { RIDGE_STARTERS } from '#shared/profile/starters/ridge.starters'
import type {
  StarterDefinition,
  StarterParameter,
  StarterParameterKey,
} from '#shared/profile/starters/starter'
import { VALLEY_STARTERS } from '#shared/profile/starters/valley.starters'
import { WALL_STARTERS } from '#shared/profile/starters/wall.starters'
import { pitchAngle } from '#shared/units/angle'
import type { Degrees } from '#shared/units/brands'

/*
 * The shop's starter profiles, in the order in which a roof is closed. All of it is common
 * practice, no source: closed half-inch hems on exposed edges, a kick that throws water off a face,
 * the color on the weather side, the dimensions round figures to begin with and meant to be
 * changed, their bounds what the trade usually asks for. Each is walked with the weather side on
 * its left, but for the gutter, whose inside lies there.
 */
const DEFINITIONS = [
  ...EDGE_STARTERS,
  ...RIDGE_STARTERS,
  ...VALLEY_STARTERS,
  ...WALL_STARTERS,
  ...CORNER_STARTERS,
  ...CLOSURE_STARTERS,
] as const

export type StarterKey = (typeof DEFINITIONS)[number]['key']

/** Stable: stored starters bear them. */
export const STARTER_KEYS: readonly StarterKey[] = DEFINITIONS.map(({ key }) => key)

/** Values by parameter, in its unit; what is absent has its default. */
export type StarterParameters = Readonly<Partial<Record<StarterParameterKey, number>>>

export interface Starter extends Omit<StarterDefinition<StarterKey>, 'parts' | 'lies'> {
  /**
   * With the default of every parameter; bends that follow the roof are resolved for
   * `STARTER_PITCH`. The key is also that of its name and description in the locales, namespace
   * `starters`.
   */
  readonly profile: Profile
}

/** Rise in 12 for which the starters are drawn until a job gives its own. */
export const STARTER_PITCH = 6

/** Why a value cannot be taken for a parameter. */
export interface StarterRefusal {
  readonly parameter: StarterParameter
  readonly reason: 'notFinite' | 'belowLeast' | 'aboveMost'
}

/** Null where the value may be taken. */
export const findStarterRefusal = (
  parameter: StarterParameter,
  value: number,
): StarterRefusal | null => {
  if (!Number.isFinite(value)) return { parameter, reason: 'notFinite' }
  if (isLess(value, parameter.least)) return { parameter, reason: 'belowLeast' }
  return isLess(parameter.most, value) ? { parameter, reason: 'aboveMost' } : null
}

const definitionOf = (key: StarterKey): StarterDefinition<StarterKey> => {
  const found = DEFINITIONS.find((candidate) => candidate.key === key)
  if (!found) throw new RangeError(`There is no starter profile ${key}.`)
  return found
}

const checkParameters = (
  { key, parameters }: StarterDefinition<StarterKey>,
  given: StarterParameters,
): void => {
  for (const [name, value] of Object.entries(given)) {
    const parameter = parameters.find((known) => known.key === name)
    if (!parameter) throw new RangeError(`The starter ${key} has no parameter ${name}.`)
    if (findStarterRefusal(parameter, value)) {
      const { least, most, unit } = parameter
      throw new RangeError(`${name} must be from ${least} to ${most} ${unit}, not ${value}.`)
    }
  }
}

/**
 * A starter made to a roof: `given` sets what is not to have its default, `pitch` is the rise in 12
 * of the job (null: `STARTER_PITCH`), which bends that follow the roof are resolved for and remain
 * tied to. For a pitch outside the starter's own range the profile may have problems;
 * `profileProblems` tells. Throws RangeError for a key that is no starter's, a parameter it does
 * not have, and a value out of bounds.
 */
export const starterProfile = (
  key: StarterKey,
  given: StarterParameters,
  pitch: number | null,
): Profile => {
  const definition = definitionOf(key)
  checkParameters(definition, given)
  const rise = pitch ?? STARTER_PITCH
  const value = (name: StarterParameterKey): number => {
    const found = given[name] ?? definition.parameters.find((known) => known.key === name)?.default
    if (found === undefined) throw new RangeError(`The starter ${key} has no parameter ${name}.`)
    return found
  }
  return resolveFollows(
    {
      version: 1,
      hemA: null,
      hemB: null,
      colorSide: 'left',
      ...definition.parts(value, rise),
    },
    rise,
  )
}

/** The turn from leg 1 to a leg, both from 1. */
const turnTo = ({ bends }: Profile, leg: number): Degrees =>
  bends.slice(0, leg - 1).reduce((sum, { turn }) => sum + turn, 0)

/**
 * Where leg 1 of a starter heads when the piece lies in place, seen from its right end: degrees
 * counter-clockwise from the right. `profile` is what `starterProfile` made of it for `pitch`.
 */
export const starterHeading = (
  key: StarterKey,
  profile: Profile,
  pitch: number | null,
): Degrees => {
  const { lies } = definitionOf(key)
  if ('leg' in lies) return lies.heading - turnTo(profile, lies.leg)
  if ('upSlope' in lies) {
    return pitchAngle(pitch ?? STARTER_PITCH) - turnTo(profile, lies.upSlope)
  }
  const bent = profile.bends[lies.evenAbout - 1]?.turn ?? 0
  return 0 - bent / 2 - turnTo(profile, lies.evenAbout)
}

export const STARTERS: readonly Starter[] = DEFINITIONS.map(({ key, kind, parameters, pitch }) => ({
  key,
  kind,
  parameters,
  pitch,
  profile: starterProfile(key, {}, null),
}))

/** Undefined where no starter has the key. */
export const findStarter = (key: string): Starter | undefined =>
  STARTERS.find((candidate) => candidate.key === key)

/** Throws RangeError for a key that is no starter's. */
export const getStarter = (key: StarterKey): Starter => {
  const found = findStarter(key)
  if (!found) throw new RangeError(`There is no starter profile ${key}.`)
  return found
}
