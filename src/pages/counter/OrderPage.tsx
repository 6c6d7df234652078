import { useQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import { useParams } from 'react-router-dom'
import { paths } from '@/app/paths'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { orderQuery } from '@/features/orders/api/orders.queries'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { OrderScreen } from './order/OrderScreen'

/** One order as the counter checks it, releases it and looks it up later. */
export function OrderPage() {
  const { t } = useTranslation('counter')
  const { orderId = '' } = useParams()
  const { data: order, error, refetch } = useQuery(orderQuery(orderId))
  if (order) return <OrderScreen key={orderId} order={order} />
  return (
    <PlaceFrame
      title={t('order.title')}
      back={{ to: paths.counter.incoming(), label: t('order.back') }}
    >
      {error ? <ErrorState error={error} onRetry={() => void refetch()} /> : <LoadingState />}
    </PlaceFrame>
  )
}
