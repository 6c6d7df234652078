import type { Db } from '#server/db/knex'
import { STOCK_ITEMS } from '#server/db/tables/stock-items'
import { STOCKS } from '#server/db/tables/stocks'
import { notFound } from '#server/http/errors'
import type { StockItem } from '#shared/stock/stock-items.contract'

/** Coils first, then sheets, then drops, of each the oldest first; throws `not-found`. */
export async function listStockItems(db: Db, stockId: string): Promise<StockItem[]> {
  if (!(await db(STOCKS).where({ id: stockId }).first('id'))) throw notFound('stock')
  const rows = await db(STOCK_ITEMS)
    .where({ stock_id: stockId })
    .orderByRaw(`array_position(array['coil', 'sheet', 'drop'], kind), received_on, lot, id`)
  return rows.map((row) => ({
    id: row.id,
    kind: row.kind,
    lot: row.lot,
    width: row.width,
    length: row.length,
    count: row.count,
    film: row.film,
    rackMark: row.rack_mark,
    receivedOn: row.received_on,
  }))
}
