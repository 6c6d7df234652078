import { useTranslation } from 'react-i18next'
import { useFormats } from '@/lib/format/useFormats'

interface Props {
  /** Null as soon as one line has no price. */
  readonly cents: number | null
  /** Marks of the lines without one. */
  readonly without: readonly string[]
}

/** What all lines cost together and what is not in it; said once where the whole order is told. */
export function PriceTotal({ cents, without }: Props) {
  const { t } = useTranslation('prices')
  const { money } = useFormats()
  return (
    <div>
      <p className="flex justify-between gap-4">
        <span>{t('total')}</span>
        <span className="font-figure text-lead font-semibold">
          {cents === null ? t('unknown') : money(cents)}
        </span>
      </p>
      {without.length > 0 && (
        <p className="text-small text-ochre">
          {t('without', { count: without.length, marks: without.join(', ') })}
        </p>
      )}
      <p className="text-small text-scribe">{t('notIn')}</p>
    </div>
  )
}
