import { useQuery } from '@tanstack/react-query'
import { useMemo } from 'react'
import { useTranslation } from 'react-i18next'
import type { OrderSummary } from '#shared/orders/order.schema'
import { paths } from '@/app/paths'
import { EmptyState } from '@/components/EmptyState'
import { openOrdersQuery } from '@/features/orders/api/open-orders.queries'
import { OrdersTable } from '@/features/orders/components/OrdersTable'
import { useFormats } from '@/lib/format/useFormats'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { OfficeNav } from './OfficeNav'
import { OpenCounts } from './OpenCounts'

/** What a manager looks at first: what is late, and how far the rest is. */
export function OverviewPage() {
  const { t } = useTranslation('office')
  const { data: orders, error, refetch } = useQuery(openOrdersQuery())
  return (
    <PlaceFrame title={t('overview.title')} nav={<OfficeNav />}>
      <div className="flex flex-col gap-8">
        {orders && <OpenCounts orders={orders} />}
        <Late orders={orders} error={error} onRetry={() => void refetch()} />
      </div>
    </PlaceFrame>
  )
}

interface LateProps {
  readonly orders: readonly OrderSummary[] | undefined
  readonly error: Error | null
  readonly onRetry: () => void
}

function Late({ orders, error, onRetry }: LateProps) {
  const { t } = useTranslation('office')
  const { daysUntil } = useFormats()
  const late = useMemo(
    () => orders?.filter(({ neededBy }) => daysUntil(neededBy) < 0),
    [orders, daysUntil],
  )
  return (
    <section aria-labelledby="late">
      <h2 id="late" className="mb-2 text-lead font-bold">
        {t('overview.late')}
        {late && <span className="ml-3 font-figure">{late.length}</span>}
      </h2>
      <OrdersTable
        caption={t('overview.late')}
        captionHidden
        orders={late}
        orderPath={paths.counter.order}
        error={error}
        onRetry={onRetry}
        empty={<EmptyState title={t('overview.noneLate')} hint={t('overview.noneLateHint')} />}
      />
    </section>
  )
}
