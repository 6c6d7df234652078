import pg from 'pg'
import type { Db } from '#server/db/knex'

/** The database chose this transaction to give way to another; run anew it may well succeed. */
const GIVE_WAY = new Set(['40001', '40P01'])

export const hadToGiveWay = (error: unknown): boolean =>
  error instanceof pg.DatabaseError && error.code !== undefined && GIVE_WAY.has(error.code)

/**
 * Runs `work` in one transaction and resolves after its commit. Work that had to give way (deadlock,
 * serialization failure) is run once more, so it must have no effects outside the database.
 */
export async function inTransaction<T>(db: Db, work: (db: Db) => Promise<T>): Promise<T> {
  try {
    return await db.transaction(work)
  } catch (error) {
    if (!hadToGiveWay(error)) throw error
    return db.transaction(work)
  }
}
