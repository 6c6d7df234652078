import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { readRows } from '#server/db/read-rows'
import { STOCKS, type StockRow } from '#server/db/tables/stocks'
import { calibrationSchema, type Calibration, type Stock } from '#shared/stock/stock.schema'

const toStock = (row: StockRow, calibrations: Calibration[]): Stock => ({
  id: row.id,
  thicknessName: row.thickness_name,
  colorName: row.color_name,
  colorHex: row.color_hex,
  painted: row.painted,
  widestStrip: row.widest_strip,
  longestPiece: row.longest_piece,
  sheet: {
    metal: row.metal,
    thickness: row.thickness,
    insideRadius: row.inside_radius,
    kFactor: row.k_factor,
    density: row.density,
    springbackPer90: row.springback_per_90,
  },
  kSource: row.k_source,
  paintTBend: row.paint_t_bend,
  alloy: row.alloy,
  calibrations,
})

/** The database gives a Date where the contract has text. */
const calibrationRowSchema = z.object({
  ...calibrationSchema.shape,
  stockId: z.uuid(),
  at: z.date(),
})

export const createStocksQueries = (db: Db) => {
  /** What is in use: of each brake the newest, unless it went back to the stock's own K. */
  async function mapCalibrations(stockIds: readonly string[]): Promise<Map<string, Calibration[]>> {
    const rows = await readRows(
      db,
      calibrationRowSchema,
      `select newest.stock_id as "stockId", newest.brake_id as "brakeId", b.name as "brakeName",
         newest.k_factor as "kFactor", newest.inside_radius as "insideRadius", newest.bends,
         person.name as by, newest.at
       from (
         select distinct on (stock_id, brake_id) * from calibrations
         where stock_id = any(:stockIds) order by stock_id, brake_id, id desc
       ) newest
       join brakes b on b.id = newest.brake_id
       join people person on person.id = newest.person_id
       where newest.k_factor is not null
       order by b.position, b.id`,
      { stockIds },
    )
    const byStock = new Map<string, Calibration[]>()
    for (const { stockId, at, ...calibration } of rows) {
      const calibrations = byStock.get(stockId) ?? []
      calibrations.push({ ...calibration, at: at.toISOString() })
      byStock.set(stockId, calibrations)
    }
    return byStock
  }

  async function toStocks(rows: readonly StockRow[]): Promise<Stock[]> {
    const calibrations = await mapCalibrations(rows.map(({ id }) => id))
    return rows.map((row) => toStock(row, calibrations.get(row.id) ?? []))
  }

  return {
    async listStocks(): Promise<Stock[]> {
      return toStocks(await db(STOCKS).orderBy([{ column: 'position' }, { column: 'id' }]))
    },

    async findStock(id: string): Promise<Stock | undefined> {
      const [stock] = await toStocks(await db(STOCKS).where({ id }))
      return stock
    },

    /** Those of the given stocks that exist, by id. */
    async mapStocks(ids: readonly string[]): Promise<Map<string, Stock>> {
      if (ids.length === 0) return new Map()
      const stocks = await toStocks(await db(STOCKS).whereIn('id', [...new Set(ids)]))
      return new Map(stocks.map((stock) => [stock.id, stock]))
    },
  }
}

export type StocksQueries = ReturnType<typeof createStocksQueries>
