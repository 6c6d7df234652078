import { useTranslation } from 'react-i18next'
import { paths } from '@/app/paths'
import { SubNav } from '@/components/SubNav'

export function BrakeNav() {
  const { t } = useTranslation('brake')
  return (
    <SubNav
      label={t('nav.name')}
      items={[
        { to: paths.brake.queue(), label: t('nav.queue'), end: true },
        { to: paths.brake.done(), label: t('nav.done') },
        { to: paths.brake.testBends(), label: t('nav.testBends') },
      ]}
    />
  )
}
