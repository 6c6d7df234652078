import { useTranslation } from 'react-i18next'
import type { OrderSummary } from '#shared/orders/order.schema'
import { useFormats } from '@/lib/format/useFormats'

interface Props {
  readonly order: Pick<OrderSummary, 'neededBy' | 'state'>
}

/** The day it is needed; a day that has passed while the order is open stands out. */
export function NeededBy({ order: { neededBy, state } }: Props) {
  const { t } = useTranslation('order-table')
  const { day, daysUntil } = useFormats()
  const open = state !== 'pickedUp' && state !== 'withdrawn'
  const late = open ? -daysUntil(neededBy) : 0
  return (
    <span className="whitespace-nowrap">
      {day(neededBy)}
      {late > 0 && (
        <span className="block text-small font-semibold text-chalk">
          {t('late', { count: late })}
        </span>
      )}
    </span>
  )
}
