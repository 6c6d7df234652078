/** Everything that can be wrong with a profile. The texts live in the locales, namespace `profile`. */
export const PROFILE_PROBLEM_CODES = [
  'notFinite',
  'bendCountMismatch',
  'tooManyBends',
  'legNotPositive',
  'turnOutOfRange',
  'followsIncomplete',
  'pitchOutOfRange',
  'hemNotPositive',
  'gapNotPositive',
  'legEatenByBends',
  'hemTooShort',
  'hemTooLong',
  'crossesItself',
  'stripTooWide',
  'stripWiderThanStock',
  'radiusTight',
  'radiusBelowMetal',
  'radiusBelowPaint',
  'hemBelowPaint',
  'gapTight',
] as const

/** What would put it right, in the order of the codes above. */
export const PROFILE_CURE_CODES = [
  'enterNumber',
  'matchBends',
  'splitPiece',
  'lengthenLeg',
  'turnWithinRange',
  'enterSecondPitch',
  'enterPitch',
  'lengthenHem',
  'enterGap',
  'shortenHem',
  'openUp',
  'narrowProfile',
  'widerStock',
  'softerRadius',
  'softerMetal',
  'softerPaint',
  'openHem',
  'closeHem',
] as const

export type ProfileProblemCode = (typeof PROFILE_PROBLEM_CODES)[number]
export type ProfileCureCode = (typeof PROFILE_CURE_CODES)[number]

export interface ProfileProblem {
  readonly code: ProfileProblemCode
  /** An error cannot be made; a warning can, but deserves a look. */
  readonly severity: 'error' | 'warning'
  /** The leg concerned, from 1 at edge A. */
  readonly leg: number | null
  /** The other leg, where two are in each other's way. */
  readonly otherLeg: number | null
  /** The bend concerned, from 1 at edge A. */
  readonly bend: number | null
  readonly hem: 'A' | 'B' | null
  readonly found: number | null
  /** The least or the most that `found` may be, as the code says. */
  readonly limit: number | null
  /** The unit of `found` and `limit`. */
  readonly unit: 'inches' | 'degrees' | 'count'
  readonly cure: ProfileCureCode
}

const NOTHING = {
  severity: 'error',
  leg: null,
  otherLeg: null,
  bend: null,
  hem: null,
  found: null,
  limit: null,
  unit: 'inches',
} as const

export const profileProblem = (
  given: Pick<ProfileProblem, 'code' | 'cure'> & Partial<ProfileProblem>,
): ProfileProblem => ({ ...NOTHING, ...given })

/** True when at least one problem keeps the piece from being made. */
export const hasErrors = (problems: readonly ProfileProblem[]): boolean =>
  problems.some((problem) => problem.severity === 'error')
