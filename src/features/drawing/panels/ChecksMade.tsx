import { useTranslation } from 'react-i18next'
import type { Plan } from '#shared/bend-plan/plan.schema'
import { usePlanWords } from '../usePlanWords'

/** Which tests the plan has passed; what was not tested is not promised. */
export function ChecksMade({ plan }: { readonly plan: Plan }) {
  const { t } = useTranslation('drawing')
  const words = usePlanWords()
  return (
    <details className="inline-block text-small text-scribe open:block">
      <summary>{t('answer.checked', { count: plan.checks.length })}</summary>
      {words.checks(plan.checks)}
    </details>
  )
}
