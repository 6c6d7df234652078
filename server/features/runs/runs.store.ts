import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { findRow } from '#server/db/read-rows'
import { RUNS } from '#server/db/tables/runs'

/** Takes the run if nobody holds it; false otherwise. Without `at` the database says when. */
export async function claimRun(
  db: Db,
  id: string,
  personId: string,
  at: Date | undefined,
): Promise<boolean> {
  const claimed = await findRow(
    db,
    z.object({ id: z.uuid() }),
    `update runs
     set claimed_by = :personId, claimed_at = coalesce(cast(:at as timestamptz), clock_timestamp())
     where id = :id and claimed_by is null
     returning id`,
    { id, personId, at: at ?? null },
  )
  return claimed !== undefined
}

export async function releaseClaim(db: Db, id: string): Promise<void> {
  await db(RUNS).where({ id }).update({ claimed_by: null, claimed_at: null })
}

/**
 * Locks the run until the transaction ends, so that claims and bending by count come one after
 * another; what points to the run (new pieces) need not wait.
 */
export async function findLockedRun(
  db: Db,
  id: string,
): Promise<{ number: number; claimed_by: string | null } | undefined> {
  return db(RUNS).where({ id }).forNoKeyUpdate().first('number', 'claimed_by')
}
