import { useTranslation } from 'react-i18next'
import type { Order } from '#shared/orders/order.schema'
import { PrintLabels } from '@/features/labels/components/PrintLabels'
import { OrderCaution } from '@/features/orders/components/OrderCaution'
import { OrderHistory } from '@/features/orders/components/OrderHistory'

/** The labels of its pieces, what was done with the order, and what the shop does not vouch for. */
export function OrderPast({ order }: { readonly order: Order }) {
  const { t } = useTranslation('counter')
  return (
    <div className="flex flex-col gap-5">
      {order.lines.some(({ pieces }) => pieces.length > 0) && (
        <PrintLabels of={{ kind: 'order', orderId: order.id }} />
      )}
      <section aria-labelledby="history">
        <h2 id="history" className="mb-2 font-bold">
          {t('order.history')}
        </h2>
        <OrderHistory events={order.events} />
      </section>
      <OrderCaution />
    </div>
  )
}
