import { z } from 'zod'
import { companyScope } from '#server/db/company-scope'
import type { Db } from '#server/db/knex'
import { findRow, readRows } from '#server/db/read-rows'
import { notFound } from '#server/http/errors'
import type { SignedIn } from '#server/http/signed-in'
import { pieceStateSchema } from '#shared/pieces/piece-state'

const undoableSchema = z.object({
  id: z.int(),
  pieceId: z.uuid(),
  code: z.string(),
  from: pieceStateSchema.nullable(),
  to: pieceStateSchema,
  undoes: z.int().nullable(),
  /** The bundle the piece entered, left or went away with. */
  bundleId: z.uuid().nullable(),
})

export type UndoableEvent = z.infer<typeof undoableSchema>

/** Events in the order of their ids; throws `not-found` when one is unknown or not the person's to see. */
export async function getUndoable(
  db: Db,
  ids: readonly number[],
  person: SignedIn,
): Promise<UndoableEvent[]> {
  const events = await readRows(
    db,
    undoableSchema,
    `select e.id, e.piece_id as "pieceId", p.code, e.from_state as "from", e.to_state as "to",
       e.undoes, e.bundle_id as "bundleId"
     from piece_events e
     join pieces p on p.id = e.piece_id
     join orders o on o.id = p.order_id
     where e.id = any(:ids)
       and (cast(:companyId as uuid) is null or o.company_id = cast(:companyId as uuid))
     order by e.id`,
    { ids, companyId: companyScope(person) },
  )
  if (events.length !== new Set(ids).size) throw notFound('event')
  return events
}

/** The piece of the first of these events that was followed by another one. */
export async function findMovedOn(
  db: Db,
  eventIds: readonly number[],
): Promise<string | undefined> {
  const later = await findRow(
    db,
    z.object({ pieceId: z.uuid() }),
    `select e.piece_id as "pieceId" from piece_events e
     where e.id = any(:eventIds)
       and exists (select 1 from piece_events l where l.piece_id = e.piece_id and l.id > e.id)
     order by e.id limit 1`,
    { eventIds },
  )
  return later?.pieceId
}

/** The code of the first of these bundles that holds a piece which is not among the given ones. */
export async function findPartOfBundle(
  db: Db,
  bundleIds: readonly string[],
  pieceIds: readonly string[],
): Promise<string | undefined> {
  const part = await findRow(
    db,
    z.object({ code: z.string() }),
    `select b.code from pieces p join bundles b on b.id = p.bundle_id
     where b.id = any(:bundleIds) and p.id <> all(:pieceIds)
     order by b.code limit 1`,
    { bundleIds, pieceIds },
  )
  return part?.code
}
