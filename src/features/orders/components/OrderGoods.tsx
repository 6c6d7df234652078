import { useTranslation } from 'react-i18next'
import type { Order } from '#shared/orders/order.schema'
import { GoodsList } from '@/features/roof-line/components/GoodsList'

/** The small goods of an order that is in; nothing where it has none. */
export function OrderGoods({ order }: { readonly order: Order }) {
  const { t } = useTranslation('goods')
  if (order.goods.length === 0) return null
  return (
    <section
      aria-labelledby="goods"
      className="flex max-w-3xl flex-col gap-2 border-t-2 border-ink pt-4"
    >
      <h2 id="goods" className="font-bold">
        {t('title')}
      </h2>
      <GoodsList goods={order.goods} stocks={order.lines.map(({ stock }) => stock)} />
    </section>
  )
}
