import { useTranslation } from 'react-i18next'
import type { Part } from '#shared/drawing/display-list'
import type { Profile } from '#shared/profile/profile.schema'
import type { ProfileCure } from '#shared/profile/profile-cure'
import { Button } from '@/components/Button'
import { Icon } from '@/components/Icon'
import { partsOfProblem } from '../check/check-drawing'
import type { ToldProblem } from '../check/told-problems'
import { usePartName } from '../usePartName'
import { useProblemWords } from '../useProblemWords'
import { CureButton } from './CureButton'

interface Props {
  readonly profile: Profile
  readonly told: readonly ToldProblem[]
  readonly onCure: (cure: ProfileCure) => void
  /** Takes the part of the figure in hand that a problem speaks of. */
  readonly onPart: (part: Part) => void
  readonly onClose: () => void
}

/** Everything that was found, errors first, each with its cure and the way to its part. */
export function ProblemList({ profile, told, onCure, onPart, onClose }: Props) {
  const { t } = useTranslation('drawing')
  const words = useProblemWords()
  const nameOf = usePartName()
  return (
    <section aria-label={t('problems.name')}>
      <div className="flex items-center justify-between gap-3">
        <h2 className="text-lead font-bold">{t('problems.name')}</h2>
        <Button variant="quiet" onClick={onClose}>
          {t('why:close')}
        </Button>
      </div>
      <ul className="divide-y divide-rule">
        {told.map(({ problem, cure }, index) => (
          <li key={index} className="flex flex-col gap-2 py-2">
            <p
              className={`flex items-start gap-2 ${problem.severity === 'error' ? 'text-chalk' : 'text-ochre'}`}
            >
              <Icon name="warn" className="mt-0.5 size-5" />
              <span>
                {words.problem(problem)} {cure === null && words.advice(problem)}
              </span>
            </p>
            <div className="-mx-2 flex flex-wrap">
              {cure && <CureButton profile={profile} cure={cure} onCure={onCure} />}
              {partsOfProblem(problem).map((part) => (
                <Button
                  key={nameOf(part)}
                  variant="quiet"
                  className="px-2!"
                  onClick={() => onPart(part)}
                >
                  {nameOf(part)}
                </Button>
              ))}
            </div>
          </li>
        ))}
      </ul>
    </section>
  )
}
