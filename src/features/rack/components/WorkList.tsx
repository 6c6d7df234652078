import { useTranslation } from 'react-i18next'
import { Link } from 'react-router-dom'
import type { BundleWork } from '#shared/bundles/bundles.contract'
import { orderNumber } from '#shared/orders/order.schema'
import { paths } from '@/app/paths'
import { buttonStyle } from '@/components/button-style'
import { useFormats } from '@/lib/format/useFormats'

/** Orders with bent pieces that lie loose, the one needed first on top. */
export function WorkList({ work }: { readonly work: readonly BundleWork[] }) {
  const { t } = useTranslation('rack')
  const { day } = useFormats()
  return (
    <ul className="divide-y divide-rule border-y border-rule">
      {work.map((order, index) => (
        <li key={order.orderId} className="flex flex-wrap items-center gap-x-6 gap-y-2 py-3">
          <span className="w-24 font-figure text-lead font-medium">
            {orderNumber(order.orderNumber)}
          </span>
          <div className="min-w-48 flex-1">
            <p className="font-semibold">{order.company}</p>
            <p className="text-small text-scribe">{`${order.job} · ${t('due', { day: day(order.neededBy) })}`}</p>
          </div>
          <div className="w-44">
            <p className="text-ochre">{t('loose', { count: order.loose.length })}</p>
            <p className="text-small text-scribe">
              {order.queued === 0 ? t('allBent') : t('stillQueued', { count: order.queued })}
            </p>
          </div>
          <Link
            to={paths.rack.order(order.orderId)}
            className={buttonStyle(index === 0 ? 'primary' : 'secondary')}
            aria-label={t('bundleOrder', { number: orderNumber(order.orderNumber) })}
          >
            {t('bundle')}
          </Link>
        </li>
      ))}
    </ul>
  )
}
