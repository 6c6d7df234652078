import { useTranslation } from 'react-i18next'
import type { Side } from '#shared/ends/end.schema'
import { Choice } from '@/components/Choice'
import type { DraftHands } from '../model/draft-end'
import { HAND_CHOICES, handChoice, withHandChoice, type Handed } from '../model/hand-edits'

interface Props {
  readonly quantity: number | null
  readonly hands: DraftHands | null
  readonly disabled: boolean
  readonly onChange: (handed: Handed) => void
}

const SIDES: readonly Side[] = ['left', 'right']

/** Left, right or a pair, seen facing the gable, and which of the two the drawing shows. */
export function HandsFields({ quantity, hands, disabled, onChange }: Props) {
  const { t } = useTranslation('ends')
  return (
    <div className="flex flex-col gap-4">
      <Choice
        legend={t('hands.legend')}
        value={handChoice(hands)}
        disabled={disabled}
        options={HAND_CHOICES.map((choice) => ({ value: choice, label: t(`hands.${choice}`) }))}
        onChange={(choice) => onChange(withHandChoice({ quantity, hands }, choice))}
      />
      {hands && (
        <div>
          <Choice
            legend={t('hands.drawn')}
            value={hands.drawn}
            disabled={disabled}
            options={SIDES.map((side) => ({ value: side, label: t(`hand.${side}`) }))}
            onChange={(drawn) => onChange({ quantity, hands: { ...hands, drawn } })}
          />
          <p className="mt-1.5 text-small text-scribe">{t('hands.meaning')}</p>
        </div>
      )}
    </div>
  )
}
