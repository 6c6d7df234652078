import { keepPreviousData, useInfiniteQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import { useSearchParams } from 'react-router-dom'
import { seesOnlyOwnCompany } from '#shared/access/permissions'
import { ORDER_STATES, orderStateSchema, type OrderState } from '#shared/orders/order.schema'
import { paths } from '@/app/paths'
import { ButtonLink } from '@/components/ButtonLink'
import { EmptyState } from '@/components/EmptyState'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { SearchField } from '@/components/SearchField'
import { Select } from '@/components/Select'
import { ordersQuery } from '@/features/orders/api/orders.queries'
import { DraftRow } from '@/features/orders/components/DraftRow'
import { OrderRow } from '@/features/orders/components/OrderRow'
import { useDrafts } from '@/features/orders/draft/useDrafts'
import { usePerson } from '@/features/people/person-context'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { draftPath } from '../draft-path'
import { MoreButton } from '../MoreButton'
import { RoofNav } from '../RoofNav'
import { useSettled } from '@/lib/useSettled'

/** Search and state stand in the address, so that the way back from an order leads to the same list. */
function useOrderFilter() {
  const [query, setQuery] = useSearchParams()
  const state = orderStateSchema.nullable().catch(null).parse(query.get('state'))
  const setPart = (name: 'state' | 'search', value: string) =>
    setQuery(
      (before) => {
        const next = new URLSearchParams(before)
        if (value === '') next.delete(name)
        else next.set(name, value)
        return next
      },
      { replace: true },
    )
  return { state, search: query.get('search') ?? '', setPart }
}

export function OrdersPage() {
  const { t } = useTranslation('orders')
  const drafts = useDrafts()
  const { state, search, setPart } = useOrderFilter()
  return (
    <PlaceFrame title={t('title')} nav={<RoofNav />}>
      <div className="flex max-w-3xl flex-col gap-6">
        {drafts.length > 0 && (
          <section aria-labelledby="drafts">
            <h2 id="drafts" className="font-bold">
              {t('drafts.title')}
            </h2>
            <ul>
              {drafts.map(({ slot, draft }) => (
                <DraftRow key={slot} slot={slot} draft={draft} to={draftPath(slot)} />
              ))}
            </ul>
          </section>
        )}
        <section aria-label={t('list')} className="flex flex-col gap-4">
          <div className="flex flex-wrap items-end gap-4">
            <div className="min-w-60 flex-1">
              <SearchField
                label={t('search')}
                value={search}
                onChange={(text) => setPart('search', text)}
              />
            </div>
            <Select
              label={t('filter')}
              className="min-w-48"
              value={state ?? ''}
              placeholder={t('allStates')}
              options={ORDER_STATES.map((value) => ({ value, label: t(`state.${value}`) }))}
              onChange={(event) => setPart('state', event.target.value)}
            />
          </div>
          <OrderList state={state} search={search.trim()} />
        </section>
      </div>
    </PlaceFrame>
  )
}

function OrderList({
  state,
  search,
}: {
  readonly state: OrderState | null
  readonly search: string
}) {
  const { t } = useTranslation('orders')
  const person = usePerson()
  const asked = useSettled(search)
  const orders = useInfiniteQuery({
    ...ordersQuery({ ...(state === null ? {} : { states: [state] }), search: asked }),
    placeholderData: keepPreviousData,
  })
  const rows = orders.data?.pages.flatMap(({ items }) => items)
  if (!rows) {
    return orders.error ? (
      <ErrorState error={orders.error} onRetry={() => void orders.refetch()} />
    ) : (
      <LoadingState />
    )
  }
  if (rows.length === 0) {
    return asked === '' && state === null ? (
      <EmptyState
        title={t('empty')}
        hint={t('emptyHint')}
        action={<ButtonLink to={paths.roof.home()}>{t('toJobs')}</ButtonLink>}
      />
    ) : (
      <EmptyState title={t('noneFound')} hint={t('noneFoundHint')} />
    )
  }
  return (
    <div>
      <ul className="border-t border-rule">
        {rows.map((order) => (
          <OrderRow
            key={order.id}
            order={order}
            to={paths.roof.order(order.id)}
            withCompany={!seesOnlyOwnCompany(person.role)}
          />
        ))}
      </ul>
      <MoreButton query={orders} />
    </div>
  )
}
