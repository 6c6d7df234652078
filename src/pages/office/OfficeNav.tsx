import { useTranslation } from 'react-i18next'
import { paths } from '@/app/paths'
import { SubNav } from '@/components/SubNav'

export function OfficeNav() {
  const { t } = useTranslation('office')
  return (
    <SubNav
      label={t('nav.name')}
      items={[
        { to: paths.office.home(), label: t('nav.overview'), end: true },
        { to: paths.office.stocks(), label: t('nav.stocks') },
        { to: paths.office.brakes(), label: t('nav.brakes') },
        { to: paths.office.people(), label: t('nav.people') },
        { to: paths.office.mails(), label: t('nav.mails') },
        { to: paths.office.audit(), label: t('nav.audit') },
      ]}
    />
  )
}
