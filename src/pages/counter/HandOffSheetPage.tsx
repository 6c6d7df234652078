import { useQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import { useParams } from 'react-router-dom'
import { paths } from '@/app/paths'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { handOffQuery } from '@/features/hand-off/api/hand-off.queries'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { HandOffSheetScreen } from './HandOffSheetScreen'

/** One order at the counter: what lies where, who takes it, what stays behind. */
export function HandOffSheetPage() {
  const { t } = useTranslation('hand-off')
  const { orderId = '' } = useParams()
  const { data: sheet, error, refetch } = useQuery(handOffQuery(orderId))
  if (sheet) return <HandOffSheetScreen key={orderId} sheet={sheet} />
  return (
    <PlaceFrame title={t('title')} back={{ to: paths.counter.handOff(), label: t('back') }}>
      {error ? <ErrorState error={error} onRetry={() => void refetch()} /> : <LoadingState />}
    </PlaceFrame>
  )
}
