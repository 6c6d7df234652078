import { EMPTY_BOARD } from '../model/board-document'
import { canRedo, canUndo } from '../model/history'
import type { BoardAction } from './board-action'

export const undoAction: BoardAction = {
  id: 'undo',
  shortcuts: [{ key: 'z', mod: true }],
  perform: ({ history }) => (canUndo(history) ? { type: 'undo' } : null),
}

export const redoAction: BoardAction = {
  id: 'redo',
  shortcuts: [
    { key: 'z', mod: true, shift: true },
    { key: 'y', mod: true },
  ],
  perform: ({ history }) => (canRedo(history) ? { type: 'redo' } : null),
}

export const clearAction: BoardAction = {
  id: 'clear',
  shortcuts: [],
  perform: ({ history }) =>
    history.present.started ? { type: 'change', document: EMPTY_BOARD, selection: null } : null,
}
