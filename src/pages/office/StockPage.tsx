import { useQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import { useParams } from 'react-router-dom'
import { paths } from '@/app/paths'
import { EmptyState } from '@/components/EmptyState'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { StockName } from '@/features/orders/components/StockName'
import { stocksQuery } from '@/features/stocks/api/stocks.queries'
import { StockFacts } from '@/features/stocks/components/StockFacts'
import { StockItems } from '@/features/stocks/components/StockItems'
import { TestBends } from '@/features/stocks/components/TestBends'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { OfficeNav } from './OfficeNav'

/** One stock: what is reckoned with, where it comes from, and the bends that were measured. */
export function StockPage() {
  const { t } = useTranslation('stocks')
  const { stockId = '' } = useParams()
  const { data, error, refetch } = useQuery(stocksQuery())
  const stock = data?.items.find(({ id }) => id === stockId)
  const title = stock
    ? t('line', {
        color: stock.colorName,
        thickness: stock.thicknessName,
        metal: t(`metal.${stock.sheet.metal}`),
      })
    : t('office:stocks.title')
  return (
    <PlaceFrame
      title={title}
      subtitle={t('office:stocks.open')}
      nav={<OfficeNav />}
      back={{ to: paths.office.stocks(), label: t('office:stocks.title') }}
    >
      {!data &&
        (error ? <ErrorState error={error} onRetry={() => void refetch()} /> : <LoadingState />)}
      {data && !stock && (
        <EmptyState title={t('office:stocks.gone')} hint={t('office:stocks.goneHint')} />
      )}
      {stock && (
        <div className="flex flex-col gap-8">
          <section className="flex flex-col gap-3">
            <h2 className="text-title font-bold">{t('facts.title')}</h2>
            <StockName stock={stock} />
            <StockFacts stock={stock} />
          </section>
          <StockItems stockId={stock.id} />
          <TestBends stockId={stock.id} />
        </div>
      )}
    </PlaceFrame>
  )
}
