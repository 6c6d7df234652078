import { useTranslation } from 'react-i18next'
import { Link } from 'react-router-dom'
import type { RunSummary } from '#shared/runs/runs.contract'
import { paths } from '@/app/paths'
import { buttonStyle } from '@/components/button-style'
import { ColorChip } from '@/components/ColorChip'
import { ProfileThumb } from '@/features/drawing/figure/ProfileThumb'
import { usePerson } from '@/features/people/person-context'
import { useUnits } from '@/features/people/useUnits'
import { useFormats } from '@/lib/format/useFormats'

interface Props {
  readonly run: RunSummary
  /** The first of the queue stands large, with the one filled button. */
  readonly first: boolean
}

/** A run in the queue: what it is, its strip, its pieces, when it is due and who has it. */
export function RunRow({ run, first }: Props) {
  const { t } = useTranslation('brake')
  const { size, run: length } = useUnits()
  const { day, daysUntil } = useFormats()
  const person = usePerson()
  const isLate = daysUntil(run.neededBy) < 0
  const isToday = daysUntil(run.neededBy) === 0
  const mine = run.claimedBy?.id === person.id

  return (
    <li className="grid grid-cols-[5.5rem_10rem_minmax(12rem,1fr)_9rem_11rem_13rem] items-center gap-4 border-b border-rule py-3 max-xl:grid-cols-[4.5rem_8rem_minmax(9rem,1fr)_8rem_9rem_11rem] max-lg:flex max-lg:flex-wrap">
      <span className={`font-figure font-medium ${first ? 'text-figure' : 'text-title'}`}>
        {run.number}
      </span>
      <ProfileThumb
        profile={run.profile}
        stock={run.stock}
        title={run.name}
        width={150}
        height={first ? 110 : 78}
        className="h-auto max-w-full"
      />
      <div className="min-w-0">
        <p className={`font-bold ${first ? 'text-title' : 'text-lead'}`}>{run.name}</p>
        <p className="text-small text-scribe">
          <ColorChip
            hex={run.stock.colorHex}
            name={run.stock.colorName}
            detail={run.stock.thicknessName}
          />
          {` · ${run.company}`}
        </p>
        <p className="text-small text-dye">
          {run.claimedBy
            ? t(mine ? 'queue.yours' : 'queue.taken', { name: run.claimedBy.name })
            : run.brakeName}
        </p>
        {run.sameStock && <p className="text-small font-semibold">{t('queue.sameStock')}</p>}
      </div>
      <Figure label={t('queue.strip')} value={size(run.strip.stripWidth, 32)} large={first} />
      <Figure
        label={t('queue.pieces')}
        value={run.lengths
          .map(({ length: inches, count }) => `${count} × ${length(inches)}`)
          .join(', ')}
        large={first}
      />
      <div className="flex flex-col items-end gap-1 text-right">
        <span className={isLate ? 'font-semibold text-chalk' : isToday ? 'text-ochre' : ''}>
          {t(isLate ? 'queue.late' : 'queue.due', { day: day(run.neededBy) })}
        </span>
        <Link
          to={paths.brake.run(run.id)}
          className={buttonStyle(first ? 'primary' : 'secondary')}
          aria-label={t('queue.openRun', { number: run.number, name: run.name })}
        >
          {t(mine ? 'queue.goOn' : 'queue.open')}
        </Link>
      </div>
    </li>
  )
}

function Figure({ label, value, large }: { label: string; value: string; large: boolean }) {
  return (
    <div>
      <p className="text-small text-scribe">{label}</p>
      <p className={`font-figure ${large ? 'text-title' : 'text-lead'}`}>{value}</p>
    </div>
  )
}
