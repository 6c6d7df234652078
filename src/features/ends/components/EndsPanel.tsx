import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { Side } from '#shared/ends/end.schema'
import type { Profile } from '#shared/profile/profile.schema'
import type { Stock } from '#shared/stock/stock.schema'
import type { Strip } from '#shared/strip/strip.schema'
import { pitchAngle } from '#shared/units/angle'
import type { Inches } from '#shared/units/brands'
import { Button } from '@/components/Button'
import { Tabs } from '@/components/Tabs'
import type { EndsCheck } from '../model/check-ends'
import type { Run } from '../model/corner-presets'
import type { DraftEnd, DraftEnds, DraftHands } from '../model/draft-end'
import {
  BOTH_SQUARE,
  copiedMirrored,
  endsToKeep,
  layOf,
  otherSide,
  withEnd,
  withLay,
} from '../model/end-edits'
import type { Handed } from '../model/hand-edits'
import { outerEdge, usualLay } from '../model/lay-presets'
import type { EndedLine } from '../model/neighbors'
import { withLowEnd } from '../model/run-edits'
import { useEndWords } from '../useEndWords'
import { EndForm } from './EndForm'
import { EndPictures } from './EndPictures'
import { HandsFields } from './HandsFields'
import { LayFields } from './LayFields'
import { RunFields } from './RunFields'

interface Props {
  readonly lineKey: string
  readonly mark: string
  /** As the shop will make it. */
  readonly profile: Profile
  readonly stock: Stock
  readonly strip: Strip
  readonly pieceLength: Inches
  readonly ends: DraftEnds | null
  readonly hands: DraftHands | null
  readonly quantity: number | null
  readonly check: EndsCheck | null
  /** The job's, rise in 12. */
  readonly pitchRise: number
  /** All lines of the order, for what meets here. */
  readonly lines: readonly EndedLine[]
  readonly disabled: boolean
  readonly onEnds: (ends: DraftEnds | null) => void
  readonly onHands: (handed: Handed) => void
}

const SIDES: readonly Side[] = ['left', 'right']

/** How both ends of a line's pieces are cut, which way they run and lie, and their hands. */
export function EndsPanel(props: Props) {
  const { profile, stock, pitchRise, hands, quantity, check, disabled, onEnds, onHands } = props
  const { t } = useTranslation('ends')
  const words = useEndWords()
  const [shown, setShown] = useState<Side>('left')
  const ends = props.ends ?? BOTH_SQUARE
  const run: Run = { slope: pitchAngle(pitchRise), lowEnd: ends.lowEnd }
  const lay = layOf(ends)
  const write = (next: DraftEnds) => onEnds(endsToKeep(next))

  return (
    <div className="flex flex-col gap-6">
      <p className="text-small text-scribe">{t(`laidOut.${upSide(profile)}`)}</p>
      <RunFields
        run={run}
        disabled={disabled}
        onChange={(lowEnd) => write(withLowEnd(ends, lowEnd, run.slope, profile))}
      />
      {lay !== undefined && (
        <LayFields
          profile={profile}
          stock={stock}
          lay={lay}
          run={run}
          disabled={disabled}
          onChange={(next) => write(withLay(ends, next))}
        />
      )}
      <Tabs
        label={t('title')}
        selected={shown}
        onSelect={(id) => setShown(id === 'right' ? 'right' : 'left')}
        items={SIDES.map((side) => ({
          id: side,
          label: t(`tab.${side}`),
          content: <OneEnd {...props} ends={ends} side={side} run={run} onWrite={write} />,
        }))}
      />
      {check && check.problems.length > 0 && (
        <ul role="alert" className="border-l-4 border-chalk bg-chalk/10 px-4 py-3">
          {check.problems.map((problem, index) => (
            <li key={index}>{words.problem(problem)}</li>
          ))}
        </ul>
      )}
      <HandsFields quantity={quantity} hands={hands} disabled={disabled} onChange={onHands} />
    </div>
  )
}

/** Which face is up when the strip lies left side up. */
const upSide = ({ colorSide }: Profile): 'color' | 'bare' | 'left' =>
  colorSide === 'left' ? 'color' : colorSide === 'right' ? 'bare' : 'left'

interface EndProps extends Omit<Props, 'ends'> {
  readonly ends: DraftEnds
  readonly side: Side
  readonly run: Run
  readonly onWrite: (ends: DraftEnds) => void
}

function OneEnd({ ends, side, run, onWrite, ...props }: EndProps) {
  const { lineKey, profile, stock, strip, pieceLength, hands, check, lines, disabled } = props
  const { t } = useTranslation('ends')
  const lay = layOf(ends)
  const outer = outerEdge(profile, lay ?? usualLay(profile, run))
  const dressed = ends[side]
  const mirrored = copiedMirrored(ends, side)

  function change(end: DraftEnd) {
    const other = ends[otherSide(side)]
    // The piece lies one way, whichever end was dressed first.
    onWrite(
      withEnd(
        ends,
        side,
        end.kind === 'miter' && other.kind === 'miter' ? { ...end, lay: other.lay } : end,
      ),
    )
  }

  return (
    <div className="grid gap-x-10 gap-y-6 lg:grid-cols-[minmax(0,24rem)_minmax(0,1fr)]">
      <EndForm
        end={dressed}
        side={side}
        profile={profile}
        run={run}
        lay={lay ?? usualLay(profile, run)}
        outer={outer}
        disabled={disabled}
        onChange={change}
      />
      <div className="flex min-w-0 flex-col gap-4">
        <EndPictures
          lineKey={lineKey}
          mark={props.mark}
          profile={profile}
          stock={stock}
          strip={strip}
          pieceLength={pieceLength}
          check={check}
          side={side}
          hands={hands}
          lines={lines}
          disabled={disabled}
        />
        {!disabled && endsToKeep({ ...BOTH_SQUARE, [side]: dressed }) && (
          <Button
            className="self-start"
            disabled={mirrored === null}
            onClick={() => mirrored && onWrite(mirrored)}
          >
            {t(`copy.${side}`)}
          </Button>
        )}
      </div>
    </div>
  )
}
