import type { ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import type { LineQuote } from '#shared/pricing/line-quote'
import type { Profile } from '#shared/profile/profile.schema'
import type { ProfileCure } from '#shared/profile/profile-cure'
import type { Inches } from '#shared/units/brands'
import { printRun, printSize } from '#shared/units/print-length'
import { printWeight } from '#shared/units/weight'
import { Button } from '@/components/Button'
import { usePerson } from '@/features/people/person-context'
import { useNoPriceWords } from '@/features/prices/useNoPriceWords'
import { useFormats } from '@/lib/format/useFormats'
import type { CheckedPlan, DrawingCheck } from '../check/check-drawing'
import type { ToldProblem } from '../check/told-problems'
import { BendsOn } from './BendsOn'
import { CureButton } from './CureButton'

interface Props {
  readonly check: DrawingCheck | null
  readonly plans: readonly CheckedPlan[]
  /** The drawing in hand; null while nothing is drawn. */
  readonly profile: Profile | null
  readonly told: readonly ToldProblem[]
  readonly pieceLength: Inches
  /** Of one piece, by the price book as it is read here; null while nothing can be said. */
  readonly quote: LineQuote | null
  /** Why there is no price is told while the drawing lies still: the sheet must not shrink under the finger. */
  readonly lying: boolean
  /** Whether the server has said the same: figures are worked out here first. */
  readonly confirmed: boolean
  /** Folds looked at by a search that takes long. */
  readonly lookedAt: number | null
  /** Whether what each brake says is open beside the drawing. */
  readonly brakesOpen: boolean
  readonly onBrakes: () => void
  /** Whether the list of all problems is. */
  readonly problemsOpen: boolean
  readonly onProblems: () => void
  readonly onCure: (cure: ProfileCure) => void
  /** What else is to be said of the figures, under them. */
  readonly notice?: ReactNode
}

/** The live figures under a drawing: what it takes, what it weighs, and where it bends. */
export function AnswerBar({
  check,
  plans,
  profile,
  told,
  pieceLength,
  quote,
  lying,
  confirmed,
  lookedAt,
  brakesOpen,
  onBrakes,
  problemsOpen,
  onProblems,
  onCure,
  notice,
}: Props) {
  const { t } = useTranslation('drawing')
  const { units } = usePerson()
  const noPriceWords = useNoPriceWords()
  const { count, money } = useFormats()
  const strip = check?.strip ?? null
  const [first] = told
  const hits = plans
    .find(({ plan }) => plan.feasible)
    ?.plan.steps.reduce((sum, step) => sum + step.hits, 0)
  const cells = [
    { label: t('answer.girth'), value: strip && printSize(strip.girth, units) },
    { label: t('answer.strip'), value: strip && printSize(strip.stripWidth, units, 32) },
    {
      label: printRun(pieceLength, units),
      value: check === null || check.weight === null ? null : printWeight(check.weight, units),
    },
    { label: t('answer.piece'), value: quote?.price ? money(quote.price.pieceCents) : null },
    {
      label: t('answer.hits'),
      value: hits === undefined ? null : String(hits),
      // On a phone four figures have room; the hits stand in what each brake says too.
      onlyWide: true,
    },
  ]
  return (
    <section
      aria-label={t('answer.name')}
      data-confirmed={confirmed}
      className="shrink-0 border-y border-rule"
    >
      <dl className="grid grid-cols-4 divide-x divide-rule lg:grid-cols-5">
        {cells.map(({ label, value, onlyWide = false }) => (
          <div
            key={label}
            className={`min-w-0 px-2 py-1.5 lg:px-3 ${onlyWide ? 'max-lg:hidden' : ''}`}
          >
            <dt className="text-small text-scribe">{label}</dt>
            <dd className="font-figure text-body whitespace-nowrap lg:text-lead">{value ?? '–'}</dd>
          </div>
        ))}
      </dl>
      {quote?.noPrice && lying && (
        <p className="border-t border-rule px-3 py-1 text-small text-ochre">
          {noPriceWords(quote.noPrice)}
        </p>
      )}
      {notice}
      <div className={first ? 'border-t border-rule' : 'flex items-center border-t border-rule'}>
        <div className="min-w-0 flex-1 pb-1">
          <BendsOn check={check} plans={plans} first={first} />
          {lookedAt !== null && (
            <p role="status" className="px-3 text-small text-scribe">
              {t('answer.lookedAt', { shown: count(lookedAt) })}
            </p>
          )}
        </div>
        <div className="flex flex-wrap items-center px-1">
          {profile && first?.cure && (
            <CureButton profile={profile} cure={first.cure} onCure={onCure} />
          )}
          {told.length > 1 && (
            <Button
              variant="quiet"
              className="px-1.5! font-normal! underline"
              aria-expanded={problemsOpen}
              aria-label={t('answer.moreToLookAt', { count: told.length - 1 })}
              onClick={onProblems}
            >
              {t('answer.more', { count: told.length - 1 })}
            </Button>
          )}
          {plans.length > 0 && (
            <Button
              variant="quiet"
              className="ml-auto px-1.5! font-normal! underline"
              aria-expanded={brakesOpen}
              onClick={onBrakes}
            >
              {t(plans.some(({ plan }) => plan.feasible) ? 'why:open' : 'why:openWhy')}
            </Button>
          )}
        </div>
      </div>
    </section>
  )
}
