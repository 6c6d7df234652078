import type { ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import { Icon } from '@/components/Icon'
import type { CheckedPlan, DrawingCheck } from '../check/check-drawing'
import type { ToldProblem } from '../check/told-problems'
import { useProblemWords } from '../useProblemWords'
import { ChecksMade } from './ChecksMade'

interface Props {
  readonly check: DrawingCheck | null
  readonly plans: readonly CheckedPlan[]
  /** The worst that was found. */
  readonly first: ToldProblem | undefined
}

/** Which brakes bend the piece, or what is in the way; and which checks were made. */
export function BendsOn({ check, plans, first }: Props) {
  const { t } = useTranslation('drawing')
  const words = useProblemWords()
  const cannotBeMade = first?.problem.severity === 'error'
  if (check === null) return <Line tone="plain">{t('answer.empty')}</Line>
  return (
    <>
      {!cannotBeMade && <Brakes plans={plans} briefly={first !== undefined} />}
      {first && (
        <Line tone={cannotBeMade ? 'bad' : 'warning'}>
          {words.problem(first.problem)}
          {first.cure === null && ` ${words.advice(first.problem)}`}
        </Line>
      )}
    </>
  )
}

interface BrakesProps {
  readonly plans: readonly CheckedPlan[]
  /** How many instead of which, where there is more to be told. */
  readonly briefly: boolean
}

function Brakes({ plans, briefly }: BrakesProps) {
  const { t } = useTranslation('drawing')
  const bending = plans.filter(({ plan }) => plan.feasible)
  const [best] = bending
  if (plans.length === 0) return <Line tone="plain">{t('answer.planning')}</Line>
  if (!best) return <Line tone="bad">{t('answer.bendsNowhere')}</Line>
  return (
    <Line tone="good">
      <span className="mr-2">
        {bending.length === plans.length
          ? t('answer.bendsOnAll', { count: plans.length })
          : briefly
            ? t('answer.bendsOnSome', { bending: bending.length, brakes: plans.length })
            : t('answer.bendsOn', { brakes: bending.map(({ brakeName }) => brakeName).join(', ') })}
      </span>
      <ChecksMade plan={best.plan} />
    </Line>
  )
}

const TONES = {
  good: 'text-oxide',
  bad: 'text-chalk',
  warning: 'text-small text-ochre',
  plain: 'text-scribe',
} as const

function Line({ tone, children }: { tone: keyof typeof TONES; children: ReactNode }) {
  return (
    <div role="status" className={`flex items-start gap-2 px-3 pt-1.5 ${TONES[tone]}`}>
      {tone !== 'plain' && (
        <Icon name={tone === 'good' ? 'done' : 'warn'} className="mt-0.5 size-5" />
      )}
      <div className="min-w-0">{children}</div>
    </div>
  )
}
