import { useTranslation } from 'react-i18next'
import type { OrderSummary } from '#shared/orders/order.schema'
import { OrderStateWord } from '@/features/orders/components/OrderStateWord'
import { OPEN_STATES } from '@/features/orders/open-orders'
import { PieceStateWord } from '@/features/pieces/components/PieceStateWord'
import { useFormats } from '@/lib/format/useFormats'

const STEPS = ['queued', 'bent', 'bundled', 'pickedUp'] as const

/** Open orders by their state, and their pieces by theirs. */
export function OpenCounts({ orders }: { readonly orders: readonly OrderSummary[] }) {
  const { t } = useTranslation('office')
  const { count } = useFormats()
  return (
    <div className="grid gap-x-12 gap-y-6 md:grid-cols-2">
      <section aria-labelledby="open-orders">
        <h2 id="open-orders" className="mb-2 text-lead font-bold">
          {t('overview.orders')} <span className="ml-2 font-figure">{count(orders.length)}</span>
        </h2>
        <ul className="border-t border-rule">
          {OPEN_STATES.map((state) => (
            <li
              key={state}
              className="flex min-h-target items-center justify-between gap-4 border-b border-rule"
            >
              <OrderStateWord state={state} />
              <span className="font-figure">
                {count(orders.filter((order) => order.state === state).length)}
              </span>
            </li>
          ))}
        </ul>
      </section>
      <section aria-labelledby="open-pieces">
        <h2 id="open-pieces" className="mb-2 text-lead font-bold">
          {t('overview.pieces')}
        </h2>
        <ul className="border-t border-rule">
          {STEPS.map((step) => (
            <li
              key={step}
              className="flex min-h-target items-center justify-between gap-4 border-b border-rule"
            >
              <PieceStateWord state={step} />
              <span className="font-figure">
                {count(orders.reduce((sum, { progress }) => sum + progress[step], 0))}
              </span>
            </li>
          ))}
        </ul>
        <p className="mt-2 text-small text-scribe">{t('overview.piecesMeaning')}</p>
      </section>
    </div>
  )
}
