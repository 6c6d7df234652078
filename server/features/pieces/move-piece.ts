import type { Db } from '#server/db/knex'
import {
  PIECE_EVENTS,
  PIECES,
  type PieceEventInsert,
  type PieceRow,
} from '#server/db/tables/pieces'
import type { PieceState, Station } from '#shared/pieces/piece-state'
import { announceMoves } from './announce-moves'
import { pieceConflict } from './piece-conflict'

export interface PieceMove {
  readonly pieceIds: readonly string[]
  readonly from: PieceState
  readonly to: PieceState
  readonly person: { readonly id: string }
  readonly station: Station
  /** Needed by back moves and ends. */
  readonly reason?: string
  /** The bundle that bent pieces go into; on the other moves a piece stays in its bundle or leaves it. */
  readonly bundleId?: string
  /** For an undo: piece id -> the event it takes back. */
  readonly undoes?: ReadonlyMap<string, number>
  /** When it happened; absent, the database's clock says. */
  readonly at?: Date
}

export interface MovedPiece {
  readonly id: string
  readonly code: string
  readonly orderId: string
  readonly runId: string
  readonly eventId: number
}

/**
 * The one way in which a piece changes its state: a conditional update and one event a piece, all
 * or none. Answers in the order of the ids given. Throws `wrong-state` with the first piece that
 * was not in `from`, who moved it and when.
 */
export async function movePieces(db: Db, move: PieceMove): Promise<MovedPiece[]> {
  if (entersBundle(move) !== (move.bundleId !== undefined)) {
    throw new Error(`A move from ${move.from} to ${move.to} has the wrong word on a bundle.`)
  }
  const locked = await lockPieces(db, move.pieceIds)
  const before = move.pieceIds.map((id) => getLocked(locked, id))
  const other = before.find((piece) => piece.state !== move.from)
  if (other) throw await pieceConflict(db, other.id, move)

  const changed = await db(PIECES)
    .whereIn('id', [...move.pieceIds])
    .where('state', move.from)
    .update({ state: move.to, ...(!bundleStays(move) && { bundle_id: move.bundleId ?? null }) })
  if (changed !== before.length) {
    throw new Error(`${before.length} pieces were locked but ${changed} moved.`)
  }

  const moved = await insertEvents(db, before, move)
  await announceMoves(db, moved, move)
  return moved
}

/**
 * Locks pieces until the transaction ends, in the order of their ids so that two requests never
 * wait for each other, and shows them as they are then.
 */
export async function lockPieces(
  db: Db,
  ids: readonly string[],
): Promise<ReadonlyMap<string, PieceRow>> {
  const rows: PieceRow[] = await db(PIECES)
    .whereIn('id', [...ids])
    .orderBy('id')
    .forUpdate()
    .select('*')
  return new Map(rows.map((row) => [row.id, row]))
}

const entersBundle = ({ from, to }: PieceMove): boolean => from === 'bent' && to === 'bundled'

const bundleStays = ({ from, to }: PieceMove): boolean =>
  (from === 'bundled' && to === 'pickedUp') || (from === 'pickedUp' && to === 'bundled')

/** Events name the bundle a piece enters, or the one it was in. */
async function insertEvents(
  db: Db,
  pieces: readonly PieceRow[],
  move: PieceMove,
): Promise<MovedPiece[]> {
  const events = pieces.map((piece): PieceEventInsert => ({
    piece_id: piece.id,
    from_state: move.from,
    to_state: move.to,
    person_id: move.person.id,
    station: move.station,
    reason: move.reason ?? null,
    undoes: move.undoes?.get(piece.id) ?? null,
    bundle_id: move.bundleId ?? piece.bundle_id,
    ...(move.at && { at: move.at }),
  }))
  const made = await db(PIECE_EVENTS).insert(events).returning(['id', 'piece_id'])
  const eventIds = new Map(made.map((event) => [event.piece_id, event.id]))
  return pieces.map((piece) => {
    const eventId = eventIds.get(piece.id)
    if (eventId === undefined) throw new Error(`No event was made for piece ${piece.code}.`)
    return { id: piece.id, code: piece.code, orderId: piece.order_id, runId: piece.run_id, eventId }
  })
}

function getLocked(locked: ReadonlyMap<string, PieceRow>, id: string): PieceRow {
  const piece = locked.get(id)
  if (!piece) throw new Error(`There is no piece ${id}.`)
  return piece
}
