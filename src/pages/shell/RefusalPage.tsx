import { useTranslation } from 'react-i18next'
import type { Place } from '#shared/access/permissions'
import { paths } from '@/app/paths'
import { ButtonLink } from '@/components/ButtonLink'
import { PlainFrame } from '@/components/PlainFrame'
import { usePerson } from '@/features/people/person-context'
import { useDocumentTitle } from '@/pages/shell/useDocumentTitle'

/** A place that the person's role does not enter, and the way back. */
export function RefusalPage({ place }: { readonly place: Place }) {
  const { t } = useTranslation('shell')
  const { role } = usePerson()
  const name = t(`place.${place}`)
  useDocumentTitle(t('refusal.title', { place: name }))
  return (
    <PlainFrame>
      <h1 className="text-title font-bold">{t('refusal.title', { place: name })}</h1>
      <p className="mt-3 mb-6">{t('refusal.why', { place: name, role: t(`role.${role}`) })}</p>
      <ButtonLink variant="primary" to={paths.landing()}>
        {t('toStart')}
      </ButtonLink>
    </PlainFrame>
  )
}
