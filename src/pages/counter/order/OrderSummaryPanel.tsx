import type { ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import type { Order } from '#shared/orders/order.schema'
import { NeededBy } from '@/features/orders/components/NeededBy'
import { OrderSheetLink } from '@/features/orders/components/OrderSheetLink'
import { OrderStateWord } from '@/features/orders/components/OrderStateWord'
import { PieceProgress } from '@/features/orders/components/PieceProgress'
import { useUnits } from '@/features/people/useUnits'
import { OrderPriceTotal } from '@/features/prices/components/OrderPriceTotal'
import { useFormats } from '@/lib/format/useFormats'

/** Who ordered what for when, and how far it is. */
export function OrderSummaryPanel({ order }: { readonly order: Order }) {
  const { t } = useTranslation('counter')
  const { moment, count } = useFormats()
  const { weight } = useUnits()
  const total = order.lines.reduce((sum, line) => sum + line.pieceWeight * line.quantity, 0)
  return (
    <div className="flex flex-col gap-5">
      <p className="text-lead">
        <OrderStateWord state={order.state} />
      </p>
      <PieceProgress progress={order.progress} />
      <dl className="gap-x-10 sm:grid sm:grid-cols-2 xl:block">
        <Fact label={t('order.neededBy')}>
          <NeededBy order={order} />
        </Fact>
        <Fact label={t('order.orderedBy')}>{order.orderedBy}</Fact>
        <Fact label={t('order.submitted')}>{moment(order.submittedAt)}</Fact>
        {order.poNumber !== '' && (
          <Fact label={t('order.po')} figure>
            {order.poNumber}
          </Fact>
        )}
        <Fact label={t('order.pitch')} figure>
          {order.job.pitchRise}/12
        </Fact>
        <Fact label={t('order.pieces')} figure>
          {count(order.pieceCount)}
        </Fact>
        <Fact label={t('order.weight')} figure>
          {weight(total)}
        </Fact>
      </dl>
      <OrderPriceTotal order={order} />
      {order.notes !== '' && (
        <div>
          <h2 className="text-small text-scribe">{t('order.notes')}</h2>
          <p className="whitespace-pre-line">{order.notes}</p>
        </div>
      )}
      <OrderSheetLink orderId={order.id} />
    </div>
  )
}

interface FactProps {
  readonly label: string
  readonly figure?: boolean
  readonly children: ReactNode
}

function Fact({ label, figure = false, children }: FactProps) {
  return (
    <div className="flex justify-between gap-4 border-b border-rule py-1.5">
      <dt className="text-scribe">{label}</dt>
      <dd className={`text-right ${figure ? 'font-figure' : ''}`}>{children}</dd>
    </div>
  )
}
