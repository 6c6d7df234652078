import { isAtMost, isLess } from '#shared/geometry/tolerance'
import { findCrossing } from '#shared/profile/crossing'
import type { ProfileProblem } from '#shared/profile/problem'
import { hasErrors, profileProblem } from '#shared/profile/problem'
import type { Profile } from '#shared/profile/profile.schema'
import { sheetWarnings } from '#shared/profile/sheet-warnings'
import { valueProblems } from '#shared/profile/value-problems'
import type { FlatParts, FlatRun, FoldingSheet } from '#shared/strip/flat-parts'
import { flatParts } from '#shared/strip/flat-parts'
import { flatStrip, girthOf } from '#shared/strip/flat-strip'
import type { Inches } from '#shared/units/brands'

/** No coil, sheet or brake of this trade takes more. */
export const WIDEST_STRIP: Inches = 60

/** What the stock in hand allows; `stockLimits` reads it off a stock. */
export interface ProfileLimits {
  /** The widest strip that can be cut of the stock. */
  readonly widestStrip?: Inches
  /** The smallest inside radius that its alloy bears, where the alloy is known. */
  readonly metalRadius?: Inches
  /** The smallest inside radius that its paint bears on the outside, where it is rated. */
  readonly paintRadius?: Inches
}

/**
 * Stands in while no stock is chosen: thin and folded sharp, so that only what no sheet at all
 * could do is reported.
 */
const THINNEST: FoldingSheet = { thickness: 0.001, insideRadius: 0, kFactor: 0.5 }

/** The number a run is spoken of by: a lip is part of the leg that it lies on. */
const legNumber = (of: FlatRun['of'], profile: Profile): number =>
  of === 'lipA' ? 1 : of === 'lipB' ? profile.legs.length : of

const hemOf = (of: FlatRun['of']): 'A' | 'B' | null =>
  of === 'lipA' ? 'A' : of === 'lipB' ? 'B' : null

/** Legs and lips that their own bends use up. */
const eatenProblems = ({ runs }: FlatParts): ProfileProblem[] =>
  runs
    .filter((run) => isLess(run.straight, 0))
    .map((run) => {
      const values = { found: run.outside, limit: run.outside - run.straight }
      return typeof run.of === 'number'
        ? profileProblem({ code: 'legEatenByBends', cure: 'lengthenLeg', leg: run.of, ...values })
        : profileProblem({
            code: 'hemTooShort',
            cure: 'lengthenHem',
            hem: hemOf(run.of),
            ...values,
          })
    })

/** A lip may lie along its leg as far as the zone of the next fold, or to the edge. */
const longHemProblems = (profile: Profile, { folds }: FlatParts): ProfileProblem[] => {
  const check = (hem: 'A' | 'B') => {
    const lip = hem === 'A' ? profile.hemA : profile.hemB
    const leg = hem === 'A' ? 1 : profile.legs.length
    if (!lip) return []
    const nextFold = hem === 'A' ? folds[1] : folds[folds.length - 2]
    const limit = (profile.legs[leg - 1] ?? 0) - (nextFold?.setback ?? 0)
    return isLess(limit, lip.length)
      ? [
          profileProblem({
            code: 'hemTooLong',
            cure: 'shortenHem',
            hem,
            leg,
            found: lip.length,
            limit,
          }),
        ]
      : []
  }
  return [...check('A'), ...check('B')]
}

const crossingProblems = (profile: Profile, parts: FlatParts): ProfileProblem[] => {
  const crossing = findCrossing(parts)
  if (!crossing) return []
  const [earlier, later] = crossing
  return [
    profileProblem({
      code: 'crossesItself',
      cure: 'openUp',
      leg: legNumber(later, profile),
      otherLeg: legNumber(earlier, profile),
      hem: hemOf(later) ?? hemOf(earlier),
    }),
  ]
}

/** The leg that is too wide all alone, if one is. */
const legOver = ({ legs }: Profile, limit: Inches): number | null => {
  const longest = Math.max(...legs)
  return isLess(limit, longest) ? legs.indexOf(longest) + 1 : null
}

const widthProblems = (
  profile: Profile,
  found: Inches,
  { widestStrip }: ProfileLimits,
): ProfileProblem[] => {
  const wider = (limit: Inches) => ({ found, limit, leg: legOver(profile, limit) })
  if (!isAtMost(found, WIDEST_STRIP)) {
    return [profileProblem({ code: 'stripTooWide', cure: 'narrowProfile', ...wider(WIDEST_STRIP) })]
  }
  return widestStrip !== undefined && isLess(widestStrip, found)
    ? [profileProblem({ code: 'stripWiderThanStock', cure: 'widerStock', ...wider(widestStrip) })]
    : []
}

/**
 * Everything that is wrong with a profile, worst first: values that mean nothing, then what the
 * bends do not leave room for, then what is too wide, then warnings. Without a sheet only what no
 * sheet could do is reported. Never throws on a value of the profile's shape, NaN and infinity
 * included, and never mends anything by itself.
 *
 * The widest strip and the number of bends are this product's own bounds.
 */
export const profileProblems = (
  profile: Profile,
  sheet: FoldingSheet | null,
  limits: ProfileLimits = {},
): ProfileProblem[] => {
  const values = valueProblems(profile)
  if (hasErrors(values)) {
    const girth = girthOf(profile)
    return [
      ...values,
      ...(Number.isFinite(girth) && girth > WIDEST_STRIP ? widthProblems(profile, girth, {}) : []),
    ]
  }
  const parts = flatParts(profile, sheet ?? THINNEST)
  const eaten = eatenProblems(parts)
  const width = widthProblems(profile, flatStrip(profile, sheet ?? THINNEST).stripWidth, limits)
  const longHems = longHemProblems(profile, parts)
  // What cannot be folded cannot be looked at folded; its own fault is named already.
  const foldable =
    eaten.length === 0 &&
    longHems.length === 0 &&
    !width.some(({ code }) => code === 'stripTooWide')
  return [
    ...eaten,
    ...longHems,
    ...(foldable ? crossingProblems(profile, parts) : []),
    ...width,
    ...(sheet ? sheetWarnings(profile, sheet, limits) : []),
  ]
}
