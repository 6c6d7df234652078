import { keepPreviousData, useInfiniteQuery, useQuery } from '@tanstack/react-query'
import { useMemo } from 'react'
import { useTranslation } from 'react-i18next'
import { useNavigate, useSearchParams } from 'react-router-dom'
import { z } from 'zod'
import { ORDER_STATES, orderStateSchema } from '#shared/orders/order.schema'
import { paths } from '@/app/paths'
import { Button } from '@/components/Button'
import { EmptyState } from '@/components/EmptyState'
import { SearchField } from '@/components/SearchField'
import { Select } from '@/components/Select'
import { useCodeLookup } from '@/features/hand-off/useCodeLookup'
import { openOrdersQuery } from '@/features/orders/api/open-orders.queries'
import { ordersQuery } from '@/features/orders/api/orders.queries'
import { OrdersTable } from '@/features/orders/components/OrdersTable'
import { isIncoming } from '@/features/orders/open-orders'
import { useSettled } from '@/lib/useSettled'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { CounterBand } from './CounterBand'
import { CounterNav } from './CounterNav'

const INCOMING = 'incoming'
const ALL = 'all'

/** What waits to be checked; a search looks through all orders, in whatever state they are. */
export function IncomingPage() {
  const { t } = useTranslation('counter')
  const navigate = useNavigate()
  const [params, setParams] = useSearchParams()
  const search = params.get('q') ?? ''
  const asked = orderStateSchema.or(z.literal(ALL)).safeParse(params.get('state'))
  const shown = asked.data ?? (search === '' ? INCOMING : ALL)
  const settled = useSettled(search.trim())
  const asksAll = shown !== INCOMING || settled !== ''

  const set = (name: 'q' | 'state', value: string) =>
    setParams(
      (before) => {
        const next = new URLSearchParams(before)
        if (value === '') next.delete(name)
        else next.set(name, value)
        return next
      },
      { replace: true },
    )

  const { lookUp, answer } = useCodeLookup(({ orderId }) => {
    void navigate(paths.counter.handOffOrder(orderId))
  })

  return (
    <PlaceFrame
      title={t('incoming.title')}
      nav={<CounterNav />}
      search={
        <SearchField
          // eslint-disable-next-line jsx-a11y/no-autofocus -- a scanner types into what has the focus
          autoFocus
          label={t('search.label')}
          placeholder={t('search.placeholder')}
          value={search}
          onChange={(text) => set('q', text)}
          onSubmit={(text) => {
            if (lookUp(text)) set('q', '')
          }}
        />
      }
    >
      <CounterBand answer={answer} />
      <Select
        className="mb-4 max-w-72"
        label={t('incoming.show')}
        value={shown}
        options={[
          { value: INCOMING, label: t('incoming.onlyIncoming'), disabled: search !== '' },
          { value: ALL, label: t('incoming.allStates') },
          ...ORDER_STATES.map((state) => ({ value: state, label: t(`orders:state.${state}`) })),
        ]}
        onChange={(event) =>
          set('state', event.target.value === INCOMING ? '' : event.target.value)
        }
      />
      {asksAll ? (
        <FoundOrders
          search={settled}
          state={shown}
          onClear={() => setParams({}, { replace: true })}
        />
      ) : (
        <IncomingOrders />
      )}
    </PlaceFrame>
  )
}

function IncomingOrders() {
  const { t } = useTranslation('counter')
  const { data, error, refetch } = useQuery(openOrdersQuery())
  const incoming = useMemo(() => data?.filter(isIncoming), [data])
  return (
    <OrdersTable
      caption={t('incoming.caption')}
      captionHidden
      orders={incoming}
      orderPath={paths.counter.order}
      error={error}
      onRetry={() => void refetch()}
      empty={<EmptyState title={t('incoming.empty')} hint={t('incoming.emptyHint')} />}
    />
  )
}

interface FoundProps {
  readonly search: string
  readonly state: string
  readonly onClear: () => void
}

function FoundOrders({ search, state, onClear }: FoundProps) {
  const { t } = useTranslation('counter')
  const only = orderStateSchema.safeParse(state)
  const found = useInfiniteQuery({
    ...ordersQuery({ search, ...(only.success ? { states: [only.data] } : {}) }),
    placeholderData: keepPreviousData,
  })
  const orders = useMemo(() => found.data?.pages.flatMap(({ items }) => items), [found.data])
  return (
    <OrdersTable
      caption={t('found.caption')}
      captionHidden
      orders={orders}
      orderPath={paths.counter.order}
      error={found.error}
      onRetry={() => void found.refetch()}
      paging={{
        hasMore: found.hasNextPage,
        loading: found.isFetchingNextPage,
        onMore: () => void found.fetchNextPage(),
      }}
      empty={
        <EmptyState
          title={search === '' ? t('found.noneInState') : t('found.none', { search })}
          hint={t('found.noneHint')}
          action={<Button onClick={onClear}>{t('found.clear')}</Button>}
        />
      }
    />
  )
}
