import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { Side } from '#shared/ends/end.schema'
import type { Profile } from '#shared/profile/profile.schema'
import { Button } from '@/components/Button'
import { Choice } from '@/components/Choice'
import { Disclosure } from '@/components/Disclosure'
import {
  cornerKind,
  cornerPlane,
  isGableCorner,
  plumbPlane,
  type Run,
  type TurnsTo,
} from '../model/corner-presets'
import type { DraftEnd, DraftMiter } from '../model/draft-end'
import { SQUARE_PLANE, withKind } from '../model/end-edits'
import { legsOnRoof } from '../model/lay-presets'
import { EndLengthField } from './EndLengthField'
import { LegByLeg } from './LegByLeg'
import { PlaneFields } from './PlaneFields'

const KINDS = ['square', 'lap', 'miter'] as const
const LAP_SIDES = ['over', 'under'] as const
/** The longest lap the shop dresses, inches. */
const LONGEST_LAP = 24

interface Props {
  readonly end: DraftEnd
  readonly side: Side
  readonly profile: Profile
  readonly run: Run
  /** The lay a miter begins with. */
  readonly lay: number | null
  readonly outer: TurnsTo
  readonly disabled: boolean
  readonly onChange: (end: DraftEnd) => void
}

/** One end of a piece: what kind it is, how it is cut, its tabs. */
export function EndForm({ end, side, profile, run, lay, outer, disabled, onChange }: Props) {
  const { t } = useTranslation('ends')
  // Trying another kind loses nothing of the one that was set.
  const [before, setBefore] = useState<Partial<Record<DraftEnd['kind'], DraftEnd>>>({})

  function choose(kind: DraftEnd['kind']) {
    setBefore({ ...before, [end.kind]: end })
    const known = before[kind]
    const to = outer === 'B' ? 'A' : 'B'
    onChange(
      known
        ? { ...known, tabs: end.tabs }
        : withKind(end, kind, { plane: cornerPlane('level', to, side, run), lay }),
    )
  }

  return (
    <div className="flex flex-col gap-4">
      <Choice
        legend={t('kind.legend')}
        value={end.kind}
        disabled={disabled}
        options={KINDS.map((kind) => ({ value: kind, label: t(`kind.${kind}`) }))}
        onChange={choose}
      />
      {end.kind === 'lap' && (
        <>
          <Choice
            legend={t('lap.legend')}
            value={end.side}
            disabled={disabled}
            options={LAP_SIDES.map((lap) => ({ value: lap, label: t(`lap.${lap}`) }))}
            onChange={(lap) => onChange({ ...end, side: lap })}
          />
          <EndLengthField
            label={t('lap.length')}
            hint={t(`lap.${end.side}Hint`)}
            value={end.length}
            most={LONGEST_LAP}
            disabled={disabled}
            onChange={(length) => onChange({ ...end, length })}
          />
        </>
      )}
      {end.kind === 'miter' && (
        <>
          <PlaneFields
            legend={t('plane.legend')}
            plane={end.plane}
            side={side}
            run={run}
            outer={outer}
            disabled={disabled}
            onChange={(plane) => onChange({ ...end, plane })}
          />
          {isGableCorner(cornerKind(end.plane, side, run), run) && (
            <FaceAlone
              end={end}
              profile={profile}
              run={run}
              disabled={disabled}
              onChange={onChange}
            />
          )}
        </>
      )}
      <Disclosure
        wanted={end.tabs.length > 0 || (end.kind === 'miter' && end.legs.length > 0)}
        summary={end.kind === 'miter' ? t('legs.cutsAndTabs') : t('legs.tabs')}
      >
        <p className="pb-2 text-small text-scribe">{t('legs.hint')}</p>
        <LegByLeg
          end={end}
          side={side}
          profile={profile}
          run={run}
          outer={outer}
          disabled={disabled}
          onChange={onChange}
        />
      </Disclosure>
    </div>
  )
}

interface FaceProps {
  readonly end: DraftMiter
  readonly profile: Profile
  readonly run: Run
  readonly disabled: boolean
  readonly onChange: (end: DraftMiter) => void
}

/**
 * A gable's face stands square to the roof and a level piece's face plumb, so they are no mirror
 * images: only the legs on the roof take the corner's cut, the gable's face is cut plumb and the
 * level one square. Source: geometry of the corner, both face edges then lie on one plumb line.
 */
function FaceAlone({ end, profile, run, disabled, onChange }: FaceProps) {
  const { t } = useTranslation('ends')
  const onRoof = legsOnRoof(profile, end.lay, run)
  const cut = run.lowEnd === null ? 'square' : 'plumb'
  const plane = cut === 'square' ? SQUARE_PLANE : plumbPlane(run)
  const legs = profile.legs.flatMap((_, index) =>
    onRoof.includes(index + 1) ? [] : [{ leg: index + 1, plane }],
  )
  if (onRoof.length === 0 || legs.length === 0) return null
  const done = JSON.stringify(end.legs) === JSON.stringify(legs)
  return (
    <div>
      <p className="text-small text-scribe">{t('face.hint')}</p>
      <Button
        disabled={disabled}
        aria-pressed={done}
        onClick={() => onChange({ ...end, legs: done ? [] : legs })}
      >
        {done ? t('face.undo') : t(`face.${cut}`)}
      </Button>
    </div>
  )
}
