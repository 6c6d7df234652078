import { useTranslation } from 'react-i18next'
import { problemMessage } from '#shared/profile/problem-message'
import { Icon } from '@/components/Icon'
import type { CheckedPlan, DrawingCheck } from '@/features/drawing/check/check-drawing'
import { usePlanWords } from '@/features/drawing/usePlanWords'
import { usePerson } from '@/features/people/person-context'

interface Props {
  readonly check: DrawingCheck | null
  readonly plans: readonly CheckedPlan[]
}

/** Which brakes bend the line, or what is in the way and what cures it. */
export function LineBends({ check, plans }: Props) {
  const { t } = useTranslation('drawing')
  const { t: say } = useTranslation('profile')
  const { units } = usePerson()
  const words = usePlanWords()
  const bending = plans.filter(({ plan }) => plan.feasible)
  const error = check?.problems.find(({ severity }) => severity === 'error')

  if (check === null) return null
  if (error) {
    const { key, cureKey, values } = problemMessage(error, units)
    return <BendsLine good={false} words={`${say(key, values)} ${say(cureKey, values)}`} />
  }
  if (plans.length === 0) return null
  if (bending.length > 0) {
    return (
      <BendsLine
        good
        words={
          bending.length === plans.length
            ? t('answer.bendsOnAll', { count: plans.length })
            : t('answer.bendsOn', { brakes: bending.map(({ brakeName }) => brakeName).join(', ') })
        }
      />
    )
  }
  return (
    <BendsLine good={false} words={t('answer.bendsNowhere')}>
      <ul className="mt-1 text-ink">
        {plans.map(({ brakeId, brakeName, plan }) => (
          <li key={brakeId} className="text-small">
            {brakeName}: {words.reasons(plan).slice(0, 2).join(' ')}{' '}
            {plan.cures.slice(0, 2).map(words.cure).join('. ')}
          </li>
        ))}
      </ul>
    </BendsLine>
  )
}

interface BendsLineProps {
  readonly good: boolean
  readonly words: string
  readonly children?: React.ReactNode
}

export function BendsLine({ good, words, children }: BendsLineProps) {
  return (
    <div className={`flex items-start gap-2 ${good ? 'text-oxide' : 'text-chalk'}`}>
      <Icon name={good ? 'done' : 'warn'} className="mt-0.5 size-5" />
      <div>
        <p className={good ? '' : 'font-semibold'}>{words}</p>
        {children}
      </div>
    </div>
  )
}
