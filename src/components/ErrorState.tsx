import type { ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import { Button } from '@/components/Button'
import { Icon } from '@/components/Icon'
import { errorWords, requestIdOf } from '@/lib/api/error-words'

interface Props {
  readonly error: unknown
  readonly onRetry?: () => void
  /** Other ways out, beside trying again. */
  readonly actions?: ReactNode
}

/** What happened, what is safe, what to do. */
export function ErrorState({ error, onRetry, actions }: Props) {
  const { t } = useTranslation('problems')
  const words = errorWords(error)
  const requestId = requestIdOf(error)
  return (
    <div role="alert" className="flex max-w-prose flex-col items-start gap-3 py-8">
      <p className="flex items-center gap-2 text-lead font-semibold text-chalk">
        <Icon name="warn" />
        {t(`${words}.happened`)}
      </p>
      <p>{t(`${words}.safe`)}</p>
      <p>{t(`${words}.todo`)}</p>
      {requestId !== undefined && (
        <p className="text-small text-scribe">
          {t('requestId')} <span className="font-figure">{requestId}</span>
        </p>
      )}
      <div className="mt-2 flex flex-wrap gap-3">
        {onRetry && <Button onClick={onRetry}>{t('retry')}</Button>}
        {actions}
      </div>
    </div>
  )
}
