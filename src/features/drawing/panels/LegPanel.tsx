import type { Dispatch, ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import type { Profile } from '#shared/profile/profile.schema'
import { LengthKeypad } from '@/components/keypad/LengthKeypad'
import { usePerson } from '@/features/people/person-context'
import type { Board, BoardEvent } from '../model/board'
import { editProfile } from '../model/board-document'

interface Props {
  readonly board: Board
  readonly dispatch: Dispatch<BoardEvent>
  readonly profile: Profile
  readonly leg: number
  readonly name: string
  readonly problem?: string
  readonly onDone: () => void
  readonly children: ReactNode
}

/** The outside measure of a leg, on the shop keypad. */
export function LegPanel({
  board,
  dispatch,
  profile,
  leg,
  name,
  problem,
  onDone,
  children,
}: Props) {
  const { t } = useTranslation('drawing')
  const { units } = usePerson()
  return (
    <LengthKeypad
      key={`leg ${leg}`}
      label={name}
      value={profile.legs[leg - 1] ?? null}
      units={units}
      unit={t('part.outside')}
      problem={problem}
      onChange={(length) => {
        if (length === null) return
        const document = editProfile(board.history.present, { kind: 'setLeg', leg, length })
        dispatch({ type: 'change', document, typing: `leg ${leg}` })
      }}
      onDone={onDone}
    >
      {children}
    </LengthKeypad>
  )
}
