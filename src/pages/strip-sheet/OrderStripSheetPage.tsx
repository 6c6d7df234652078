import { useQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import { useParams } from 'react-router-dom'
import { z } from 'zod'
import { orderNumber } from '#shared/orders/order.schema'
import { EmptyState } from '@/components/EmptyState'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { orderQuery } from '@/features/orders/api/orders.queries'
import { StripSheet } from '@/features/strip-sheet/components/StripSheet'
import { sheetOfOrderLine } from '@/features/strip-sheet/sheet-line'
import { orderSheetLinks } from '@/features/strip-sheet/sheet-links'
import { NotFoundPage } from '@/pages/not-found/NotFoundPage'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { paths } from '@/app/paths'
import { usePlace } from '@/pages/shell/place-context'

const paramsSchema = z.object({ orderId: z.uuid(), lineId: z.uuid() })

/** The strip sheet of an order's line, within the place one stands in. */
export function OrderStripSheetPage() {
  const params = paramsSchema.safeParse(useParams())
  return params.success ? <OneSheet {...params.data} /> : <NotFoundPage />
}

function OneSheet({ orderId, lineId }: z.infer<typeof paramsSchema>) {
  const { t } = useTranslation('strip-sheet')
  const place = usePlace()
  const { data: order, error, refetch } = useQuery(orderQuery(orderId))
  const line = order?.lines.find(({ id }) => id === lineId)
  const back = (place === 'counter' ? paths.counter : paths.roof).order(orderId)
  return (
    <PlaceFrame
      title={line ? t('of', line) : t('title')}
      subtitle={order && orderNumber(order.number)}
      back={{ to: back, label: t('back') }}
    >
      {line ? (
        <StripSheet line={sheetOfOrderLine(line)} links={orderSheetLinks(orderId, lineId)} />
      ) : order ? (
        <EmptyState title={t('gone')} hint={t('goneHint')} />
      ) : error ? (
        <ErrorState error={error} onRetry={() => void refetch()} />
      ) : (
        <LoadingState />
      )}
    </PlaceFrame>
  )
}
