import { keepPreviousData, useInfiniteQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { seesOnlyOwnCompany } from '#shared/access/permissions'
import { paths } from '@/app/paths'
import { ButtonLink } from '@/components/ButtonLink'
import { EmptyState } from '@/components/EmptyState'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { SearchField } from '@/components/SearchField'
import { jobsQuery } from '@/features/jobs/api/jobs.queries'
import { JobRow } from '@/features/jobs/components/JobRow'
import { newOrderSlot } from '@/features/orders/draft/draft-store'
import { useDrafts } from '@/features/orders/draft/useDrafts'
import { useMay, usePerson } from '@/features/people/person-context'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { MoreButton } from '../MoreButton'
import { RoofNav } from '../RoofNav'
import { useSettled } from '@/lib/useSettled'

export function JobsPage() {
  const { t } = useTranslation('jobs')
  const person = usePerson()
  const mayWrite = useMay('jobs.write')
  const [search, setSearch] = useState('')
  const asked = useSettled(search.trim())
  const jobs = useInfiniteQuery({ ...jobsQuery(asked), placeholderData: keepPreviousData })
  const drafts = useDrafts()
  const rows = jobs.data?.pages.flatMap(({ items }) => items)

  return (
    <PlaceFrame
      title={t('title')}
      nav={<RoofNav />}
      primary={
        mayWrite ? (
          <ButtonLink variant="primary" to={paths.roof.newJob()}>
            {t('new')}
          </ButtonLink>
        ) : undefined
      }
    >
      <div className="flex max-w-3xl flex-col gap-3">
        <SearchField label={t('search')} value={search} onChange={setSearch} />
        {!rows && jobs.error && (
          <ErrorState error={jobs.error} onRetry={() => void jobs.refetch()} />
        )}
        {!rows && !jobs.error && <LoadingState />}
        {rows?.length === 0 &&
          (asked === '' ? (
            <EmptyState title={t('empty')} hint={t('emptyHint')} />
          ) : (
            <EmptyState title={t('noneFound', { search: asked })} hint={t('noneFoundHint')} />
          ))}
        {rows && rows.length > 0 && (
          <div>
            <ul className="border-t border-rule">
              {rows.map((job) => (
                <JobRow
                  key={job.id}
                  job={job}
                  to={paths.roof.job(job.id)}
                  withCompany={!seesOnlyOwnCompany(person.role)}
                  begun={drafts.some(({ slot }) => slot === newOrderSlot(person.id, job.id))}
                />
              ))}
            </ul>
            <MoreButton query={jobs} />
          </div>
        )}
      </div>
    </PlaceFrame>
  )
}
