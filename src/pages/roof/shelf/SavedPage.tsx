import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { STARTER_PITCH } from '#shared/profile/starters'
import type { ShelfProfile, ShelfVersion } from '#shared/shelf/shelf.contract'
import { paths } from '@/app/paths'
import { ButtonLink } from '@/components/ButtonLink'
import { SavedFigure } from '@/features/shelf/components/SavedFigure'
import { ShelfVersions } from '@/features/shelf/components/ShelfVersions'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { JobChoice } from './JobChoice'
import type { TargetJob } from './useTargetJob'

interface Props {
  readonly item: ShelfProfile
  readonly name: string
  readonly target: TargetJob
}

/** A company's saved profile with its versions, and the way into a job. */
export function SavedPage({ item, name, target }: Props) {
  const { t } = useTranslation('shelf')
  const [shown, setShown] = useState<ShelfVersion | null>(null)
  const { job, jobId, orderId } = target
  const order = orderId === null ? {} : { order: orderId }
  return (
    <PlaceFrame
      title={name}
      subtitle={item.company?.name ?? t('starter')}
      back={{ to: paths.roof.shelf(jobId ?? undefined, orderId ?? undefined), label: t('back') }}
      primary={
        // What is drawn with is the version on the shelf, so that is the one to be seen.
        job && shown === null ? (
          <ButtonLink variant="primary" to={paths.roof.board(job.id, { shelf: item.id, ...order })}>
            {t('drawWith')}
          </ButtonLink>
        ) : undefined
      }
    >
      <div className="flex flex-col gap-6">
        <SavedFigure
          profile={shown?.profile ?? item.profile}
          name={name}
          pitchRise={job?.pitchRise ?? STARTER_PITCH}
        >
          {shown && (
            <p role="status" className="font-semibold text-ochre">
              {t('versions.looking', { version: shown.version, now: item.version })}
            </p>
          )}
        </SavedFigure>
        <JobChoice target={target} />
        {item.company && <ShelfVersions item={item} shown={shown} onShow={setShown} />}
      </div>
    </PlaceFrame>
  )
}
