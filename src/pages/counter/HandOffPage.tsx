import { keepPreviousData, useInfiniteQuery, useQuery } from '@tanstack/react-query'
import { useMemo, useState } from 'react'
import { useTranslation } from 'react-i18next'
import { useNavigate } from 'react-router-dom'
import type { OrderState } from '#shared/orders/order.schema'
import { paths } from '@/app/paths'
import { Button } from '@/components/Button'
import { EmptyState } from '@/components/EmptyState'
import { SearchField } from '@/components/SearchField'
import { HandOffOrders } from '@/features/hand-off/components/HandOffOrders'
import { useCodeLookup } from '@/features/hand-off/useCodeLookup'
import { openOrdersQuery } from '@/features/orders/api/open-orders.queries'
import { ordersQuery } from '@/features/orders/api/orders.queries'
import { isAtCounter } from '@/features/orders/open-orders'
import { useSettled } from '@/lib/useSettled'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { CounterBand } from './CounterBand'
import { CounterNav } from './CounterNav'

/** A search looks through whatever was released: somebody may come back with a bundle. */
const SEARCHED: readonly OrderState[] = ['released', 'inWork', 'ready', 'partPickedUp', 'pickedUp']

/** Somebody stands at the counter: scan what they hold, or find their order. */
export function HandOffPage() {
  const { t } = useTranslation('hand-off')
  const navigate = useNavigate()
  const [search, setSearch] = useState('')
  const settled = useSettled(search.trim())
  const { lookUp, answer } = useCodeLookup(({ orderId }) => {
    void navigate(paths.counter.handOffOrder(orderId))
  })
  return (
    <PlaceFrame
      title={t('title')}
      subtitle={t('meaning')}
      nav={<CounterNav />}
      search={
        <SearchField
          // eslint-disable-next-line jsx-a11y/no-autofocus -- a scanner types into what has the focus
          autoFocus
          label={t('search.label')}
          placeholder={t('search.placeholder')}
          value={search}
          onChange={setSearch}
          onSubmit={(text) => {
            if (lookUp(text)) setSearch('')
          }}
        />
      }
    >
      <CounterBand answer={answer} />
      {settled === '' ? <AtCounter /> : <Found search={settled} onClear={() => setSearch('')} />}
    </PlaceFrame>
  )
}

function AtCounter() {
  const { t } = useTranslation('hand-off')
  const { data, error, refetch } = useQuery(openOrdersQuery())
  const orders = useMemo(() => data?.filter(isAtCounter), [data])
  return (
    <HandOffOrders
      orders={orders}
      orderPath={paths.counter.handOffOrder}
      error={error}
      onRetry={() => void refetch()}
      empty={<EmptyState title={t('list.empty')} hint={t('list.emptyHint')} />}
    />
  )
}

function Found({ search, onClear }: { readonly search: string; readonly onClear: () => void }) {
  const { t } = useTranslation('hand-off')
  const found = useInfiniteQuery({
    ...ordersQuery({ search, states: SEARCHED }),
    placeholderData: keepPreviousData,
  })
  const orders = useMemo(() => found.data?.pages.flatMap(({ items }) => items), [found.data])
  return (
    <HandOffOrders
      orders={orders}
      orderPath={paths.counter.handOffOrder}
      error={found.error}
      onRetry={() => void found.refetch()}
      paging={{
        hasMore: found.hasNextPage,
        loading: found.isFetchingNextPage,
        onMore: () => void found.fetchNextPage(),
      }}
      empty={
        <EmptyState
          title={t('list.noneFound', { search })}
          hint={t('list.noneFoundHint')}
          action={<Button onClick={onClear}>{t('search.clear')}</Button>}
        />
      }
    />
  )
}
