import { useTranslation } from 'react-i18next'
import { problemMessage } from '#shared/profile/problem-message'
import { Icon } from '@/components/Icon'
import { usePerson } from '@/features/people/person-context'
import type { CheckedPlan, DrawingCheck } from '../check/check-drawing'
import { ChecksMade } from './ChecksMade'

interface Props {
  readonly check: DrawingCheck | null
  readonly plans: readonly CheckedPlan[]
}

/** Which brakes bend the piece, or what is in the way, with the cure; and which checks were made. */
export function BendsOn({ check, plans }: Props) {
  const { t } = useTranslation('drawing')
  const { t: say } = useTranslation('profile')
  const { units } = usePerson()
  const error = check?.problems.find(({ severity }) => severity === 'error')
  const warning = check?.problems.find(({ severity }) => severity === 'warning')
  const bending = plans.filter(({ plan }) => plan.feasible)

  if (check === null) return <Line tone="plain">{t('answer.empty')}</Line>
  if (error) {
    const { key, cureKey, values } = problemMessage(error, units)
    return (
      <Line tone="bad">
        {say(key, values)} {say(cureKey, values)}
      </Line>
    )
  }
  if (plans.length === 0) return <Line tone="plain">{t('answer.planning')}</Line>
  if (bending.length === 0) return <Line tone="bad">{t('answer.bendsNowhere')}</Line>
  return (
    <Line tone="good">
      {bending.length === plans.length
        ? t('answer.bendsOnAll', { count: plans.length })
        : t('answer.bendsOn', { brakes: bending.map(({ brakeName }) => brakeName).join(', ') })}
      {warning && (
        <span className="text-ochre">
          {' '}
          {say(problemMessage(warning, units).key, problemMessage(warning, units).values)}
        </span>
      )}
      {bending[0] && <ChecksMade plan={bending[0].plan} />}
    </Line>
  )
}

const TONES = { good: 'text-oxide', bad: 'text-chalk', plain: 'text-scribe' } as const

function Line({ tone, children }: { tone: keyof typeof TONES; children: React.ReactNode }) {
  return (
    <div role="status" className={`flex items-start gap-2 px-3 py-1.5 ${TONES[tone]}`}>
      {tone !== 'plain' && (
        <Icon name={tone === 'good' ? 'done' : 'warn'} className="mt-0.5 size-5" />
      )}
      <div className="min-w-0">{children}</div>
    </div>
  )
}
