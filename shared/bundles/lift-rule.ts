import type { Inches, Pounds } from '#shared/units/brands'

/**
 * The one rule for lifting bundles, shown wherever a bundle is lifted. All limits are common
 * practice, no source. What weighs or measures exactly a limit is still within it.
 */
export interface LiftRule {
  /** Pounds one person lifts; a shop may set less. */
  readonly onePersonWeight: Pounds
  /** Inches one person carries: longer bundles whip and turn the carrier round. */
  readonly onePersonLength: Inches
  /** Pounds that one person never lifts, whatever the shop sets. */
  readonly neverOneWeight: Pounds
}

export const LIFT_RULE: LiftRule = {
  onePersonWeight: 35,
  onePersonLength: 96,
  neverOneWeight: 51,
}

/** `neverOne` asks for two people like `twoPeople`, and says that there is no leave for less. */
export type Lift = 'onePerson' | 'twoPeople' | 'neverOne'

/**
 * How a bundle is lifted: `weight` in pounds, `longest` piece in inches.
 *
 * @throws RangeError for what is no weight or no length
 */
export function liftOf(
  { weight, longest }: { readonly weight: Pounds; readonly longest: Inches },
  rule: LiftRule = LIFT_RULE,
): Lift {
  if (!(weight >= 0) || !(longest >= 0)) {
    throw new RangeError(`No bundle weighs ${weight} lb and is ${longest} in. long.`)
  }
  if (weight > rule.neverOneWeight) return 'neverOne'
  if (weight > rule.onePersonWeight || longest > rule.onePersonLength) return 'twoPeople'
  return 'onePerson'
}
