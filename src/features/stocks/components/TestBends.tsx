import { useQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { brakesQuery } from '@/features/brakes/api/brakes.queries'
import { useMay } from '@/features/people/person-context'
import { testBendsQuery } from '../api/test-bends.queries'
import { CalibrationTable } from './CalibrationTable'
import { TestBendForm } from './TestBendForm'
import { TestBendTable } from './TestBendTable'

/** What a stock folds like on each brake, and the bends that tell. */
export function TestBends({ stockId }: { readonly stockId: string }) {
  const { t } = useTranslation('stocks')
  const mayRecord = useMay('stocks.test')
  const bends = useQuery(testBendsQuery(stockId))
  const brakes = useQuery(brakesQuery())
  const error = bends.error ?? brakes.error
  if (!bends.data || !brakes.data) {
    return error ? (
      <ErrorState
        error={error}
        onRetry={() => {
          void bends.refetch()
          void brakes.refetch()
        }}
      />
    ) : (
      <LoadingState />
    )
  }
  const { stock, fits } = bends.data
  return (
    <div className="flex flex-col gap-8">
      <section className="flex flex-col gap-3">
        <h2 className="text-title font-bold">{t('calibration.title')}</h2>
        <CalibrationTable stock={stock} brakes={brakes.data.items} fits={fits} />
      </section>
      {mayRecord && (
        <section className="flex flex-col gap-3">
          <h2 className="text-title font-bold">{t('testBend.title')}</h2>
          <p className="max-w-[70ch]">{t('testBend.how')}</p>
          <TestBendForm key={stock.id} stock={stock} brakes={brakes.data.items} />
        </section>
      )}
      <section className="flex flex-col gap-3">
        <h2 className="text-title font-bold">{t('testBend.list')}</h2>
        <TestBendTable stockId={stockId} bends={bends.data.bends} mayRecord={mayRecord} />
      </section>
    </div>
  )
}
