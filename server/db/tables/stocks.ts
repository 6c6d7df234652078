import type { Metal } from '#shared/stock/stock.schema'

export const STOCKS = 'stocks'

export interface StockRow {
  id: string
  position: number
  metal: Metal
  thickness_name: string
  color_name: string
  color_hex: string
  painted: boolean
  thickness: number
  inside_radius: number
  k_factor: number
  density: number
  springback_per_90: number
  widest_strip: number
  longest_piece: number
}
export type StockInsert = Omit<StockRow, 'id'> & Partial<Pick<StockRow, 'id'>>
export type StockUpdate = Partial<Omit<StockRow, 'id'>>
