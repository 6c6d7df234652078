import { useTranslation } from 'react-i18next'
import { useUnits } from '@/features/people/useUnits'

interface Props {
  readonly id: string
  readonly mark: string
  readonly name: string
  readonly quantity: number | null
  readonly length: number | null
}

/** The mark as it stands on the label, the name, and how many of what length. */
export function LineHead({ id, mark, name, quantity, length }: Props) {
  const { t } = useTranslation('orders')
  const { run } = useUnits()
  return (
    <header className="flex items-start gap-3">
      <span className="inline-flex h-9 min-w-9 items-center justify-center rounded-control border-2 border-ink px-1.5 font-figure text-lead font-bold">
        <span className="sr-only">{t('line.mark')} </span>
        {mark || '?'}
      </span>
      <h3 id={id} className="min-w-0 flex-1 pt-1 leading-snug font-bold">
        {name || t('line.unnamed')}
      </h3>
      <p className="pt-1 font-figure whitespace-nowrap">
        {quantity ?? '?'} × {length === null ? '?' : run(length)}
      </p>
    </header>
  )
}
