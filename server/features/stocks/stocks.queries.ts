import type { Db } from '#server/db/knex'
import { STOCKS, type StockRow } from '#server/db/tables/stocks'
import type { Stock } from '#shared/stock/stock.schema'

export const toStock = (row: StockRow): Stock => ({
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
})

export const createStocksQueries = (db: Db) => ({
  async listStocks(): Promise<Stock[]> {
    const rows = await db(STOCKS).orderBy([{ column: 'position' }, { column: 'id' }])
    return rows.map(toStock)
  },

  async findStock(id: string): Promise<Stock | undefined> {
    const row = await db(STOCKS).where({ id }).first()
    return row && toStock(row)
  },

  /** Those of the given stocks that exist, by id. */
  async mapStocks(ids: readonly string[]): Promise<Map<string, Stock>> {
    if (ids.length === 0) return new Map()
    const rows = await db(STOCKS).whereIn('id', [...new Set(ids)])
    return new Map(rows.map((row) => [row.id, toStock(row)]))
  },
})

export type StocksQueries = ReturnType<typeof createStocksQueries>
