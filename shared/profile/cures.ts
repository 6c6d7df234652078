import { cureCandidates } from '#shared/profile/cure-candidates'
import type { ProfileCure } from '#shared/profile/profile-cure'
import { applyEdit } from '#shared/profile/edits'
import type { ProfileProblem, ProfileProblemCode } from '#shared/profile/problem'
import type { ProfileLimits } from '#shared/profile/problems'
import { profileProblems } from '#shared/profile/problems'
import type { Profile } from '#shared/profile/profile.schema'
import type { FoldingSheet } from '#shared/strip/flat-parts'

/** What keeps other problems from being looked for; curing it may bring them to light. */
const HIDES_OTHERS: readonly ProfileProblemCode[] = [
  'legNotPositive',
  'turnOutOfRange',
  'followsIncomplete',
  'pitchOutOfRange',
  'hemNotPositive',
  'gapNotPositive',
  'legEatenByBends',
  'hemTooShort',
  'hemTooLong',
]

const isSame = (a: ProfileProblem, b: ProfileProblem): boolean =>
  a.code === b.code &&
  a.leg === b.leg &&
  a.otherLeg === b.otherLeg &&
  a.bend === b.bend &&
  a.hem === b.hem

const countOf = (problems: readonly ProfileProblem[], code: ProfileProblemCode): number =>
  problems.filter((problem) => problem.code === code).length

/** A corner taken away renumbers what comes after it, so that only counting tells. */
const isGone = (
  problem: ProfileProblem,
  edit: ProfileCure,
  before: readonly ProfileProblem[],
  after: readonly ProfileProblem[],
): boolean =>
  edit.kind === 'removeCorner'
    ? countOf(after, problem.code) < countOf(before, problem.code)
    : !after.some((left) => isSame(left, problem))

const bringsErrors = (
  before: readonly ProfileProblem[],
  after: readonly ProfileProblem[],
): boolean =>
  after.some(
    ({ code, severity }) => severity === 'error' && countOf(after, code) > countOf(before, code),
  )

/**
 * One edit that cures a problem of a profile, tried out: after `applyEdit` the problem is gone, and
 * no new error has come, except one that the cured problem kept from being seen. Null where no
 * single edit does, as where only the stock can be changed, or a person must say what is meant. The
 * sheet (null: any) and the limits are those that the problem was found with.
 */
export const findCureEdit = (
  profile: Profile,
  problem: ProfileProblem,
  sheet: FoldingSheet | null,
  limits: ProfileLimits = {},
): ProfileCure | null => {
  if (profile.bends.length !== profile.legs.length - 1) return null
  const before = profileProblems(profile, sheet, limits)
  let second: ProfileCure | null = null
  for (const edit of cureCandidates(profile, problem)) {
    const after = profileProblems(applyEdit(profile, edit), sheet, limits)
    if (!isGone(problem, edit, before, after)) continue
    if (!bringsErrors(before, after)) return edit
    if (HIDES_OTHERS.includes(problem.code)) second ??= edit
  }
  return second
}
