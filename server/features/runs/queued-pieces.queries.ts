import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { PIECES } from '#server/db/tables/pieces'
import { readRows } from '#server/db/read-rows'

const idSchema = z.object({ id: z.uuid() })

/**
 * The queued pieces of a run, locked, in the order in which they are bent: by line, then by number.
 * Locking comes first, in the order of their ids as everywhere; pieces that were bent while it
 * waited drop out.
 */
export async function findLockedQueued(
  db: Db,
  runId: string,
  length: number | undefined,
): Promise<{ id: string }[]> {
  const locked = await db(PIECES)
    .where({ run_id: runId, state: 'queued' })
    .orderBy('id')
    .forUpdate()
    .select('id')
  return readRows(
    db,
    idSchema,
    `select p.id from pieces p join order_lines l on l.id = p.line_id
     where p.id = any(:ids)
       and (cast(:length as double precision) is null or l.length = cast(:length as double precision))
     order by l.position, p.sequence`,
    { ids: locked.map((piece) => piece.id), length: length ?? null },
  )
}
