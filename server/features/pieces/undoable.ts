import { notAllowed, wrongState, type ProblemError } from '#server/http/errors'
import type { SignedIn } from '#server/http/signed-in'
import { may, type Permission } from '#shared/access/permissions'
import type { PieceState, Station } from '#shared/pieces/piece-state'
import type { UndoableEvent } from './undo.queries'
import { DONE } from './move-words'

interface Undoing {
  /** What the move itself asks of a person. */
  readonly permission: Permission
  readonly station: Station
}

/** The moves that can be taken back by naming their event. */
const UNDOABLE: Partial<Record<`${PieceState} to ${PieceState}`, Undoing>> = {
  'queued to bent': { permission: 'pieces.bend', station: 'brake' },
  'bent to bundled': { permission: 'bundles.write', station: 'rack' },
  'bundled to bent': { permission: 'bundles.write', station: 'rack' },
  'bundled to pickedUp': { permission: 'bundles.handOff', station: 'counter' },
}

/** An event with what is needed to make its move backwards. */
export interface UndoneMove extends Undoing {
  readonly event: UndoableEvent
  readonly from: PieceState
  readonly to: PieceState
}

/** Throws `wrong-state` for an event that cannot be undone, `not-allowed` where the person may not. */
export function readUndone(event: UndoableEvent, person: SignedIn): UndoneMove {
  const undoing = event.from && UNDOABLE[`${event.from} to ${event.to}`]
  if (!event.from || !undoing || event.undoes !== null) throw cannotUndo(event)
  if (!may(person.role, undoing.permission)) {
    throw notAllowed('Your role may not make this move, so it may not undo it. Ask the office.')
  }
  return { ...undoing, event, from: event.to, to: event.from }
}

function cannotUndo({ code, from, to, undoes }: UndoableEvent): ProblemError {
  if (undoes !== null) {
    return wrongState(`This was an undo itself (${code}). Make the move again instead.`)
  }
  if (from === null) return wrongState(`${code} began with this. It can be scrapped, not undone.`)
  if (from === 'pickedUp') {
    return wrongState(`${code} was returned. Hand its bundle over again, so that it is signed for.`)
  }
  return wrongState(`${code} was ${DONE[to]}: that is final.`)
}
