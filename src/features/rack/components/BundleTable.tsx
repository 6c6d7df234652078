import { useTranslation } from 'react-i18next'
import { Link } from 'react-router-dom'
import type { Bundle } from '#shared/bundles/bundles.contract'
import { orderNumber } from '#shared/orders/order.schema'
import { paths } from '@/app/paths'
import { useUnits } from '@/features/people/useUnits'
import { LiftWord } from './LiftWord'

const byPlace = (a: Bundle, b: Bundle) =>
  a.rackPlace.localeCompare(b.rackPlace, 'en', { numeric: true }) ||
  a.orderNumber - b.orderNumber ||
  a.number - b.number

/** What lies where, in the order of the places. */
export function BundleTable({ bundles }: { readonly bundles: readonly Bundle[] }) {
  const { t } = useTranslation('rack')
  const { run: length } = useUnits()
  return (
    <div className="overflow-x-auto">
      <table className="w-full border-collapse text-left">
        <caption className="sr-only">{t('onRack')}</caption>
        <thead className="text-small text-scribe">
          <tr>
            {(['place', 'bundleCode', 'order', 'pieces', 'longest', 'weight'] as const).map(
              (column) => (
                <th key={column} scope="col" className="border-b border-rule py-2 pr-4 font-normal">
                  {t(`column.${column}`)}
                </th>
              ),
            )}
          </tr>
        </thead>
        <tbody>
          {[...bundles].sort(byPlace).map((bundle) => (
            <tr key={bundle.id} className="border-b border-rule">
              <td className="py-3 pr-4 font-figure text-lead font-bold">{bundle.rackPlace}</td>
              <td className="py-3 pr-4">
                <Link
                  to={paths.rack.bundle(bundle.code)}
                  className="inline-flex min-h-target items-center font-figure text-dye underline"
                >
                  {`B${bundle.number} · ${bundle.code}`}
                </Link>
              </td>
              <td className="py-3 pr-4">
                <span className="font-figure">{orderNumber(bundle.orderNumber)}</span>
                <span className="block text-small text-scribe">{bundle.company}</span>
              </td>
              <td className="py-3 pr-4 font-figure">{bundle.pieces.length}</td>
              <td className="py-3 pr-4 font-figure whitespace-nowrap">{length(bundle.longest)}</td>
              <td className="py-3 whitespace-nowrap">
                <LiftWord weight={bundle.weight} longest={bundle.longest} />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}
