import { useTranslation } from 'react-i18next'
import { nominalThickness } from '#shared/metal/gauges'
import { weightPerSquareFoot } from '#shared/metal/densities'
import { springbackPer90FromTable } from '#shared/metal/springback'
import type { Stock } from '#shared/stock/stock.schema'
import { dinKFactor } from '#shared/strip/din-6935'
import { printSize } from '#shared/units/print-length'
import { useUnits } from '@/features/people/useUnits'

/** Shop's figure and the published table's, so that a typing slip shows. */
function useSpringbackWords({ metal, insideRadius, thickness, springbackPer90 }: Stock['sheet']) {
  const { t } = useTranslation('stocks')
  const shop = springbackPer90.toString()
  if (insideRadius <= 0) return t('facts.springbackOnly', { shop })
  const table = springbackPer90FromTable(metal, insideRadius, thickness)
  return table.ok
    ? t('facts.springbackTable', {
        shop,
        table: table.springbackPer90.toFixed(1),
        material: table.material,
      })
    : t('facts.springbackOnly', { shop })
}

/** The standard's formula puts the neutral line outside a sheet that is bent sharper than this. */
const SHARPEST_RATIO = 0.06

/** What is known of a sheet, each figure with where it comes from. */
export function StockFacts({ stock }: { readonly stock: Stock }) {
  const { t } = useTranslation('stocks')
  const { units, weight } = useUnits()
  const { sheet } = stock
  const fine = (inches: number) => printSize(inches, units === 'mm' ? 'mm' : 'decimal')
  const springback = useSpringbackWords(sheet)
  const named = nominalThickness({
    metal: sheet.metal,
    finish: 'galvanized',
    name: stock.thicknessName,
  })
  const paint = !stock.painted
    ? t('facts.bare')
    : stock.paintTBend === null
      ? t('facts.paintUnknown')
      : t('facts.paintRating', {
          n: stock.paintTBend,
          radius: fine((stock.paintTBend * sheet.thickness) / 2),
        })
  const rows: readonly (readonly [string, string])[] = [
    [t('testBend.thicknessField'), fine(sheet.thickness)],
    [t('facts.nominal'), named.ok ? fine(named.nominal.thickness) : t('facts.unknown')],
    [t('calibration.radius'), fine(sheet.insideRadius)],
    [t('calibration.k'), `${sheet.kFactor.toFixed(3)} (${t(`kSource.${stock.kSource}`)})`],
    [
      t('facts.din'),
      sheet.insideRadius >= SHARPEST_RATIO * sheet.thickness
        ? dinKFactor(sheet.insideRadius, sheet.thickness).toFixed(3)
        : '–',
    ],
    [t('facts.springback'), springback],
    [t('facts.paint'), paint],
    [t('facts.alloy'), stock.alloy ?? t('facts.unknown')],
    [
      t('facts.weight'),
      t('facts.perSquareFoot', {
        weight: weight(weightPerSquareFoot(sheet.metal, sheet.thickness)),
      }),
    ],
  ]
  return (
    <dl className="grid max-w-4xl gap-x-8 sm:grid-cols-2">
      {rows.map(([label, value]) => (
        <div key={label} className="flex justify-between gap-4 border-b border-rule py-1.5">
          <dt className="text-scribe">{label}</dt>
          <dd className="text-right font-figure">{value}</dd>
        </div>
      ))}
    </dl>
  )
}
