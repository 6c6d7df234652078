import type { Profile } from '#shared/profile/profile.schema'

/**
 * What of a profile settles how it is bent, as text: two profiles with the same text are one job at
 * the brake. What the bends follow on the roof has no part in it.
 */
export const bendingShape = ({ legs, bends, hemA, hemB, colorSide }: Profile): string =>
  JSON.stringify([legs, bends.map(({ turn }) => turn), hemA, hemB, colorSide])
