import { useQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import { useNavigate } from 'react-router-dom'
import { seesOnlyOwnCompany } from '#shared/access/permissions'
import { paths } from '@/app/paths'
import { Button } from '@/components/Button'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { companiesQuery } from '@/features/jobs/api/companies.queries'
import { useCreateJob } from '@/features/jobs/api/jobs.mutations'
import { NewJobForm } from '@/features/jobs/components/NewJobForm'
import { usePerson } from '@/features/people/person-context'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'

const FORM = 'new-job'

export function NewJobPage() {
  const { t } = useTranslation('jobs')
  const navigate = useNavigate()
  const forOthers = !seesOnlyOwnCompany(usePerson().role)
  const companies = useQuery({ ...companiesQuery(), enabled: forOthers })
  const create = useCreateJob()
  const waiting = forOthers && !companies.data

  return (
    <PlaceFrame
      title={t('new')}
      back={{ to: paths.roof.home(), label: t('back') }}
      primary={
        waiting ? undefined : (
          <Button variant="primary" type="submit" form={FORM} pending={create.isPending}>
            {t('create')}
          </Button>
        )
      }
    >
      {waiting ? (
        companies.error ? (
          <ErrorState error={companies.error} onRetry={() => void companies.refetch()} />
        ) : (
          <LoadingState />
        )
      ) : (
        <NewJobForm
          formId={FORM}
          companies={companies.data?.items ?? null}
          create={create}
          onCreated={({ id }) => void navigate(paths.roof.job(id), { replace: true })}
        />
      )}
    </PlaceFrame>
  )
}
