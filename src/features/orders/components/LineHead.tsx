import { useTranslation } from 'react-i18next'
import type { DraftHands } from '@/features/ends/model/draft-end'
import { useEndWords } from '@/features/ends/useEndWords'
import { useUnits } from '@/features/people/useUnits'

interface Props {
  readonly id: string
  readonly mark: string
  readonly name: string
  readonly quantity: number | null
  readonly hands: DraftHands | null
  readonly length: number | null
}

/** The mark as it stands on the label, the name, how many of what length and of which hand. */
export function LineHead({ id, mark, name, quantity, hands, length }: Props) {
  const { t } = useTranslation('orders')
  const { run } = useUnits()
  const words = useEndWords()
  return (
    <header className="flex items-start gap-3">
      <span className="inline-flex h-9 min-w-9 items-center justify-center rounded-control border-2 border-ink px-1.5 font-figure text-lead font-bold">
        <span className="sr-only">{t('line.mark')} </span>
        {mark || '?'}
      </span>
      <h3 id={id} className="min-w-0 flex-1 pt-1 leading-snug font-bold">
        {name || t('line.unnamed')}
      </h3>
      <div className="pt-1 text-right font-figure whitespace-nowrap">
        <p>
          {quantity ?? '?'} × {length === null ? '?' : run(length)}
        </p>
        {hands && (
          <p className="font-bold">
            <span aria-hidden="true">{words.hands(hands)}</span>
            <span className="sr-only">{words.handsSpoken(hands)}</span>
          </p>
        )}
      </div>
    </header>
  )
}
