import { useQueries } from '@tanstack/react-query'
import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { useParams, useSearchParams } from 'react-router-dom'
import { z } from 'zod'
import { paths } from '@/app/paths'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { brakesQuery } from '@/features/brakes/api/brakes.queries'
import { jobQuery } from '@/features/jobs/api/jobs.queries'
import { useOrderDraft, type OrderDraftHandle } from '@/features/orders/draft/useOrderDraft'
import { shelfQuery } from '@/features/shelf/api/shelf.queries'
import { stocksQuery } from '@/features/stocks/api/stocks.queries'
import { NotFoundPage } from '@/pages/not-found/NotFoundPage'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { BoardScreen } from './BoardScreen'
import { drawingStart } from './drawing-start'

/**
 * The drawing board of a job: `?line=<key>` opens a line of the draft, `?shelf=<id>` a copy of a
 * shelf profile (with `&set=` a starter made to the roof), neither an empty sheet; `?order=<id>` works on the amendment of that order.
 */
export function BoardPage() {
  const params = z.object({ jobId: z.uuid() }).safeParse(useParams())
  const [search] = useSearchParams()
  if (!params.success) return <NotFoundPage />
  return <JobBoard jobId={params.data.jobId} search={search} />
}

function JobBoard({ jobId, search }: { jobId: string; search: URLSearchParams }) {
  const { t } = useTranslation('board')
  const draft = useOrderDraft(jobId, search.get('order'))
  const [job, stocks, brakes, shelf] = useQueries({
    queries: [jobQuery(jobId), stocksQuery(), brakesQuery(), shelfQuery()],
  })
  const failed = [job, stocks, brakes, shelf].find(({ error, data }) => error && !data)
  const back = { to: paths.roof.job(jobId), label: t('back') }

  if (failed) {
    return (
      <PlaceFrame title={t('title')} back={back}>
        <ErrorState error={failed.error} onRetry={() => void failed.refetch()} />
      </PlaceFrame>
    )
  }
  if (!job.data || !stocks.data || !brakes.data || !shelf.data) {
    return (
      <PlaceFrame title={t('title')} back={back}>
        <LoadingState />
      </PlaceFrame>
    )
  }
  return (
    <OpenBoard
      wanted={{
        lineKey: search.get('line'),
        shelfId: search.get('shelf'),
        set: search.get('set'),
      }}
      orderId={search.get('order')}
      draft={draft}
      job={job.data}
      stocks={stocks.data.items}
      brakes={brakes.data.items}
      shelf={shelf.data.items}
    />
  )
}

type OpenProps = Omit<Parameters<typeof BoardScreen>[0], 'start'> & {
  readonly wanted: Parameters<typeof drawingStart>[0]
  readonly draft: OrderDraftHandle
  readonly shelf: Parameters<typeof drawingStart>[2]
}

/** What the board opens with is settled once: the draft that it writes must not open it anew. */
function OpenBoard({ wanted, shelf, ...props }: OpenProps) {
  const [start] = useState(() =>
    drawingStart(wanted, props.draft.draft, shelf, props.job.pitchRise),
  )
  return start === null ? <NotFoundPage /> : <BoardScreen {...props} start={start} />
}
