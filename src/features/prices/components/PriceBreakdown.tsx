import { useTranslation } from 'react-i18next'
import type { LinePrice } from '#shared/pricing/price-book.schema'
import { INCHES_PER_FOOT } from '#shared/units/length-units'
import { useUnits } from '@/features/people/useUnits'
import { useFormats } from '@/lib/format/useFormats'

interface Row {
  readonly label: string
  readonly detail?: string
  readonly cents: number
  /** What the rows above come to. */
  readonly sum?: boolean
}

/** The price of a line item by item: a piece, all pieces, and what comes once a line. */
export function PriceBreakdown({ price }: { readonly price: LinePrice }) {
  const { t } = useTranslation('prices')
  const { money, count } = useFormats()
  const { run, size } = useUnits()
  const { metal, quantity } = price
  const charges = (['bends', 'hems', 'ends'] as const).flatMap((kind): Row[] => {
    const charge = price[kind]
    if (charge.count === 0) return []
    return [
      {
        label: t(`part.${kind}`, { count: charge.count }),
        detail: t('each', { price: money(charge.centsEach) }),
        cents: charge.cents,
      },
    ]
  })
  const rows: readonly Row[] = [
    {
      label: t('part.metal', { length: run(metal.feet * INCHES_PER_FOOT) }),
      detail: t('aFoot', {
        price: money(metal.centsPerFoot),
        girth: size(metal.girth),
        upTo: size(metal.upTo),
      }),
      cents: metal.cents,
    },
    ...charges,
    { label: t('part.piece'), cents: price.pieceCents, sum: true },
    {
      label: t('part.pieces', { count: quantity, shown: count(quantity) }),
      cents: price.piecesCents,
    },
    { label: t('part.setUp'), cents: price.setUpCents },
    ...(price.toMinimumCents > 0
      ? [{ label: t('part.toMinimum'), cents: price.toMinimumCents }]
      : []),
    { label: t('part.line'), cents: price.cents, sum: true },
  ]
  return (
    <table className="w-full max-w-lg border-t border-rule">
      <caption className="sr-only">{t('breakdown')}</caption>
      <tbody>
        {rows.map(({ label, detail, cents, sum = false }) => (
          <tr key={label} className="border-b border-rule align-baseline">
            <th
              scope="row"
              className={`py-1 pr-4 text-left ${sum ? 'font-semibold' : 'font-normal'}`}
            >
              {label}
              {detail !== undefined && (
                <span className="block text-small font-normal text-scribe">{detail}</span>
              )}
            </th>
            <td
              className={`py-1 text-right font-figure whitespace-nowrap ${sum ? 'font-semibold' : ''}`}
            >
              {money(cents)}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  )
}
