import { useTranslation } from 'react-i18next'
import type { Progress } from '#shared/orders/order.schema'
import { useFormats } from '@/lib/format/useFormats'

/** In the order of the work, the furthest first; scrapped and withdrawn pieces are no progress. */
const STEPS = ['pickedUp', 'bundled', 'bent', 'queued'] as const

const FILLS: Record<(typeof STEPS)[number], string> = {
  pickedUp: 'bg-oxide',
  bundled: 'bg-oxide/55',
  bent: 'bg-ochre',
  queued: 'hatched',
}

interface Props {
  readonly progress: Progress
  /** Without the counts in words, which then are read out only. */
  readonly compact?: boolean
}

/** How far the pieces of an order have come, as one strip cut by state, and the counts in words. */
export function PieceProgress({ progress, compact = false }: Props) {
  const { t } = useTranslation('orders')
  const { count } = useFormats()
  const present = STEPS.filter((step) => progress[step] > 0)
  if (present.length === 0) return null
  const words = present.map((step) =>
    t(`progress.${step}`, { count: progress[step], shown: count(progress[step]) }),
  )
  return (
    <div>
      <div
        aria-hidden="true"
        className="flex h-2.5 overflow-hidden border border-edge bg-sheet [&>*+*]:border-l [&>*+*]:border-edge"
      >
        {present.map((step) => (
          <span key={step} className={FILLS[step]} style={{ flexGrow: progress[step] }} />
        ))}
      </div>
      <p className={compact ? 'sr-only' : 'mt-1 text-small text-scribe'}>{words.join(' · ')}</p>
    </div>
  )
}
