import { z } from 'zod'
import { companyScope } from '#server/db/company-scope'
import type { Db } from '#server/db/knex'
import { findRow, readRows } from '#server/db/read-rows'
import { notFound } from '#server/http/errors'
import type { SignedIn } from '#server/http/signed-in'
import { lineLaySchema, pieceLay } from './piece-lay'
import {
  pieceEventSchema,
  pieceSchema,
  type Piece,
  type PieceEvent,
} from '#shared/pieces/pieces.contract'

/** The contract's piece without its events, which are read beside it; its hand follows from the line. */
const pieceRowSchema = lineLaySchema.extend({
  id: z.uuid(),
  ...pieceSchema.omit({ events: true, hand: true, lowEnd: true }).shape,
})

/** The database gives a Date where the contract has text. */
const eventRowSchema = z.object({ ...pieceEventSchema.shape, pieceId: z.uuid(), at: z.date() })

type Viewer = Pick<SignedIn, 'id' | 'role' | 'companyId'>

/**
 * Pieces with their histories, in the order of the codes. Throws `not-found` when one is unknown
 * or not the viewer's to see.
 */
export async function getPieces(
  db: Db,
  codes: readonly string[],
  viewer: Viewer,
): Promise<Piece[]> {
  const rows = await readRows(
    db,
    pieceRowSchema,
    `select p.id, p.code, p.state, p.sequence, l.quantity, l.mark, l.name, l.length,
       l.ends, l.hands,
       o.id as "orderId", o.number as "orderNumber", c.name as company, j.name as job,
       r.id as "runId", r.number as "runNumber", b.code as "bundleCode",
       case when p.state = 'bundled' then b.rack_place end as "rackPlace",
       origin.code as "remakeOf", remake.code as "remadeAs"
     from pieces p
     join order_lines l on l.id = p.line_id
     join orders o on o.id = p.order_id
     join companies c on c.id = o.company_id
     join jobs j on j.id = o.job_id
     join runs r on r.id = p.run_id
     left join bundles b on b.id = p.bundle_id
     left join pieces origin on origin.id = p.remake_of
     left join pieces remake on remake.remake_of = p.id
     where p.code = any(:codes)
       and (cast(:companyId as uuid) is null or o.company_id = cast(:companyId as uuid))`,
    { codes, companyId: companyScope(viewer) },
  )
  const events = await readEvents(
    db,
    rows.map((row) => row.id),
  )
  return codes.map((code) => {
    const row = rows.find((candidate) => candidate.code === code)
    if (!row) throw notFound('piece')
    const { id, ends, hands, ...piece } = row
    const lay = pieceLay({ ends, hands }, piece.sequence)
    return { ...piece, ...lay, events: events.get(id) ?? [] }
  })
}

export async function getPiece(db: Db, code: string, viewer: Viewer): Promise<Piece> {
  const [piece] = await getPieces(db, [code], viewer)
  if (!piece) throw notFound('piece')
  return piece
}

async function readEvents(db: Db, pieceIds: readonly string[]): Promise<Map<string, PieceEvent[]>> {
  const rows = await readRows(
    db,
    eventRowSchema,
    `select e.piece_id as "pieceId", e.id, e.from_state as "from", e.to_state as "to", e.at,
       person.name as by, e.station, e.reason, e.undoes
     from piece_events e
     join people person on person.id = e.person_id
     where e.piece_id = any(:pieceIds)
     order by e.id`,
    { pieceIds },
  )
  const histories = new Map<string, PieceEvent[]>()
  for (const { pieceId, at, ...event } of rows) {
    const history = histories.get(pieceId) ?? []
    history.push({ ...event, at: at.toISOString() })
    histories.set(pieceId, history)
  }
  return histories
}

const placeSchema = z.object({
  id: z.uuid(),
  runId: z.uuid(),
  runNumber: z.int(),
  runName: z.string(),
})

/** A piece and the run it belongs to; throws `not-found`. */
export async function getPiecePlace(db: Db, code: string): Promise<z.infer<typeof placeSchema>> {
  const place = await findRow(
    db,
    placeSchema,
    `select p.id, r.id as "runId", r.number as "runNumber", r.name as "runName"
     from pieces p join runs r on r.id = p.run_id where p.code = :code`,
    { code },
  )
  if (!place) throw notFound('piece')
  return place
}
