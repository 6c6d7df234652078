import { useInfiniteQuery, useQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import { useParams } from 'react-router-dom'
import { z } from 'zod'
import { seesOnlyOwnCompany } from '#shared/access/permissions'
import type { Job } from '#shared/jobs/jobs.contract'
import { paths } from '@/app/paths'
import { ButtonLink } from '@/components/ButtonLink'
import { EmptyState } from '@/components/EmptyState'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { jobQuery } from '@/features/jobs/api/jobs.queries'
import { PitchForm } from '@/features/jobs/components/PitchForm'
import { ordersQuery } from '@/features/orders/api/orders.queries'
import { DraftRow } from '@/features/orders/components/DraftRow'
import { DraftTroubles } from '@/features/orders/components/DraftTroubles'
import { OrderRow } from '@/features/orders/components/OrderRow'
import { isBlank } from '@/features/orders/draft/order-draft'
import { useOrderDraft } from '@/features/orders/draft/useOrderDraft'
import { usePerson } from '@/features/people/person-context'
import { NotFoundPage } from '@/pages/not-found/NotFoundPage'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { MoreButton } from '../MoreButton'

const paramsSchema = z.object({ jobId: z.uuid() })

export function JobPage() {
  const params = paramsSchema.safeParse(useParams())
  return params.success ? <OneJob jobId={params.data.jobId} /> : <NotFoundPage />
}

function OneJob({ jobId }: { readonly jobId: string }) {
  const { t } = useTranslation('jobs')
  const person = usePerson()
  const job = useQuery(jobQuery(jobId))
  const subtitle =
    job.data &&
    [
      ...(seesOnlyOwnCompany(person.role) ? [] : [job.data.company.name]),
      ...(job.data.address === '' ? [] : [job.data.address]),
    ].join(' · ')
  return (
    <PlaceFrame
      title={job.data?.name ?? t('one')}
      subtitle={subtitle || undefined}
      back={{ to: paths.roof.home(), label: t('back') }}
      primary={
        job.data && (
          <>
            <ButtonLink to={paths.roof.shelf(jobId)}>{t('fromShelf')}</ButtonLink>
            <ButtonLink variant="primary" to={paths.roof.board(jobId)}>
              {t('draw')}
            </ButtonLink>
          </>
        )
      }
    >
      {job.data ? (
        <JobContent job={job.data} />
      ) : job.error ? (
        <ErrorState error={job.error} onRetry={() => void job.refetch()} />
      ) : (
        <LoadingState />
      )}
    </PlaceFrame>
  )
}

function JobContent({ job }: { readonly job: Job }) {
  const { t } = useTranslation('jobs')
  const handle = useOrderDraft(job.id)
  const orders = useInfiniteQuery(ordersQuery({ jobId: job.id }))
  const rows = orders.data?.pages.flatMap(({ items }) => items)
  const begun = !isBlank(handle.draft)
  return (
    <div className="flex max-w-3xl flex-col gap-6">
      <PitchForm job={job} />
      <DraftTroubles {...handle} />
      {begun && (
        <section aria-labelledby="begun">
          <h2 id="begun" className="font-bold">
            {t('begun')}
          </h2>
          <ul>
            <DraftRow slot={handle.slot} draft={handle.draft} to={paths.roof.newOrder(job.id)} />
          </ul>
        </section>
      )}
      <section aria-labelledby="orders">
        <h2 id="orders" className="font-bold">
          {t('orders')}
        </h2>
        {!rows && orders.error && (
          <ErrorState error={orders.error} onRetry={() => void orders.refetch()} />
        )}
        {!rows && !orders.error && <LoadingState />}
        {rows?.length === 0 && <EmptyState title={t('noOrders')} hint={t('noOrdersHint')} />}
        {rows && rows.length > 0 && (
          <ul>
            {rows.map((order) => (
              <OrderRow
                key={order.id}
                order={order}
                to={paths.roof.order(order.id)}
                withJob={false}
              />
            ))}
          </ul>
        )}
        <MoreButton query={orders} />
      </section>
    </div>
  )
}
