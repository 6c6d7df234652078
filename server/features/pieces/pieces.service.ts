import type { Db } from '#server/db/knex'
import { PIECES, type PieceRow } from '#server/db/tables/pieces'
import { notFound, wrongState } from '#server/http/errors'
import type { SignedIn } from '#server/http/signed-in'
import type { ResolvedCode } from '#shared/pieces/lookup.contract'
import { findMove } from '#shared/pieces/piece-state'
import type { Moved, Piece } from '#shared/pieces/pieces.contract'
import { freshCode } from './fresh-code'
import { getResolvedCode } from './lookup.queries'
import { makingPorts, type MakingPorts } from './making-ports'
import { lockPieces, movePieces } from './move-piece'
import { pieceConflict } from './piece-conflict'
import { getPiece, getPiecePlace, getPieces } from './pieces.queries'
import { createPieces } from './pieces.store'
import { readAnyCode, readCode } from './read-code'
import { undoMoves } from './undo-moves'

export interface PiecesService {
  readonly getPiece: (code: string, person: SignedIn) => Promise<Piece>
  readonly resolveCode: (code: string) => Promise<ResolvedCode>
  readonly bendPiece: (code: string, runId: string | undefined, person: SignedIn) => Promise<Moved>
  readonly scrapPiece: (
    code: string,
    reason: string,
    person: SignedIn,
  ) => Promise<{ piece: Piece; remake: Piece }>
  readonly undoMoves: (
    wish: { readonly eventIds: readonly number[]; readonly reason: string },
    person: SignedIn,
  ) => Promise<{ pieces: Piece[] }>
}

export const createPiecesService = (db: Db, ports: MakingPorts = makingPorts): PiecesService => ({
  getPiece: (code, person) => getPiece(db, readCode(code, 'piece'), person),

  resolveCode: (code) => getResolvedCode(db, readAnyCode(code)),

  bendPiece: async (typed, runId, person) => {
    const code = readCode(typed, 'piece')
    const place = await getPiecePlace(db, code)
    if (runId !== undefined && runId !== place.runId) {
      throw wrongState(
        `${code} belongs to run ${place.runNumber} (${place.runName}), not to the run on this screen.`,
        { code, runId: place.runId, runNumber: place.runNumber },
      )
    }
    const [moved] = await movePieces(db, {
      pieceIds: [place.id],
      from: 'queued',
      to: 'bent',
      person,
      station: 'brake',
      at: ports.clock?.now(),
    })
    if (!moved) throw new Error(`Piece ${code} was bent without an event.`)
    return { piece: await getPiece(db, code, person), eventId: moved.eventId }
  },

  scrapPiece: async (typed, reason, person) => {
    const code = readCode(typed, 'piece')
    const piece = await lockPiece(db, code)
    if (!findMove(piece.state, 'scrapped')) {
      throw await pieceConflict(db, piece.id, { from: 'bent', to: 'scrapped' })
    }
    const station = piece.state === 'bundled' ? 'rack' : 'brake'
    const making = { person, station, at: ports.clock?.now() } as const
    // The remake takes the place of the spoiled piece in its line, which holds one living piece.
    await movePieces(db, {
      pieceIds: [piece.id],
      from: piece.state,
      to: 'scrapped',
      reason,
      ...making,
    })
    const remakeCode = await freshCode(db, 'piece', ports)
    await createPieces(db, [remakeOf(piece, remakeCode)], making)
    const [scrapped, remake] = await getPieces(db, [code, remakeCode], person)
    if (!scrapped || !remake) throw notFound('piece')
    return { piece: scrapped, remake }
  },

  undoMoves: async (wish, person) => {
    const codes = await undoMoves(db, wish, person, ports.clock?.now())
    return { pieces: await getPieces(db, codes, person) }
  },
})

async function lockPiece(db: Db, code: string): Promise<PieceRow> {
  const found = await db(PIECES).where({ code }).first('id')
  if (!found) throw notFound('piece')
  const piece = (await lockPieces(db, [found.id])).get(found.id)
  if (!piece) throw notFound('piece')
  return piece
}

const remakeOf = (piece: PieceRow, code: string) => ({
  code,
  order_id: piece.order_id,
  line_id: piece.line_id,
  run_id: piece.run_id,
  sequence: piece.sequence,
  remake_of: piece.id,
})
