import { useTranslation } from 'react-i18next'
import type { Brake } from '#shared/bend-plan/brake.schema'
import type { Plan, PlanCure } from '#shared/bend-plan/plan.schema'
import type { ColorSide } from '#shared/profile/profile.schema'
import { Button } from '@/components/Button'
import { usePlanWords } from '../usePlanWords'
import { ContactPicture } from './ContactPicture'

interface Props {
  readonly plan: Plan
  readonly brake: Brake
  readonly colorSide: ColorSide
  readonly paintHex: string | null
  /** Absent where the drawing cannot be changed: cures are then told, not offered. */
  readonly onCure?: (cure: PlanCure) => void
}

/** The nearest misses help; a leg that would have to lose half its width does not. */
const MOST_REASONS = 4

/** Why a brake does not bend a piece: in words, in a picture, and what would cure it. */
export function WhyNot({ plan, brake, colorSide, paintHex, onCure }: Props) {
  const { t } = useTranslation('why')
  const words = usePlanWords()
  const contact = plan.reasons.find((reason) => reason.contact !== null)?.contact ?? null
  return (
    <div className="flex flex-col gap-3">
      <ul className="flex list-disc flex-col gap-1 pl-5">
        {plan.reasons.slice(0, MOST_REASONS).map((reason, index) => (
          <li key={index}>{words.reason(reason)}</li>
        ))}
      </ul>
      {contact && (
        <ContactPicture contact={contact} brake={brake} colorSide={colorSide} paintHex={paintHex} />
      )}
      {plan.cures.length > 0 && (
        <div className="flex flex-col gap-2">
          <p className="font-semibold">{t('curesTitle')}</p>
          <ul className="flex flex-wrap gap-2">
            {plan.cures.map((cure, index) => (
              <li key={index}>
                {onCure && cure.edit ? (
                  <Button onClick={() => onCure(cure)}>{words.cure(cure)}</Button>
                ) : (
                  words.cure(cure)
                )}
              </li>
            ))}
          </ul>
        </div>
      )}
    </div>
  )
}
