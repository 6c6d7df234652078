import type { Dispatch, ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import type { Hem, Profile } from '#shared/profile/profile.schema'
import { Choice } from '@/components/Choice'
import { DimensionField } from '@/components/keypad/DimensionField'
import { LengthKeypad } from '@/components/keypad/LengthKeypad'
import { usePerson } from '@/features/people/person-context'
import type { Board, BoardEvent } from '../model/board'
import { editProfile, type Edge } from '../model/board-document'
import { SideChoice } from './SideChoice'

interface Props {
  readonly board: Board
  readonly dispatch: Dispatch<BoardEvent>
  readonly profile: Profile
  readonly hem: Hem
  readonly edge: Edge
  readonly name: string
  readonly problem?: string
  readonly onDone: () => void
  readonly children: ReactNode
}

/** The gap a hem is opened to at first, inches: common practice, no source. */
const USUAL_GAP = 1 / 8

/** Length, kind, gap and side of a hem. */
export function HemPanel({
  board,
  dispatch,
  profile,
  hem,
  edge,
  name,
  problem,
  onDone,
  children,
}: Props) {
  const { t } = useTranslation('drawing')
  const { units } = usePerson()

  const setHem = (next: Hem, typing?: string) =>
    dispatch({
      type: 'change',
      document: editProfile(board.history.present, { kind: 'setHem', edge, hem: next }),
      ...(typing === undefined ? {} : { typing }),
    })

  function setStyle(style: Hem['style']) {
    const { length, turn } = hem
    setHem(style === 'open' ? { style, length, turn, gap: USUAL_GAP } : { style, length, turn })
  }

  return (
    <div className="flex flex-col gap-3">
      <LengthKeypad
        key={`hem ${edge}`}
        label={name}
        value={hem.length}
        units={units}
        problem={problem}
        onChange={(length) => length !== null && setHem({ ...hem, length }, `hem ${edge}`)}
        onDone={onDone}
      />
      <div className="flex flex-wrap items-end gap-3">
        <Choice
          legend={t('part.style')}
          value={hem.style}
          options={[
            { value: 'closed', label: t('part.closed') },
            { value: 'open', label: t('part.open') },
          ]}
          onChange={setStyle}
        />
        {hem.style === 'open' && (
          <DimensionField
            label={t('part.gap')}
            value={hem.gap}
            units={units}
            className="w-40"
            onChange={(gap) => gap !== null && setHem({ ...hem, gap }, `gap ${edge}`)}
          />
        )}
        <SideChoice
          legend={t('part.lipSide')}
          colorSide={profile.colorSide}
          value={hem.turn}
          onChange={(turn) => setHem({ ...hem, turn })}
        />
      </div>
      {children}
    </div>
  )
}
