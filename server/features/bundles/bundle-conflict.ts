import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { findRow } from '#server/db/read-rows'
import { momentWords } from '#server/features/pieces/move-words'
import { wrongState, type ProblemError } from '#server/http/errors'
import type { PieceConflict } from '#shared/pieces/pieces.contract'

const goneSchema = z.object({
  code: z.string(),
  at: z.date(),
  by: z.string(),
  receivedBy: z.string(),
})

/** The problem to throw when a bundle has left: who handed it over, to whom and when. */
export async function goneConflict(db: Db, bundleId: string): Promise<ProblemError> {
  const gone = await findRow(
    db,
    goneSchema,
    `select b.code, h.at, person.name as by, h.received_by as "receivedBy"
     from bundles b
     join hand_offs h on h.id = b.hand_off_id
     join people person on person.id = h.handed_by
     where b.id = :bundleId`,
    { bundleId },
  )
  if (!gone) throw new Error(`Bundle ${bundleId} was not handed over.`)
  const current: PieceConflict = {
    code: gone.code,
    state: 'pickedUp',
    at: gone.at.toISOString(),
    by: gone.by,
    station: 'counter',
  }
  return wrongState(
    `Bundle ${gone.code} was already handed over to ${gone.receivedBy} by ${gone.by} at ${momentWords(gone.at)}.`,
    current,
  )
}
