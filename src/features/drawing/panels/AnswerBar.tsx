import { useTranslation } from 'react-i18next'
import type { Inches } from '#shared/units/brands'
import { printRun, printSize } from '#shared/units/print-length'
import { printWeight } from '#shared/units/weight'
import { usePerson } from '@/features/people/person-context'
import { useFormats } from '@/lib/format/useFormats'
import type { CheckedPlan, DrawingCheck } from '../check/check-drawing'
import { BendsOn } from './BendsOn'

interface Props {
  readonly check: DrawingCheck | null
  readonly plans: readonly CheckedPlan[]
  readonly pieceLength: Inches
  /** Whether the server has said the same: figures are worked out here first. */
  readonly confirmed: boolean
  /** Folds looked at by a search that takes long. */
  readonly lookedAt: number | null
  /** Whether what each brake says is open beside the drawing. */
  readonly brakesOpen: boolean
  readonly onBrakes: () => void
}

/** The live figures under a drawing: what it takes, what it weighs, and where it bends. */
export function AnswerBar({
  check,
  plans,
  pieceLength,
  confirmed,
  lookedAt,
  brakesOpen,
  onBrakes,
}: Props) {
  const { t } = useTranslation('drawing')
  const { units } = usePerson()
  const { count } = useFormats()
  const strip = check?.strip ?? null
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
    { label: t('answer.hits'), value: hits === undefined ? null : String(hits) },
  ]
  return (
    <section
      aria-label={t('answer.name')}
      data-confirmed={confirmed}
      className="shrink-0 border-y border-rule"
    >
      <dl className="grid grid-cols-4 divide-x divide-rule">
        {cells.map(({ label, value }) => (
          <div key={label} className="min-w-0 px-2 py-1.5 lg:px-3">
            <dt className="text-small text-scribe">{label}</dt>
            <dd className="font-figure text-body whitespace-nowrap lg:text-lead">{value ?? '–'}</dd>
          </div>
        ))}
      </dl>
      <div className="flex items-center border-t border-rule">
        <div className="min-w-0 flex-1">
          <BendsOn check={check} plans={plans} />
          {lookedAt !== null && (
            <p role="status" className="px-3 pb-1 text-small text-scribe">
              {t('answer.lookedAt', { shown: count(lookedAt) })}
            </p>
          )}
        </div>
        {plans.length > 0 && (
          <button
            type="button"
            aria-expanded={brakesOpen}
            onClick={onBrakes}
            className="min-h-target shrink-0 px-3 text-dye underline hover:bg-ink/5"
          >
            {t(plans.some(({ plan }) => plan.feasible) ? 'why:open' : 'why:openWhy')}
          </button>
        )}
      </div>
    </section>
  )
}
