import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { findRow } from '#server/db/read-rows'
import { wrongState, type ProblemError } from '#server/http/errors'
import { pieceStateSchema, stationSchema, type PieceState } from '#shared/pieces/piece-state'
import type { PieceConflict } from '#shared/pieces/pieces.contract'
import { DONE, IS, momentWords } from './move-words'

const lastMoveSchema = z.object({
  code: z.string(),
  state: pieceStateSchema,
  at: z.date(),
  by: z.string(),
  station: stationSchema,
})

/** The problem to throw when a piece is not in the state a move needs: what it is, who, when. */
export async function pieceConflict(
  db: Db,
  pieceId: string,
  wanted: { readonly from: PieceState; readonly to: PieceState },
): Promise<ProblemError> {
  const last = await getLastMove(db, pieceId)
  const when = momentWords(last.at)
  const detail =
    last.state === wanted.to
      ? `${last.code} was already ${DONE[last.state]} by ${last.by} at ${when}.`
      : `${last.code} was ${DONE[last.state]} by ${last.by} at ${when}. ` +
        `Only a piece that is ${IS[wanted.from]} can be ${DONE[wanted.to]}.`
  return wrongState(detail, conflictOf(last))
}

/** The problem to throw when something happened to a piece after what the request speaks of. */
export async function movedOnConflict(db: Db, pieceId: string): Promise<ProblemError> {
  const last = await getLastMove(db, pieceId)
  return wrongState(
    `More has happened to ${last.code} since: it was ${DONE[last.state]} by ${last.by} ` +
      `at ${momentWords(last.at)}. Only the last move of a piece can be undone.`,
    conflictOf(last),
  )
}

async function getLastMove(db: Db, pieceId: string) {
  const last = await findRow(
    db,
    lastMoveSchema,
    `select p.code, p.state, e.at, person.name as by, e.station
     from pieces p
     join piece_events e on e.piece_id = p.id
     join people person on person.id = e.person_id
     where p.id = :pieceId
     order by e.id desc limit 1`,
    { pieceId },
  )
  if (!last) throw new Error(`Piece ${pieceId} has no event.`)
  return last
}

const conflictOf = (last: z.infer<typeof lastMoveSchema>): PieceConflict => ({
  ...last,
  at: last.at.toISOString(),
})
