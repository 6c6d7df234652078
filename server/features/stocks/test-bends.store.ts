import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { findRow } from '#server/db/read-rows'
import { CALIBRATIONS, type CalibrationInsert } from '#server/db/tables/calibrations'
import { STOCKS } from '#server/db/tables/stocks'
import { TEST_BENDS, type TestBendInsert } from '#server/db/tables/test-bends'

export const createTestBendsStore = (db: Db) => ({
  /** Locks the stock until the transaction ends, so that calibrations come one after another. */
  async lockStock(id: string): Promise<boolean> {
    return (await db(STOCKS).where({ id }).forNoKeyUpdate().first('id')) !== undefined
  },

  async addTestBend(bend: TestBendInsert): Promise<void> {
    await db(TEST_BENDS).insert(bend)
  },

  /** False where the stock has no such bend, or it was withdrawn already. */
  async withdrawTestBend(
    of: { readonly stockId: string; readonly bendId: string },
    withdrawal: { readonly personId: string; readonly reason: string; readonly at?: Date },
  ): Promise<boolean> {
    const { personId, reason, at } = withdrawal
    const withdrawn = await findRow(
      db,
      z.object({ id: z.uuid() }),
      `update test_bends set withdrawn_by = :personId, withdrawn_reason = :reason,
         withdrawn_at = coalesce(cast(:at as timestamptz), clock_timestamp())
       where id = :bendId and stock_id = :stockId and withdrawn_at is null
       returning id`,
      { ...of, personId, reason, at: at ?? null },
    )
    return withdrawn !== undefined
  },

  async addCalibration(calibration: CalibrationInsert): Promise<void> {
    await db(CALIBRATIONS).insert(calibration)
  },
})

export type TestBendsStore = ReturnType<typeof createTestBendsStore>
