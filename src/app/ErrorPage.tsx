import { useTranslation } from 'react-i18next'
import { useRouteError } from 'react-router-dom'
import { ErrorState } from '@/components/ErrorState'
import { PlainFrame } from '@/components/PlainFrame'
import { buttonStyle } from '@/components/button-style'

/**
 * A screen that failed. The links load the page anew, since a program that has just failed, or a
 * new version whose old files are gone, is cured by that.
 */
export function ErrorPage() {
  const { t } = useTranslation('shell')
  const error = useRouteError()
  return (
    <PlainFrame>
      <ErrorState
        error={error}
        onRetry={() => window.location.reload()}
        actions={
          <a className={buttonStyle('quiet')} href="/">
            {t('toStart')}
          </a>
        }
      />
    </PlainFrame>
  )
}
