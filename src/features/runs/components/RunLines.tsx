import { useTranslation } from 'react-i18next'
import { Link } from 'react-router-dom'
import { HAND_LETTERS } from '#shared/pieces/piece-mark'
import type { Run, RunLine } from '#shared/runs/runs.contract'
import { paths } from '@/app/paths'
import { useUnits } from '@/features/people/useUnits'

const handsText = ({ hands }: RunLine): string =>
  hands === null
    ? ''
    : (['left', 'right'] as const)
        .filter((hand) => hands[hand] > 0)
        .map((hand) => `${hands[hand]} ${HAND_LETTERS[hand]}`)
        .join(' + ')

/** How many strips of what length, by line and hand; each leads to its strip sheet. */
export function RunLines({ run }: { readonly run: Run }) {
  const { t } = useTranslation('brake')
  const { run: length } = useUnits()
  return (
    <ul className="flex flex-col">
      {run.lines.map((line) => {
        const hands = handsText(line)
        return (
          <li key={line.id}>
            <Link
              to={paths.brake.stripSheet(run.id, line.id)}
              aria-label={t('strip.sheetOf', { mark: line.mark })}
              className="flex min-h-target flex-wrap items-baseline gap-x-3 border-b border-rule py-2 text-dye underline"
            >
              <span className="font-figure text-figure">
                {line.quantity} × {length(line.length)}
              </span>
              <span className="font-bold">{line.mark}</span>
              {hands !== '' && <span className="font-figure text-lead font-bold">{hands}</span>}
              <span className="text-small">
                {t(line.ends === null ? 'strip.square' : 'strip.dressed')}
              </span>
            </Link>
          </li>
        )
      })}
    </ul>
  )
}
