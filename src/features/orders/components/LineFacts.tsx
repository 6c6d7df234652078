import { useTranslation } from 'react-i18next'
import type { Strip } from '#shared/strip/strip.schema'
import { useUnits } from '@/features/people/useUnits'

interface Props {
  readonly strip: Strip | null
  /** Pounds of one piece; null while it cannot be made or has no length, absent outside an order. */
  readonly pieceWeight?: number | null
  readonly quantity?: number | null
}

type Cell = readonly [label: string, value: string | null]

/** What a line takes: girth, strip, one piece's weight and that of all. */
export function LineFacts({ strip, pieceWeight, quantity = null }: Props) {
  const { t } = useTranslation('orders')
  const { size, weight } = useUnits()
  const weights: Cell[] =
    pieceWeight === undefined
      ? []
      : [
          [t('line.each'), pieceWeight === null ? null : weight(pieceWeight)],
          [
            t('line.all'),
            pieceWeight === null || quantity === null ? null : weight(pieceWeight * quantity),
          ],
        ]
  const cells: Cell[] = [
    [t('line.girth'), strip && size(strip.girth)],
    [t('line.strip'), strip && size(strip.stripWidth, 32)],
    ...weights,
  ]
  return (
    <dl className="grid grid-cols-2 border-y border-rule min-[26rem]:grid-cols-4">
      {cells.map(([label, value]) => (
        <div key={label} className="py-1.5 pr-2">
          <dt className="text-small text-scribe">{label}</dt>
          <dd className="font-figure whitespace-nowrap">{value ?? '–'}</dd>
        </div>
      ))}
    </dl>
  )
}
