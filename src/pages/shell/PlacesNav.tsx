import { useTranslation } from 'react-i18next'
import { PLACES_OF } from '#shared/access/permissions'
import { paths } from '@/app/paths'
import { SubNav } from '@/components/SubNav'
import { usePerson } from '@/features/people/person-context'

/** The places of the role, where there is room for them; on a phone they are in the menu. */
export function PlacesNav() {
  const { t } = useTranslation('shell')
  const places = PLACES_OF[usePerson().role]
  return (
    <div className="hidden md:block">
      <SubNav
        label={t('places')}
        items={places.map((place) => ({ to: paths.place(place), label: t(`place.${place}`) }))}
      />
    </div>
  )
}
