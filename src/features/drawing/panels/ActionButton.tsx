import type { Dispatch } from 'react'
import { useTranslation } from 'react-i18next'
import { ACTIONS } from '../actions/all-actions'
import type { BoardActionId } from '../actions/board-action'
import type { Board, BoardEvent } from '../model/board'
import { ActionIcon } from './ActionIcon'

interface Props {
  readonly action: BoardActionId
  readonly board: Board
  readonly dispatch: Dispatch<BoardEvent>
  /** Shows the words beside the icon. */
  readonly wide?: boolean
}

/** A button for an action of the board: its words, its icon, on or off, possible or not. */
export function ActionButton({ action: id, board, dispatch, wide = false }: Props) {
  const { t } = useTranslation('drawing')
  const action = ACTIONS[id]
  const event = action.perform(board)
  const label = t(`action.${id}`)
  const isOn = action.isOn?.(board)
  return (
    <button
      type="button"
      disabled={event === null}
      aria-label={label}
      aria-pressed={isOn}
      title={label}
      onClick={() => event && dispatch(event)}
      className={`inline-flex min-h-target shrink-0 items-center justify-center gap-2 rounded-control text-ink hover:bg-ink/5 disabled:text-edge aria-pressed:bg-dye/15 aria-pressed:text-dye ${wide ? 'border border-edge px-3' : 'min-w-target'}`}
    >
      <ActionIcon action={id} />
      {wide && <span aria-hidden="true">{label}</span>}
    </button>
  )
}
