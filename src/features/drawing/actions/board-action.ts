import type { Board, BoardEvent } from '../model/board'

/** A key of the keyboard with what is held down; `mod` is Ctrl, or Command on a Mac. */
export interface Shortcut {
  readonly key: string
  readonly mod?: boolean
  readonly shift?: boolean
}

/**
 * One thing a person can tell the board to do. Button, menu, shortcut and screen reader all read
 * this object: the words stand in the namespace `drawing` under `action.<id>`.
 */
export interface BoardAction {
  readonly id: BoardActionId
  readonly shortcuts: readonly Shortcut[]
  /** Null where it cannot be done now; otherwise the event that does it. */
  readonly perform: (board: Board) => BoardEvent | null
  /** For an action that is a switch: whether it is on. */
  readonly isOn?: (board: Board) => boolean
}

export type BoardActionId =
  | 'undo'
  | 'redo'
  | 'draw'
  | 'deletePart'
  | 'splitLeg'
  | 'addKick'
  | 'hemA'
  | 'hemB'
  | 'flipColor'
  | 'mirror'
  | 'reverse'
  | 'clear'
