import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { readRows } from '#server/db/read-rows'
import { testBendSchema, type TestBendRecord } from '#shared/stock/stock.contract'

const rowSchema = z.object({
  ...testBendSchema.omit({ withdrawn: true }).shape,
  at: z.date(),
  withdrawnBy: z.string().nullable(),
  withdrawnAt: z.date().nullable(),
  withdrawnReason: z.string().nullable(),
})

/** The test bends of a stock, newest first, those withdrawn among them. */
export async function listTestBends(db: Db, stockId: string): Promise<TestBendRecord[]> {
  const rows = await readRows(
    db,
    rowSchema,
    `select t.id, t.brake_id as "brakeId", b.name as "brakeName", t.strip_width as "stripWidth",
       t.leg_a as "legA", t.leg_b as "legB", t.turn, t.thickness, t.inside_radius as "insideRadius",
       t.note, person.name as by, t.at, withdrawer.name as "withdrawnBy",
       t.withdrawn_at as "withdrawnAt", t.withdrawn_reason as "withdrawnReason"
     from test_bends t
     join brakes b on b.id = t.brake_id
     join people person on person.id = t.person_id
     left join people withdrawer on withdrawer.id = t.withdrawn_by
     where t.stock_id = :stockId
     order by t.at desc, t.id`,
    { stockId },
  )
  return rows.map(toTestBend)
}

const toTestBend = ({
  at,
  withdrawnBy,
  withdrawnAt,
  withdrawnReason,
  ...bend
}: z.infer<typeof rowSchema>): TestBendRecord => ({
  ...bend,
  at: at.toISOString(),
  withdrawn:
    withdrawnBy === null || withdrawnAt === null || withdrawnReason === null
      ? null
      : { by: withdrawnBy, at: withdrawnAt.toISOString(), reason: withdrawnReason },
})
