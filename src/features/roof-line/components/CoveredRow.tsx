import { useTranslation } from 'react-i18next'
import { QuantityField } from '@/features/orders/components/QuantityField'
import { useUnits } from '@/features/people/useUnits'
import { canShare, runOf, type CoveredChoice, type CoveredLine } from '../model/count-goods'

interface Props {
  readonly line: CoveredLine
  readonly choice: CoveredChoice
  readonly onChange: (choice: CoveredChoice) => void
}

/** A line on the roof as its pieces cover it: how many are alike, where it is fastened and taped. */
export function CoveredRow({ line, choice, onChange }: Props) {
  const { t } = useTranslation('goods')
  const { run } = useUnits()
  const { times } = choice
  const shared = canShare(line, times)
  const reached = shared ? runOf(line, times) : null
  const marks = line.marks.join(', ')
  return (
    <li className="flex flex-col gap-3 py-3">
      <p>
        <span className="mr-2 font-figure font-bold">{marks}</span>
        {reached && (
          <span className="text-scribe">
            {t('covers', {
              count: reached.laps.length,
              length: run(reached.length),
              lap: run(line.lap),
            })}
          </span>
        )}
      </p>
      <div className="grid items-start gap-4 sm:grid-cols-2">
        <QuantityField
          label={t('times', { marks })}
          value={times}
          disabled={false}
          digits={3}
          error={shared ? undefined : t('cannotShare')}
          onChange={(next) => onChange({ ...choice, times: next })}
        />
        <QuantityField
          label={t('fastenedLegs', { marks })}
          value={choice.fastenedLegs}
          disabled={false}
          digits={2}
          least={0}
          error={choice.fastenedLegs === null ? t('fastenedMissing') : undefined}
          onChange={(fastenedLegs) => onChange({ ...choice, fastenedLegs })}
        />
      </div>
      <div className="flex flex-wrap gap-x-6">
        {(['taped', 'closed'] as const).map((what) => (
          <label key={what} className="inline-flex min-h-target items-center gap-2.5">
            <input
              type="checkbox"
              className="size-5 accent-dye"
              checked={choice[what]}
              onChange={(event) => onChange({ ...choice, [what]: event.target.checked })}
            />
            {t(`with.${what}`)}
            <span className="sr-only">, {marks}</span>
          </label>
        ))}
      </div>
    </li>
  )
}
