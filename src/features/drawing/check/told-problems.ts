import { findCureEdit } from '#shared/profile/cures'
import type { ProfileProblem } from '#shared/profile/problem'
import type { ProfileCure } from '#shared/profile/profile-cure'
import type { Profile } from '#shared/profile/profile.schema'
import { stockLimits } from '#shared/profile/stock-limits'
import type { Stock } from '#shared/stock/stock.schema'
import { partsOfProblem } from './check-drawing'

/** A problem as it is told on the board, with the one edit that cures it, where one does. */
export interface ToldProblem {
  readonly problem: ProfileProblem
  /** Found for the very profile and stock that have the problem. */
  readonly cure: ProfileCure | null
}

/** Errors before warnings, each with its cure, tried out on this stock. */
export function tellProblems(
  profile: Profile,
  stock: Stock,
  problems: readonly ProfileProblem[],
): ToldProblem[] {
  const limits = stockLimits(stock)
  return problems
    .toSorted((a, b) => Number(a.severity === 'warning') - Number(b.severity === 'warning'))
    .map((problem) => ({ problem, cure: findCureEdit(profile, problem, stock.sheet, limits) }))
}

/** The parts of the figure to be lit: what cannot be made, and what can but deserves a look. */
export const partsLit = (told: readonly ToldProblem[]) => {
  const partsOf = (severity: ProfileProblem['severity']) =>
    told
      .filter(({ problem }) => problem.severity === severity)
      .flatMap(({ problem }) => partsOfProblem(problem))
  return { problems: partsOf('error'), warnings: partsOf('warning') }
}
