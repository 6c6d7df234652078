import { useTranslation } from 'react-i18next'
import { roofLineMessage } from '#shared/roof-line/roof-line-message'
import type { RoofLineProblem } from '#shared/roof-line/roof-line-problem'
import { Notice } from '@/components/Notice'
import { useUnits } from '@/features/people/useUnits'

/** Why a line has no answer, and what would put it right. */
export function RoofLineProblems({ problems }: { readonly problems: readonly RoofLineProblem[] }) {
  const { t } = useTranslation('roof-line')
  const { units } = useUnits()
  return (
    <Notice kind="error">
      <ul className="flex flex-col gap-2">
        {problems.map((problem) => {
          const { key, cureKey, values } = roofLineMessage(problem, units)
          return (
            <li key={`${problem.code} ${problem.field}`}>
              {t(key, values)} {t(cureKey, values)}
            </li>
          )
        })}
      </ul>
    </Notice>
  )
}
