import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { Side } from '#shared/ends/end.schema'
import { Select } from '@/components/Select'
import { plumbPlane, type Run, type TurnsTo } from '../model/corner-presets'
import type { DraftMiter, DraftPlane } from '../model/draft-end'
import { planeOfLeg, SQUARE_PLANE, withLegPlane } from '../model/end-edits'
import { PlaneFields } from './PlaneFields'

const CUTS = ['end', 'square', 'plumb', 'own'] as const
type Cut = (typeof CUTS)[number]

interface Props {
  readonly end: DraftMiter
  readonly leg: number
  readonly side: Side
  readonly run: Run
  readonly outer: TurnsTo
  readonly disabled: boolean
  readonly onChange: (end: DraftMiter) => void
}

const isSamePlane = (a: DraftPlane, b: DraftPlane): boolean =>
  JSON.stringify(a) === JSON.stringify(b)

/** How one leg is cut: as the end, square, plumb, or by a plane of its own. */
export function LegCut({ end, leg, side, run, outer, disabled, onChange }: Props) {
  const { t } = useTranslation('ends')
  const plane = planeOfLeg(end, leg)
  // A plane of one's own may happen to be plumb while it is set.
  const [own, setOwn] = useState(false)
  const known: Cut =
    plane === undefined
      ? 'end'
      : own
        ? 'own'
        : isSamePlane(plane, SQUARE_PLANE)
          ? 'square'
          : isSamePlane(plane, plumbPlane(run))
            ? 'plumb'
            : 'own'

  function choose(cut: Cut) {
    setOwn(cut === 'own')
    const planes: Record<Cut, DraftPlane | null> = {
      end: null,
      square: SQUARE_PLANE,
      plumb: plumbPlane(run),
      own: plane ?? end.plane,
    }
    onChange(withLegPlane(end, leg, planes[cut]))
  }

  return (
    <>
      <Select
        label={t('legCut.label', { leg })}
        value={known}
        disabled={disabled}
        options={CUTS.map((cut) => ({ value: cut, label: t(`legCut.${cut}`) }))}
        onChange={(event) => choose(CUTS.find((cut) => cut === event.target.value) ?? 'end')}
      />
      {known === 'own' && plane && (
        <div className="border-l-4 border-rule pl-3">
          <PlaneFields
            legend={t('legCut.plane', { leg })}
            plane={plane}
            side={side}
            run={run}
            outer={outer}
            disabled={disabled}
            onChange={(next) => onChange(withLegPlane(end, leg, next))}
          />
        </div>
      )}
    </>
  )
}
