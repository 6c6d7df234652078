import { useTranslation } from 'react-i18next'
import { paths } from '@/app/paths'
import { ButtonLink } from '@/components/ButtonLink'
import { PlainFrame } from '@/components/PlainFrame'
import { useDocumentTitle } from '@/pages/shell/useDocumentTitle'

export function NotFoundPage() {
  const { t } = useTranslation('shell')
  useDocumentTitle(t('notFound.title'))
  return (
    <PlainFrame>
      <h1 className="text-title font-bold">{t('notFound.title')}</h1>
      <p className="mt-3 mb-6">{t('notFound.why')}</p>
      <ButtonLink variant="primary" to={paths.landing()}>
        {t('toStart')}
      </ButtonLink>
    </PlainFrame>
  )
}
