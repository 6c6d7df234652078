import { useTranslation } from 'react-i18next'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'

export function RoofPage() {
  const { t } = useTranslation('roof')
  return (
    <PlaceFrame title={t('title')}>
      <p className="max-w-prose">{t('purpose')}</p>
    </PlaceFrame>
  )
}
