import { useTranslation } from 'react-i18next'
import { Notice } from '@/components/Notice'
import { problemCodeOf } from '@/lib/api/api-errors'
import { errorWords } from '@/lib/api/error-words'

/**
 * A change that failed, beside the button that made it: what happened and what to do. An ended
 * session is told by the sign-in page that comes up, and is no fault any more once it is gone.
 */
export function ErrorNotice({ error }: { readonly error: Error | null }) {
  const { t } = useTranslation('problems')
  if (!error || problemCodeOf(error) === 'not-signed-in') return null
  const words = errorWords(error)
  return (
    <Notice kind="error">
      <strong className="block">{t(`${words}.happened`)}</strong>
      {t(`${words}.todo`)}
    </Notice>
  )
}
