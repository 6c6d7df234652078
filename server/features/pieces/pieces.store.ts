import type { Db } from '#server/db/knex'
import { PIECE_EVENTS, PIECES, type PieceInsert, type PieceRow } from '#server/db/tables/pieces'
import type { Station } from '#shared/pieces/piece-state'

interface Making {
  readonly person: { readonly id: string }
  readonly station: Station
  readonly at?: Date
}

/** Pieces come into being queued, each with the event that says so. */
export async function createPieces(
  db: Db,
  pieces: readonly PieceInsert[],
  { person, station, at }: Making,
): Promise<PieceRow[]> {
  const made: PieceRow[] = await db(PIECES)
    .insert([...pieces])
    .returning('*')
  await db(PIECE_EVENTS).insert(
    made.map((piece) => ({
      piece_id: piece.id,
      from_state: null,
      to_state: piece.state,
      person_id: person.id,
      station,
      ...(at && { at }),
    })),
  )
  return made
}
