import { useTranslation } from 'react-i18next'
import { useUnits } from '@/features/people/useUnits'
import { useFormats } from '@/lib/format/useFormats'
import { usePlanWords } from '@/features/drawing/usePlanWords'
import type { DraftLine } from '../draft/order-draft'
import { bendsNowhere, checkLine, type LineGround } from '../form/check-line'

interface Props {
  readonly lines: readonly DraftLine[]
  readonly ground: LineGround
}

/** The last look: how much it is in all, and what no brake of the shop bends. */
export function OrderReview({ lines, ground }: Props) {
  const { t } = useTranslation('orders')
  const { weight } = useUnits()
  const { count } = useFormats()
  const { checks } = usePlanWords()
  const checked = lines.map((line) => ({ line, answer: checkLine(line, ground) }))
  const pieces = lines.reduce((sum, { quantity }) => sum + (quantity ?? 0), 0)
  const pounds = checked.reduce(
    (sum, { line, answer }) =>
      sum + (line.length === null ? 0 : (answer.check?.weight ?? 0) * (line.quantity ?? 0)),
    0,
  )
  const nowhere = checked.filter(({ answer }) => bendsNowhere(answer))
  const made = checked.flatMap(({ answer }) => answer.plans).find(({ plan }) => plan.feasible)
    ?.plan.checks
  return (
    <section aria-label={t('review.title')} className="flex max-w-prose flex-col gap-2">
      <p className="font-figure text-lead">
        {t('review.total', {
          count: pieces,
          shown: count(pieces),
          lines: t('review.lines', { count: lines.length }),
          weight: weight(pounds),
        })}
      </p>
      {nowhere.length > 0 && (
        <p className="font-semibold text-chalk">
          {t('review.nowhere', { marks: nowhere.map(({ line }) => line.mark).join(', ') })}
        </p>
      )}
      {made && <p className="text-small text-scribe">{checks(made)}</p>}
    </section>
  )
}
