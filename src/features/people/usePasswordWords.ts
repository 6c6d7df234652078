import { useTranslation } from 'react-i18next'
import {
  PASSWORD_LEAST,
  PASSWORD_MOST,
  passwordProblem,
  type PasswordOwner,
  type PasswordProblem,
} from '#shared/people/password-rules'
import { refusedField } from '@/features/people/refused-field'

const PROBLEMS: readonly PasswordProblem[] = ['short', 'long', 'common', 'personal']

/** Why a password is not taken, in words: by the rules here, or by what the server answered. */
export function usePasswordWords(owner: PasswordOwner) {
  const { t } = useTranslation('passwords')
  const wordsOf = (problem: PasswordProblem) =>
    t(`problem.${problem}`, { least: PASSWORD_LEAST, most: PASSWORD_MOST })

  return {
    hint: t('hint', { least: PASSWORD_LEAST }),
    judge: (password: string): string | undefined => {
      const problem = passwordProblem(password, owner)
      return problem === null ? undefined : wordsOf(problem)
    },
    refusal: (error: unknown): string | undefined => {
      const code = refusedField(error, 'password')?.code
      const problem = PROBLEMS.find((known) => known === code)
      return problem && wordsOf(problem)
    },
  }
}
