import { useEffect, useReducer } from 'react'
import { actionOfKey } from './actions/all-actions'
import { nextBoard, startBoard } from './model/board'
import type { BoardDocument } from './model/board-document'

/** Where typing goes into a field, the board's shortcuts keep out of the way. */
const isTyping = (target: EventTarget | null): boolean =>
  target instanceof HTMLElement &&
  target.closest('input, textarea, select, [contenteditable]') !== null

/** The board's state with its keyboard: shortcuts of the actions, Escape for a gesture begun. */
export function useBoard(initial: BoardDocument) {
  const [board, dispatch] = useReducer(nextBoard, initial, startBoard)

  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (event.key === 'Escape') return dispatch({ type: 'cancel' })
      if (isTyping(event.target)) return
      const done = actionOfKey(event)?.perform(board)
      if (!done) return
      event.preventDefault()
      dispatch(done)
    }
    window.addEventListener('keydown', onKey)
    return () => window.removeEventListener('keydown', onKey)
  }, [board])

  return { board, dispatch }
}
