import { useTranslation } from 'react-i18next'
import { paths } from '@/app/paths'
import { SubNav } from '@/components/SubNav'

/** The three screens a crew comes back to. */
export function RoofNav() {
  const { t } = useTranslation('roof')
  return (
    <SubNav
      label={t('title')}
      items={[
        { to: paths.roof.home(), label: t('jobs'), end: true },
        { to: paths.roof.shelf(), label: t('shelf') },
        { to: paths.roof.orders(), label: t('orders') },
      ]}
    />
  )
}
