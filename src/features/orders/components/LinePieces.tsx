import { useTranslation } from 'react-i18next'
import { Link } from 'react-router-dom'
import type { PieceSummary } from '#shared/orders/order.schema'
import { PieceStateWord } from '@/features/pieces/components/PieceStateWord'
import { useFormats } from '@/lib/format/useFormats'

interface Props {
  readonly pieces: readonly PieceSummary[]
  readonly quantity: number
  readonly piecePath?: (code: string) => string
}

/** A list that fits on a screen stands open. */
const SHORT = 6

/** Each piece with its state, since when and by whom; its number leads to its history. */
export function LinePieces({ pieces, quantity, piecePath }: Props) {
  const { t } = useTranslation('orders')
  const { moment } = useFormats()
  return (
    <details open={pieces.length <= SHORT}>
      <summary className="inline-flex min-h-target items-center font-semibold underline">
        {t('line.pieces', { count: pieces.length })}
      </summary>
      <ul className="divide-y divide-rule border-y border-rule">
        {pieces.map(({ code, sequence, state, since, by, bundleCode, rackPlace, remakeOf }) => (
          <li
            key={code}
            className="relative flex min-h-target flex-wrap items-center gap-x-4 py-1.5 hover:bg-ink/5"
          >
            <span className="w-20 font-figure">
              {piecePath ? (
                <Link
                  to={piecePath(code)}
                  className="underline after:absolute after:inset-0"
                  aria-label={t('line.pieceLink', { sequence, quantity })}
                >
                  {sequence}/{quantity}
                </Link>
              ) : (
                `${sequence}/${quantity}`
              )}
            </span>
            <PieceStateWord state={state} />
            <span className="ml-auto text-right text-small text-scribe">
              {moment(since)} · {by}
              {(remakeOf !== null || bundleCode !== null) && (
                <span className="block">
                  {remakeOf !== null && t('line.remake')}
                  {remakeOf !== null && bundleCode !== null && ' · '}
                  {bundleCode !== null &&
                    (rackPlace === null
                      ? t('line.bundle', { code: bundleCode })
                      : t('line.bundleAt', { code: bundleCode, place: rackPlace }))}
                </span>
              )}
            </span>
          </li>
        ))}
      </ul>
    </details>
  )
}
