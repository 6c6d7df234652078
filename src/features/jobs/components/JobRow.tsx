import { useTranslation } from 'react-i18next'
import { Link } from 'react-router-dom'
import type { Job } from '#shared/jobs/jobs.contract'
import { PitchSign } from './PitchSign'

interface Props {
  readonly job: Job
  readonly to: string
  readonly withCompany: boolean
  /** An order for it is begun on this device. */
  readonly begun: boolean
}

export function JobRow({ job, to, withCompany, begun }: Props) {
  const { t } = useTranslation('jobs')
  const facts = [
    ...(withCompany ? [job.company.name] : []),
    ...(job.address === '' ? [] : [job.address]),
  ]
  return (
    <li className="relative border-b border-rule py-3 hover:bg-ink/5">
      <div className="flex items-baseline justify-between gap-4">
        <Link to={to} className="font-semibold after:absolute after:inset-0">
          {job.name}
        </Link>
        <PitchSign rise={job.pitchRise} />
      </div>
      <p className="text-small text-scribe">
        {[...facts, t('orderCount', { count: job.orderCount })].join(' · ')}
        {begun && <span className="font-semibold text-dye"> · {t('orderBegun')}</span>}
      </p>
    </li>
  )
}
