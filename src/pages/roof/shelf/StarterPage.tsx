import { useDeferredValue, useMemo, useState } from 'react'
import { useTranslation } from 'react-i18next'
import { isLess } from '#shared/geometry/tolerance'
import {
  STARTER_PITCH,
  starterHeading,
  starterProfile,
  type Starter,
} from '#shared/profile/starters'
import type { ShelfProfile } from '#shared/shelf/shelf.contract'
import { paths } from '@/app/paths'
import { Button } from '@/components/Button'
import { ButtonLink } from '@/components/ButtonLink'
import { Notice } from '@/components/Notice'
import { TextField } from '@/components/TextField'
import { parsePitch } from '@/features/jobs/pitch'
import { SavedFigure } from '@/features/shelf/components/SavedFigure'
import { printParameters } from '@/features/shelf/starter/starter-address'
import { StarterFields } from '@/features/shelf/starter/StarterFields'
import { useStarterValues } from '@/features/shelf/starter/useStarterValues'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { JobChoice } from './JobChoice'
import type { TargetJob } from './useTargetJob'

interface Props {
  readonly item: ShelfProfile
  readonly starter: Starter
  readonly name: string
  readonly target: TargetJob
}

/** A starter made to the roof: what is set of it changes the figure, and goes with it to the board. */
export function StarterPage({ item, starter, name, target }: Props) {
  const { t } = useTranslation('shelf')
  const { t: about } = useTranslation('starters')
  const values = useStarterValues(starter)
  const [pitchText, setPitchText] = useState(String(STARTER_PITCH))
  const { job, jobId, orderId } = target
  const typed = parsePitch(pitchText)
  const pitchRise = job?.pitchRise ?? (typed.ok ? typed.rise : STARTER_PITCH)

  const wanted = useMemo(
    () => starterProfile(starter.key, values.taken, pitchRise),
    [starter.key, values.taken, pitchRise],
  )
  // Plans take a moment: the fields stay ahead of the figure.
  const profile = useDeferredValue(wanted)

  const { pitch } = starter
  const notMeant =
    pitch !== null && (isLess(pitchRise, pitch.least) || isLess(pitch.most, pitchRise))
  const set = printParameters(starter, values.taken)
  const order = orderId === null ? {} : { order: orderId }

  return (
    <PlaceFrame
      title={name}
      subtitle={job ? t('forThisJob', { job: job.name, rise: job.pitchRise }) : t('starter')}
      back={{ to: paths.roof.shelf(jobId ?? undefined, orderId ?? undefined), label: t('back') }}
      primary={
        !job ? undefined : values.isSound ? (
          <ButtonLink
            variant="primary"
            to={paths.roof.board(job.id, { shelf: item.id, set, ...order })}
          >
            {t('drawWith')}
          </ButtonLink>
        ) : (
          <Button variant="primary" disabled>
            {t('drawWith')}
          </Button>
        )
      }
    >
      <div className="flex flex-col gap-6">
        <SavedFigure
          profile={profile}
          name={name}
          pitchRise={pitchRise}
          heading={starterHeading(starter.key, profile, pitchRise)}
        >
          <p>{about(`${starter.key}.about`)}</p>
          <StarterFields starter={starter} values={values} />
          {pitch !== null && job === null && (
            <TextField
              label={t('set.pitch')}
              hint={t('set.pitchHint')}
              className="max-w-xs"
              value={pitchText}
              inputMode="decimal"
              autoComplete="off"
              error={typed.ok ? undefined : t(`jobs:pitchRefused.${typed.refusal}`)}
              onChange={(event) => setPitchText(event.target.value)}
            />
          )}
          {notMeant && (
            <Notice kind="warn">
              {t('set.pitchNotMeant', { least: pitch.least, most: pitch.most, rise: pitchRise })}
            </Notice>
          )}
        </SavedFigure>
        <JobChoice target={target} />
      </div>
    </PlaceFrame>
  )
}
