import { useTranslation } from 'react-i18next'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'

export function RackPage() {
  const { t } = useTranslation('rack')
  return (
    <PlaceFrame title={t('title')}>
      <p className="max-w-prose">{t('purpose')}</p>
    </PlaceFrame>
  )
}
