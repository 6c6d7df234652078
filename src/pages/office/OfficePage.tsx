import { useTranslation } from 'react-i18next'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'

export function OfficePage() {
  const { t } = useTranslation('office')
  return (
    <PlaceFrame title={t('title')}>
      <p className="max-w-prose">{t('purpose')}</p>
    </PlaceFrame>
  )
}
