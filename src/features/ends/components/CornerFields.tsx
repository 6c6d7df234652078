import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { Side } from '#shared/ends/end.schema'
import { Choice } from '@/components/Choice'
import { Disclosure } from '@/components/Disclosure'
import { Select } from '@/components/Select'
import {
  cornerKind,
  cornerPlane,
  cornersOf,
  turnsTo,
  withTurn,
  type CornerKind,
  type Run,
  type TurnsTo,
} from '../model/corner-presets'
import type { DraftPlane } from '../model/draft-end'
import { DegreesField } from './DegreesField'
import { SlopeField } from './SlopeField'

type CornerPlane = Extract<DraftPlane, { corner: unknown }>

interface Props {
  readonly plane: CornerPlane
  readonly side: Side
  readonly run: Run
  readonly outer: TurnsTo
  readonly disabled: boolean
  readonly onChange: (plane: DraftPlane) => void
}

/** A corner turns by less than a straight way back, which no plane cuts. */
const MOST_TURN = 178

/** What the piece meets in its corner, and to which side; any other corner by slopes and angle. */
export function CornerFields({ plane, side, run, outer, disabled, onChange }: Props) {
  const { t } = useTranslation('ends')
  const { slopeIn, slopeOut, plan } = plane.corner
  const kind = cornerKind(plane, side, run)
  // The side stays chosen while the angle is typed anew.
  const [lastTo, setLastTo] = useState(turnsTo(plan))
  const to = plan === null || plan === 0 ? lastTo : turnsTo(plan)
  const change = (part: Partial<CornerPlane['corner']>) =>
    onChange({ corner: { ...plane.corner, ...part } })

  const meets = (met: CornerKind): string => {
    if (met !== 'level' || run.lowEnd === null) return t(`corner.${met}`)
    return run.lowEnd === side ? t('corner.eave') : t('corner.highSide')
  }

  function meet(value: string) {
    const chosen = cornersOf(run).find((known) => known === value)
    if (chosen === undefined || chosen === 'own') return
    const usual = cornerPlane(chosen, to, side, run)
    // An angle that was typed stays; the preset brings the slopes.
    if ('corner' in usual && plan !== null && plan !== 0) {
      onChange({ corner: { ...usual.corner, plan } })
    } else onChange(usual)
  }

  return (
    <div className="flex flex-col gap-4">
      <Select
        label={t('corner.legend')}
        value={kind}
        disabled={disabled}
        options={cornersOf(run)
          .filter((known) => known !== 'own' || kind === 'own')
          .map((known) => ({ value: known, label: meets(known) }))}
        onChange={(event) => meet(event.target.value)}
      />
      <Choice
        legend={t('turn.legend')}
        value={to}
        disabled={disabled}
        options={(['A', 'B'] as const).map((edge) => ({
          value: edge,
          label: t(edge === outer ? 'turn.inside' : 'turn.outside', { edge }),
        }))}
        onChange={(edge) => {
          setLastTo(edge)
          change({ plan: withTurn(plan, edge) })
        }}
      />
      <Disclosure summary={t('corner.exact')} wanted={kind === 'own'}>
        <div className="flex flex-col gap-4">
          <DegreesField
            label={t('corner.plan')}
            hint={t('corner.planHint')}
            value={plan === null ? null : Math.abs(plan)}
            within={[0, MOST_TURN]}
            disabled={disabled}
            onChange={(angle) => {
              setLastTo(to)
              change({ plan: angle === null ? null : to === 'A' ? 0 - angle : angle })
            }}
          />
          <SlopeField
            label={t('corner.into')}
            value={slopeIn}
            usual={run.slope}
            disabled={disabled}
            onChange={(slope) => change({ slopeIn: slope })}
          />
          <SlopeField
            label={t('corner.outOf')}
            value={slopeOut}
            usual={run.slope}
            disabled={disabled}
            onChange={(slope) => change({ slopeOut: slope })}
          />
        </div>
      </Disclosure>
    </div>
  )
}
