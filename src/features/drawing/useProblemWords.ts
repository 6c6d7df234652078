import { useTranslation } from 'react-i18next'
import { cureMessage } from '#shared/profile/cure-message'
import type { ProfileProblem } from '#shared/profile/problem'
import { problemMessage } from '#shared/profile/problem-message'
import type { ProfileCure } from '#shared/profile/profile-cure'
import type { Profile } from '#shared/profile/profile.schema'
import { usePerson } from '@/features/people/person-context'

/** A problem in words, what would cure it in general, and what one cure does to this drawing. */
export function useProblemWords() {
  const { t } = useTranslation('profile')
  const { units } = usePerson()
  return {
    problem: (problem: ProfileProblem): string => {
      const { key, values } = problemMessage(problem, units)
      return t(key, values)
    },
    advice: (problem: ProfileProblem): string => {
      const { cureKey, values } = problemMessage(problem, units)
      return t(cureKey, values)
    },
    cure: (profile: Profile, cure: ProfileCure): string => {
      const { key, values } = cureMessage(profile, cure, units)
      return t(key, values)
    },
  }
}
