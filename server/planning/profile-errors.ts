import { profileProblemText } from '#server/planning/profile-problem-text'
import type { FieldError } from '#shared/http/problem'
import type { ProfileProblem } from '#shared/profile/problem'
import { profileProblems } from '#shared/profile/problems'
import type { Profile } from '#shared/profile/profile.schema'
import { stockLimits } from '#shared/profile/stock-limits'
import type { Stock } from '#shared/stock/stock.schema'

/** Where in the request the part lies that a problem is about; lists count from 0. */
function placeOf({ bend, hem, leg }: ProfileProblem): string {
  if (bend !== null) return `.bends.${bend - 1}`
  if (hem !== null) return `.hem${hem}`
  return leg === null ? '' : `.legs.${leg - 1}`
}

/**
 * What keeps a profile from being made of a stock (null: of any sheet), named by the fields below
 * `path`. Empty when it can be made; warnings do not count.
 */
export const profileErrors = (profile: Profile, stock: Stock | null, path: string): FieldError[] =>
  profileProblems(profile, stock?.sheet ?? null, stock ? stockLimits(stock) : {})
    .filter(({ severity }) => severity === 'error')
    .map((problem) => ({
      path: path + placeOf(problem),
      message: profileProblemText(problem),
      code: problem.code,
    }))
