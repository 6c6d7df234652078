import { useQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import { useParams } from 'react-router-dom'
import { findStarter } from '#shared/profile/starters'
import { paths } from '@/app/paths'
import { EmptyState } from '@/components/EmptyState'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { shelfQuery } from '@/features/shelf/api/shelf.queries'
import { useShelfName } from '@/features/shelf/useShelfName'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { SavedPage } from './SavedPage'
import { StarterPage } from './StarterPage'
import { useTargetJob } from './useTargetJob'

/** One profile of the shelf; with `?job=` it is taken for that job, and with `&order=` for an amendment. */
export function ShelfProfilePage() {
  const { t } = useTranslation('shelf')
  const { profileId } = useParams()
  const shelf = useQuery(shelfQuery())
  const nameOf = useShelfName()
  const target = useTargetJob()
  const item = shelf.data?.items.find(({ id }) => id === profileId)
  if (item) {
    const starter = item.starterKey === null ? undefined : findStarter(item.starterKey)
    const shared = { item, name: nameOf(item), target }
    return starter ? (
      <StarterPage key={item.id} {...shared} starter={starter} />
    ) : (
      <SavedPage key={item.id} {...shared} />
    )
  }
  return (
    <PlaceFrame title={t('title')} back={{ to: paths.roof.shelf(), label: t('back') }}>
      {shelf.data ? (
        <EmptyState title={t('gone')} hint={t('goneHint')} />
      ) : shelf.error ? (
        <ErrorState error={shelf.error} onRetry={() => void shelf.refetch()} />
      ) : (
        <LoadingState />
      )}
    </PlaceFrame>
  )
}
