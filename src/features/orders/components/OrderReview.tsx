import { useTranslation } from 'react-i18next'
import { sumPrices } from '#shared/pricing/price-line'
import { girthDifference } from '#shared/profile/stated-girth'
import { useEndWords } from '@/features/ends/useEndWords'
import { useUnits } from '@/features/people/useUnits'
import { PriceTotal } from '@/features/prices/components/PriceTotal'
import { useQuote } from '@/features/prices/useQuote'
import { GoodsList } from '@/features/roof-line/components/GoodsList'
import { useFormats } from '@/lib/format/useFormats'
import { usePlanWords } from '@/features/drawing/usePlanWords'
import type { DraftLine, OrderDraft } from '../draft/order-draft'
import { bendsNowhere, checkLine, type LineGround } from '../form/check-line'
import { lineToPrice } from '../form/line-to-price'

interface Props {
  readonly draft: OrderDraft
  readonly ground: LineGround
}

const marksOf = (lines: readonly DraftLine[]): string => lines.map(({ mark }) => mark).join(', ')

/** The last look: every line in a row, how much it is in all, and what the shop will ask about. */
export function OrderReview({ draft: { lines, goods }, ground }: Props) {
  const { t } = useTranslation('orders')
  const { weight } = useUnits()
  const { count } = useFormats()
  const { checks } = usePlanWords()
  const checked = lines.map((line) => ({ line, answer: checkLine(line, ground) }))
  const quote = useQuote()
  const priced = checked.map(({ line, answer }) => ({
    line,
    price: quote(lineToPrice(line, answer))?.price ?? null,
  }))
  const pieces = lines.reduce((sum, { quantity }) => sum + (quantity ?? 0), 0)
  const pounds = checked.reduce(
    (sum, { line, answer }) =>
      sum + (line.length === null ? 0 : (answer.check?.weight ?? 0) * (line.quantity ?? 0)),
    0,
  )
  const nowhere = checked.filter(({ answer }) => bendsNowhere(answer)).map(({ line }) => line)
  const otherGirth = lines.filter(
    ({ profile, statedGirth }) =>
      statedGirth !== null && girthDifference(profile, statedGirth) !== 0,
  )
  const made = checked.flatMap(({ answer }) => answer.plans).find(({ plan }) => plan.feasible)
    ?.plan.checks
  return (
    <section aria-label={t('review.title')} className="flex max-w-prose flex-col gap-2">
      {lines.length > 0 && (
        <ul className="divide-y divide-rule border-y border-rule">
          {lines.map((line) => (
            <ReviewedLine key={line.key} line={line} />
          ))}
        </ul>
      )}
      <p className="font-figure text-lead">
        {t('review.total', {
          count: pieces,
          shown: count(pieces),
          lines: t('review.lines', { count: lines.length }),
          weight: weight(pounds),
        })}
      </p>
      {lines.length > 0 && (
        <PriceTotal
          cents={sumPrices(priced.map(({ price }) => price))}
          without={priced.filter(({ price }) => price === null).map(({ line }) => line.mark)}
        />
      )}
      {goods.length > 0 && (
        <div>
          <h4 className="text-small text-scribe">{t('goods:title')}</h4>
          <GoodsList goods={goods} stocks={ground.stocks} />
        </div>
      )}
      {nowhere.length > 0 && (
        <p className="font-semibold text-chalk">
          {t('review.nowhere', { marks: marksOf(nowhere) })}
        </p>
      )}
      {otherGirth.length > 0 && (
        <p className="font-semibold text-chalk">
          {t('review.otherGirth', { marks: marksOf(otherGirth) })}
        </p>
      )}
      {made && <p className="text-small text-scribe">{checks(made)}</p>}
    </section>
  )
}

function ReviewedLine({ line }: { readonly line: DraftLine }) {
  const words = useEndWords()
  const { run } = useUnits()
  const { mark, name, quantity, length, hands, ends } = line
  return (
    <li className="py-1.5">
      <p className="flex flex-wrap gap-x-3">
        <span className="font-figure font-bold">{mark}</span>
        <span className="min-w-32 flex-1">{name}</span>
        <span className="font-figure whitespace-nowrap">
          {quantity ?? '?'} × {length === null ? '?' : run(length)}
          {hands && <strong> · {words.hands(hands)}</strong>}
        </span>
      </p>
      {ends && (
        <p className="text-small text-scribe">
          {words.ends(ends)}
          {ends.lowEnd !== null && ` · ${words.run(ends.lowEnd)}`}
        </p>
      )}
    </li>
  )
}
