import type { Bend, Follows, Hem, Profile } from '#shared/profile/profile.schema'
import type { Degrees, Inches } from '#shared/units/brands'

/** Where on the roof a profile belongs. */
export const STARTER_KINDS = ['edge', 'ridge', 'valley', 'wall', 'corner', 'closure'] as const

/** What a roof sets of a starter besides its pitch; also the keys of their names in the locales. */
export const STARTER_PARAMETER_KEYS = [
  'faceWidth',
  'wingWidth',
  'flangeWidth',
  'apronWidth',
  'wallHeight',
  'wallWidth',
  'bottomWidth',
  'topWidth',
  'ribHeight',
  'ribSide',
  'cornerAngle',
  'steeperBy',
] as const

export type StarterParameterKey = (typeof STARTER_PARAMETER_KEYS)[number]

/** `rise` is a rise in 12. */
export type StarterUnit = 'inches' | 'degrees' | 'rise'

/** One measure that is set before drawing; the bounds are allowed themselves. */
export interface StarterParameter {
  readonly key: StarterParameterKey
  readonly default: number
  readonly least: number
  readonly most: number
  readonly unit: StarterUnit
}

/** Rises in 12 that a starter is meant for. */
export interface PitchRange {
  readonly least: number
  readonly most: number
}

/** Any roof that a job may have. */
export const ANY_PITCH: PitchRange = { least: 0, most: 24 }

/** Legs, bends and hems of a starter; hems absent are none, the color lies on the left unless said. */
export type StarterParts = Pick<Profile, 'legs' | 'bends'> &
  Partial<Pick<Profile, 'hemA' | 'hemB' | 'colorSide'>>

/** Gives the value of a parameter: as it was set, or its default. */
export type Value = (key: StarterParameterKey) => number

/**
 * How a piece lies in place, seen from its right end: a leg (from 1) heads somewhere, degrees
 * counter-clockwise from the right; or a leg lies up the job's slope; or the legs beside a bend fall
 * away from it alike.
 */
export type Lies =
  | { readonly leg: number; readonly heading: Degrees }
  | { readonly upSlope: number }
  | { readonly evenAbout: number }

export interface StarterDefinition<Key extends string = string> {
  readonly key: Key
  readonly kind: (typeof STARTER_KINDS)[number]
  readonly parameters: readonly StarterParameter[]
  /** Null where the pitch plays no part. */
  readonly pitch: PitchRange | null
  readonly lies: Lies
  /** `rise` in 12; needed only where a slope beside the job's is told by it. */
  readonly parts: (value: Value, rise: number) => StarterParts
}

export const LEFT = 1
export const RIGHT = -1

/** Half an inch closed, on exposed edges: common practice, no source. */
export const closedHem = (turn: Hem['turn']): Hem => ({ style: 'closed', length: 0.5, turn })

export const bend = (turn: Degrees): Bend => ({ turn })

/** A bend that the roof sets, drawn to a side of the walk. */
export const roofBend = (side: 1 | -1, rule: Follows['rule'], second?: Degrees): Bend => ({
  turn: 90 * side,
  follows: { rule, pitch: 'job', ...(second === undefined ? {} : { second }) },
})

export const inches = (
  key: StarterParameterKey,
  usual: Inches,
  least: Inches,
  most: Inches,
): StarterParameter => ({ key, default: usual, least, most, unit: 'inches' })
