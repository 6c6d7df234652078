import type { BoardAction, BoardActionId, Shortcut } from './board-action'
import { deletePartAction, drawAction, splitLegAction } from './corner.actions'
import { addKickAction, hemAAction, hemBAction } from './edge.actions'
import { flipColorAction, mirrorAction, reverseAction } from './face.actions'
import { clearAction, redoAction, undoAction } from './history.actions'

export const ACTIONS: Record<BoardActionId, BoardAction> = {
  undo: undoAction,
  redo: redoAction,
  draw: drawAction,
  deletePart: deletePartAction,
  splitLeg: splitLegAction,
  addKick: addKickAction,
  hemA: hemAAction,
  hemB: hemBAction,
  flipColor: flipColorAction,
  mirror: mirrorAction,
  reverse: reverseAction,
  clear: clearAction,
}

interface PressedKey {
  readonly key: string
  readonly ctrlKey: boolean
  readonly metaKey: boolean
  readonly shiftKey: boolean
}

const isPressed = (shortcut: Shortcut, pressed: PressedKey): boolean =>
  pressed.key.toLowerCase() === shortcut.key.toLowerCase() &&
  (pressed.ctrlKey || pressed.metaKey) === (shortcut.mod ?? false) &&
  pressed.shiftKey === (shortcut.shift ?? false)

export const actionOfKey = (pressed: PressedKey): BoardAction | undefined =>
  Object.values(ACTIONS).find((action) =>
    action.shortcuts.some((shortcut) => isPressed(shortcut, pressed)),
  )
