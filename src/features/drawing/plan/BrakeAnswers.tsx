import { useTranslation } from 'react-i18next'
import type { PlanCure } from '#shared/bend-plan/plan.schema'
import type { ShopBrake } from '#shared/brakes/brakes.contract'
import type { Profile } from '#shared/profile/profile.schema'
import type { Stock } from '#shared/stock/stock.schema'
import { Button } from '@/components/Button'
import { Icon } from '@/components/Icon'
import { useFormats } from '@/lib/format/useFormats'
import type { CheckedPlan } from '../check/check-drawing'
import { PlanSteps } from './PlanSteps'
import { WhyNot } from './WhyNot'

interface Props {
  readonly plans: readonly CheckedPlan[]
  readonly brakes: readonly ShopBrake[]
  readonly profile: Profile
  readonly stock: Stock
  readonly pieceLength: number
  /** Reasons with their pictures and cures come with the server's word. */
  readonly confirmed: boolean
  readonly onCure?: (cure: PlanCure) => void
  /** Given where the answers stand in place of something else. */
  readonly onClose?: () => void
}

/** Every brake of the shop: how it bends the piece, at what cost and in what time, or why it does not. */
export function BrakeAnswers({
  plans,
  brakes,
  profile,
  stock,
  pieceLength,
  confirmed,
  onCure,
  onClose,
}: Props) {
  const { t } = useTranslation('why')
  const { t: say } = useTranslation('plan')
  const { duration } = useFormats()
  const paintHex = stock.painted ? stock.colorHex : null
  const ordered = plans.toSorted((a, b) => Number(b.plan.feasible) - Number(a.plan.feasible))
  return (
    <section aria-label={t('brakesTitle')} className="flex flex-col divide-y divide-rule">
      {onClose && (
        <div className="flex items-center justify-between gap-3">
          <h2 className="text-lead font-bold">{t('brakesTitle')}</h2>
          <Button variant="quiet" onClick={onClose}>
            {t('close')}
          </Button>
        </div>
      )}
      {!confirmed && <p className="py-2 text-small text-scribe">{t('waiting')}</p>}
      {ordered.map(({ brakeId, brakeName, plan }) => {
        const brake = brakes.find(({ id }) => id === brakeId)?.brake
        const hits = plan.steps.reduce((sum, step) => sum + step.hits, 0)
        return (
          <article key={brakeId} className="flex min-w-0 flex-col gap-2 py-3">
            <h3
              className={`flex items-center gap-2 font-bold ${plan.feasible ? 'text-oxide' : 'text-chalk'}`}
            >
              <Icon name={plan.feasible ? 'done' : 'warn'} className="size-5" />
              {brakeName}
            </h3>
            {plan.feasible && plan.cost && (
              <p className="text-small text-scribe">
                {t('summary', { hits, handling: plan.cost.handling })}
                {plan.seconds !== null && ` · ${t('aboutTime', { time: duration(plan.seconds) })}`}
                {` · ${say(plan.proven ? 'proven' : 'notProven')}`}
              </p>
            )}
            {plan.feasible && brake && (
              <PlanSteps
                plan={plan}
                brake={brake}
                sheet={stock.sheet}
                colorSide={profile.colorSide}
                paintHex={paintHex}
                pieceLength={pieceLength}
              />
            )}
            {!plan.feasible && brake && (
              <WhyNot
                plan={plan}
                brake={brake}
                colorSide={profile.colorSide}
                paintHex={paintHex}
                onCure={onCure}
              />
            )}
          </article>
        )
      })}
    </section>
  )
}
