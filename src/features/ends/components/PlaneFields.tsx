import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { Side } from '#shared/ends/end.schema'
import { Button } from '@/components/Button'
import { Choice } from '@/components/Choice'
import { cornerPlane, plumbPlane, type Run, type TurnsTo } from '../model/corner-presets'
import type { DraftPlane } from '../model/draft-end'
import { CornerFields } from './CornerFields'
import { NormalFields } from './NormalFields'
import { SlopeField } from './SlopeField'

interface Props {
  readonly legend: string
  readonly plane: DraftPlane
  readonly side: Side
  readonly run: Run
  /** The edge on the outside of the building. */
  readonly outer: TurnsTo
  readonly disabled: boolean
  readonly onChange: (plane: DraftPlane) => void
}

type Kind = 'plumb' | 'corner' | 'normal'

const kindOf = (plane: DraftPlane): Kind =>
  'plumb' in plane ? 'plumb' : 'corner' in plane ? 'corner' : 'normal'

/** The plane of a cut: plumb, that of a corner, or any other for those who know its normal. */
export function PlaneFields({ legend, plane, side, run, outer, disabled, onChange }: Props) {
  const { t } = useTranslation('ends')
  const kind = kindOf(plane)
  const [free, setFree] = useState(kind === 'normal')

  function choose(next: Kind) {
    if (next === kind) return
    if (next === 'plumb') onChange(plumbPlane(run))
    else if (next === 'normal') onChange({ normal: [1, 0, 0] })
    else onChange(cornerPlane('level', outer === 'B' ? 'A' : 'B', side, run))
  }

  const kinds: readonly Kind[] =
    free || kind === 'normal' ? ['corner', 'plumb', 'normal'] : ['corner', 'plumb']
  return (
    <div className="flex flex-col gap-4">
      <div>
        <Choice
          legend={legend}
          value={kind}
          disabled={disabled}
          options={kinds.map((value) => ({ value, label: t(`plane.${value}`) }))}
          onChange={choose}
        />
        {!free && kind !== 'normal' && (
          <Button
            variant="quiet"
            className="px-1.5! -mx-1.5"
            disabled={disabled}
            onClick={() => setFree(true)}
          >
            {t('plane.more')}
          </Button>
        )}
      </div>
      {'plumb' in plane && (
        <SlopeField
          label={t('plane.pieceRuns')}
          value={plane.plumb}
          usual={run.slope}
          disabled={disabled}
          onChange={(plumb) => onChange({ plumb })}
        />
      )}
      {'corner' in plane && (
        <CornerFields
          plane={plane}
          side={side}
          run={run}
          outer={outer}
          disabled={disabled}
          onChange={onChange}
        />
      )}
      {'normal' in plane && (
        <NormalFields
          normal={plane.normal}
          disabled={disabled}
          onChange={(normal) => onChange({ normal })}
        />
      )}
    </div>
  )
}
