import { useInfiniteQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import { paths } from '@/app/paths'
import { ButtonLink } from '@/components/ButtonLink'
import { EmptyState } from '@/components/EmptyState'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { Select } from '@/components/Select'
import { jobsQuery } from '@/features/jobs/api/jobs.queries'
import type { TargetJob } from './useTargetJob'

/** The latest jobs; an older one takes the profile from its own page. Nothing where the job is given. */
export function JobChoice({ target }: { readonly target: TargetJob }) {
  const { t } = useTranslation('shelf')
  const jobs = useInfiniteQuery({ ...jobsQuery(), enabled: target.jobId === null })
  const latest = jobs.data?.pages.flatMap(({ items }) => items)
  if (target.jobId !== null) {
    return target.error && <ErrorState error={target.error} onRetry={target.retry} />
  }
  if (!latest) {
    return jobs.error ? (
      <ErrorState error={jobs.error} onRetry={() => void jobs.refetch()} />
    ) : (
      <LoadingState />
    )
  }
  if (latest.length === 0) {
    return (
      <EmptyState
        title={t('noJob')}
        action={<ButtonLink to={paths.roof.newJob()}>{t('newJob')}</ButtonLink>}
      />
    )
  }
  return (
    <Select
      label={t('forJob')}
      hint={t('forJobHint')}
      placeholder={t('forJobChoose')}
      className="max-w-lg"
      value={target.job?.id ?? ''}
      options={latest.map(({ id, name }) => ({ value: id, label: name }))}
      onChange={(event) =>
        target.choose(latest.find(({ id }) => id === event.target.value) ?? null)
      }
    />
  )
}
