import type { Part } from '#shared/drawing/display-list'
import type { Board } from '../model/board'
import { cornersOf, editProfile, removeCorner, splitLeg } from '../model/board-document'
import type { BoardAction } from './board-action'

export const drawAction: BoardAction = {
  id: 'draw',
  shortcuts: [],
  perform: ({ tool }) => ({ type: 'tool', tool: tool === 'draw' ? 'select' : 'draw' }),
  isOn: ({ tool }) => tool === 'draw',
}

/** The corner that goes when a part is deleted; a leg goes with its end that is not shared. */
function cornerOf(board: Board, part: Part): number | null {
  const last = cornersOf(board.history.present).length - 1
  switch (part.kind) {
    case 'bend':
      return part.bend
    case 'edge':
      return part.edge === 'A' ? 0 : last
    case 'leg':
      return part.leg === 1 ? 0 : part.leg
    case 'hem':
      return null
  }
}

export const deletePartAction: BoardAction = {
  id: 'deletePart',
  shortcuts: [{ key: 'Delete' }, { key: 'Backspace' }],
  perform: (board) => {
    const { selection, history } = board
    if (selection === null) return null
    if (selection.kind === 'hem') {
      const edit = { kind: 'setHem', edge: selection.edge, hem: null } as const
      return {
        type: 'change',
        document: editProfile(history.present, edit),
        selection: { kind: 'edge', edge: selection.edge },
      }
    }
    const corner = cornerOf(board, selection)
    return corner === null
      ? null
      : { type: 'change', document: removeCorner(history.present, corner) }
  },
}

export const splitLegAction: BoardAction = {
  id: 'splitLeg',
  shortcuts: [],
  perform: ({ selection, history }) =>
    selection?.kind === 'leg'
      ? {
          type: 'change',
          document: splitLeg(history.present, selection.leg),
          selection: { kind: 'bend', bend: selection.leg },
        }
      : null,
}
