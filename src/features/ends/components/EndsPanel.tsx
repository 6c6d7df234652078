import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { Side } from '#shared/ends/end.schema'
import type { Profile } from '#shared/profile/profile.schema'
import type { Stock } from '#shared/stock/stock.schema'
import type { Strip } from '#shared/strip/strip.schema'
import { pitchAngle } from '#shared/units/angle'
import type { Inches } from '#shared/units/brands'
import { Tabs } from '@/components/Tabs'
import type { EndsCheck } from '../model/check-ends'
import type { Run } from '../model/corner-presets'
import type { DraftEnds, DraftHands } from '../model/draft-end'
import { BOTH_SQUARE, endsToKeep, layOf, withLay } from '../model/end-edits'
import type { Handed } from '../model/hand-edits'
import type { EndedLine } from '../model/neighbors'
import { withLowEnd } from '../model/run-edits'
import { useEndWords } from '../useEndWords'
import { HandsFields } from './HandsFields'
import { LayFields } from './LayFields'
import { OneEnd } from './OneEnd'
import { RunFields } from './RunFields'

export interface EndsPanelProps {
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
export function EndsPanel(props: EndsPanelProps) {
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
