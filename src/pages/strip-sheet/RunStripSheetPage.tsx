import { useQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import { useParams } from 'react-router-dom'
import { z } from 'zod'
import { paths } from '@/app/paths'
import { EmptyState } from '@/components/EmptyState'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { runQuery } from '@/features/runs/api/runs.queries'
import { StripSheet } from '@/features/strip-sheet/components/StripSheet'
import { sheetOfRunLine } from '@/features/strip-sheet/sheet-line'
import { runSheetLinks } from '@/features/strip-sheet/sheet-links'
import { NotFoundPage } from '@/pages/not-found/NotFoundPage'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'

const paramsSchema = z.object({ runId: z.uuid(), lineId: z.uuid() })

/** The strip sheet of a line of a run, as the brake cuts it. */
export function RunStripSheetPage() {
  const params = paramsSchema.safeParse(useParams())
  return params.success ? <OneSheet {...params.data} /> : <NotFoundPage />
}

function OneSheet({ runId, lineId }: z.infer<typeof paramsSchema>) {
  const { t } = useTranslation('strip-sheet')
  const { t: brake } = useTranslation('brake')
  const { data: run, error, refetch } = useQuery(runQuery(runId))
  const line = run?.lines.find(({ id }) => id === lineId)
  return (
    <PlaceFrame
      title={line ? t('of', line) : t('title')}
      subtitle={run && brake('run', { number: run.number })}
      back={{ to: paths.brake.run(runId), label: t('backRun') }}
    >
      {run && line ? (
        <StripSheet line={sheetOfRunLine(run, line)} links={runSheetLinks(runId, lineId)} />
      ) : run ? (
        <EmptyState title={t('gone')} hint={t('goneHint')} />
      ) : error ? (
        <ErrorState error={error} onRetry={() => void refetch()} />
      ) : (
        <LoadingState />
      )}
    </PlaceFrame>
  )
}
