import { useQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import { useParams } from 'react-router-dom'
import { z } from 'zod'
import { paths } from '@/app/paths'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { runQuery } from '@/features/runs/api/runs.queries'
import { NotFoundPage } from '@/pages/not-found/NotFoundPage'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { RunScreen } from './RunScreen'

export function RunPage() {
  const params = z.object({ runId: z.uuid() }).safeParse(useParams())
  if (!params.success) return <NotFoundPage />
  return <OneRun runId={params.data.runId} />
}

function OneRun({ runId }: { readonly runId: string }) {
  const { t } = useTranslation('brake')
  const run = useQuery(runQuery(runId))
  if (run.data) return <RunScreen run={run.data} />
  return (
    <PlaceFrame title={t('title')} back={{ to: paths.brake.queue(), label: t('back') }}>
      {run.error ? (
        <ErrorState error={run.error} onRetry={() => void run.refetch()} />
      ) : (
        <LoadingState />
      )}
    </PlaceFrame>
  )
}
