import { useQuery } from '@tanstack/react-query'
import { useMemo } from 'react'
import { useTranslation } from 'react-i18next'
import { paths } from '@/app/paths'
import { EmptyState } from '@/components/EmptyState'
import { openOrdersQuery } from '@/features/orders/api/open-orders.queries'
import { OrdersTable } from '@/features/orders/components/OrdersTable'
import { useFormats } from '@/lib/format/useFormats'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { CounterNav } from './CounterNav'
import { useCounterSearch } from './useCounterSearch'

/** What should leave today, and what should have left before. */
export function DuePage() {
  const { t } = useTranslation('counter')
  const { daysUntil } = useFormats()
  const { data, error, refetch } = useQuery(openOrdersQuery())
  const { search, band } = useCounterSearch()
  const due = useMemo(
    () => data?.filter(({ neededBy }) => daysUntil(neededBy) <= 0),
    [data, daysUntil],
  )
  return (
    <PlaceFrame
      title={t('due.title')}
      subtitle={t('due.meaning')}
      nav={<CounterNav />}
      search={search}
    >
      {band}
      <OrdersTable
        caption={t('due.caption')}
        captionHidden
        orders={due}
        orderPath={paths.counter.order}
        error={error}
        onRetry={() => void refetch()}
        empty={<EmptyState title={t('due.empty')} hint={t('due.emptyHint')} />}
      />
    </PlaceFrame>
  )
}
