import { useTranslation } from 'react-i18next'
import type { OrderEvent } from '#shared/orders/order.schema'
import { readRedrawn } from '#shared/orders/redrawn'
import { useFormats } from '@/lib/format/useFormats'

/** What was done with an order, the latest first. */
export function OrderHistory({ events }: { readonly events: readonly OrderEvent[] }) {
  const { t } = useTranslation('orders')
  const { moment } = useFormats()

  /** The signs of a redrawn order as sentences: what followed the roof, and what has to be looked at. */
  function redrawnWords(text: string): string {
    const read = readRedrawn(text)
    if (!read) return text
    const { from, to, drawn, mitered } = read
    return [
      t(drawn === '' ? 'redrawn.pitch' : 'redrawn.lines', { from, to, marks: drawn }),
      ...(mitered === '' ? [] : [t('redrawn.mitered', { from, marks: mitered })]),
    ].join('\n')
  }

  return (
    <ol className="divide-y divide-rule border-y border-rule">
      {events.toReversed().map(({ id, kind, at, by, text }) => (
        <li key={id} className="py-2.5">
          <p className="flex flex-wrap gap-x-4">
            <span className="min-w-40 flex-1">{t(`event.${kind}`, { name: by })}</span>
            <time dateTime={at} className="font-figure text-small text-scribe">
              {moment(at)}
            </time>
          </p>
          {text !== '' && (
            <p className="whitespace-pre-line text-scribe">
              {kind === 'redrawn' ? redrawnWords(text) : text}
            </p>
          )}
        </li>
      ))}
    </ol>
  )
}
