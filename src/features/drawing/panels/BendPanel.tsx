import { useState, type Dispatch, type ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import type { Profile } from '#shared/profile/profile.schema'
import { includedAngle, turnOfIncluded } from '#shared/units/angle'
import { AngleKeypad } from '@/components/keypad/AngleKeypad'
import type { Board, BoardEvent } from '../model/board'
import { editProfile } from '../model/board-document'
import { FollowsSelect } from './FollowsSelect'
import { SideChoice } from './SideChoice'

interface Props {
  readonly board: Board
  readonly dispatch: Dispatch<BoardEvent>
  readonly profile: Profile
  readonly bend: number
  readonly name: string
  /** Rise in 12 of the job's roof; null without a job. */
  readonly pitchRise: number | null
  readonly problem?: string
  readonly onDone: () => void
  readonly children: ReactNode
}

/** The angle of a bend as the trade reads it, the side it folds to, and its tie to the roof. */
export function BendPanel({
  board,
  dispatch,
  profile,
  bend,
  name,
  pitchRise,
  problem,
  onDone,
  children,
}: Props) {
  const { t } = useTranslation('drawing')
  const [outOfRange, setOutOfRange] = useState(false)
  const turn = profile.bends[bend - 1]?.turn ?? 0

  const setTurn = (next: number) =>
    dispatch({
      type: 'change',
      document: editProfile(board.history.present, { kind: 'setTurn', bend, turn: next }),
      typing: `bend ${bend}`,
    })

  function enter(angle: number | null) {
    const isBend = angle !== null && angle > 0 && angle < 180
    setOutOfRange(angle !== null && !isBend)
    if (isBend) setTurn(turnOfIncluded(angle, turn))
  }

  return (
    <div className="flex flex-col gap-3">
      <AngleKeypad
        key={`bend ${bend}`}
        label={name}
        value={includedAngle(turn)}
        unit={t('part.included')}
        problem={outOfRange ? t('angleFault') : problem}
        onChange={enter}
        onDone={onDone}
      />
      <div className="flex flex-wrap items-end gap-3">
        <SideChoice
          legend={t('part.turnsTo')}
          colorSide={profile.colorSide}
          value={turn > 0 ? 1 : -1}
          onChange={(side) => setTurn(Math.abs(turn) * side)}
        />
        <FollowsSelect
          board={board}
          dispatch={dispatch}
          profile={profile}
          bend={bend}
          pitchRise={pitchRise}
        />
      </div>
      {children}
    </div>
  )
}
