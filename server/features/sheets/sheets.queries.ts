import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { findRow } from '#server/db/read-rows'
import { frozenLineSchema } from '#server/features/orders/frozen-line'
import { lineStrip } from '#server/features/orders/line-strip'
import type { SheetLine } from '#server/features/sheets/sheet-line'
import { createStocksQueries } from '#server/features/stocks/stocks.queries'
import { handsSchema, pieceEndsSchema } from '#shared/ends/end.schema'
import { profileSchema } from '#shared/profile/profile.schema'

const lineRowSchema = z.object({
  mark: z.string(),
  name: z.string(),
  profile: profileSchema,
  stockId: z.uuid(),
  quantity: z.int(),
  length: z.number(),
  ends: pieceEndsSchema.nullable(),
  hands: handsSchema.nullable(),
  statedGirth: z.number().nullable(),
  frozen: frozenLineSchema.nullable(),
  orderNumber: z.int(),
  poNumber: z.string(),
  company: z.string(),
  job: z.string(),
})

const LINE = `
  select l.mark, l.name, l.profile, l.stock_id as "stockId", l.quantity, l.length, l.ends, l.hands,
    l.stated_girth as "statedGirth", l.frozen,
    o.number as "orderNumber", o.po_number as "poNumber", c.name as company, j.name as job
  from order_lines l
  join orders o on o.id = l.order_id
  join companies c on c.id = o.company_id
  join jobs j on j.id = o.job_id
  where l.id = :lineId`

/** A line of an order; `scope` limits to one company. */
export async function findOrderLine(
  db: Db,
  { orderId, lineId }: { readonly orderId: string; readonly lineId: string },
  scope: string | null,
): Promise<SheetLine | undefined> {
  const row = await findRow(
    db,
    lineRowSchema,
    `${LINE} and o.id = :orderId
     and (cast(:scope as uuid) is null or o.company_id = cast(:scope as uuid))`,
    { orderId, lineId, scope },
  )
  return row && toSheetLine(db, row)
}

/** A line whose pieces a run bends. */
export async function findRunLine(
  db: Db,
  { runId, lineId }: { readonly runId: string; readonly lineId: string },
): Promise<SheetLine | undefined> {
  const row = await findRow(
    db,
    lineRowSchema,
    `${LINE} and exists (select 1 from pieces p where p.line_id = l.id and p.run_id = :runId)`,
    { runId, lineId },
  )
  return row && toSheetLine(db, row)
}

async function toSheetLine(
  db: Db,
  { frozen, stockId, ...written }: z.infer<typeof lineRowSchema>,
): Promise<SheetLine> {
  if (frozen) {
    const { stock, strip, pieceWeight, brakeName } = frozen
    return { ...written, stock, strip, pieceWeight, brakeName }
  }
  const stock = (await createStocksQueries(db).mapStocks([stockId])).get(stockId)
  if (!stock) throw new Error(`Stock ${stockId} of an order line is not there.`)
  return { ...written, stock, ...lineStrip(written, stock.sheet), brakeName: null }
}
