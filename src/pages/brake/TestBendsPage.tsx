import { useQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import { useSearchParams } from 'react-router-dom'
import type { Stock } from '#shared/stock/stock.schema'
import { EmptyState } from '@/components/EmptyState'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { Select } from '@/components/Select'
import { stocksQuery } from '@/features/stocks/api/stocks.queries'
import { TestBends } from '@/features/stocks/components/TestBends'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { BrakeNav } from './BrakeNav'

/** Where the bender measures how a stock folds; the stock stands in the address. */
export function TestBendsPage() {
  const { t } = useTranslation('stocks')
  const { data, error, refetch } = useQuery(stocksQuery())
  return (
    <PlaceFrame title={t('testBend.page')} subtitle={t('testBend.pageMeaning')} nav={<BrakeNav />}>
      {data ? (
        <OfStock stocks={data.items} />
      ) : error ? (
        <ErrorState error={error} onRetry={() => void refetch()} />
      ) : (
        <LoadingState />
      )}
    </PlaceFrame>
  )
}

function OfStock({ stocks }: { readonly stocks: readonly Stock[] }) {
  const { t } = useTranslation('stocks')
  const [search, setSearch] = useSearchParams()
  const stock = stocks.find(({ id }) => id === search.get('stock')) ?? stocks[0]
  if (!stock) {
    return <EmptyState title={t('office:stocks.empty')} hint={t('office:stocks.emptyHint')} />
  }
  return (
    <div className="flex flex-col gap-8">
      <Select
        label={t('testBend.stock')}
        className="max-w-lg"
        value={stock.id}
        options={stocks.map(({ id, colorName, thicknessName, sheet }) => ({
          value: id,
          label: t('line', {
            color: colorName,
            thickness: thicknessName,
            metal: t(`metal.${sheet.metal}`),
          }),
        }))}
        onChange={(event) => setSearch({ stock: event.target.value }, { replace: true })}
      />
      <TestBends stockId={stock.id} />
    </div>
  )
}
