import type { KSource, Metal } from '#shared/stock/stock.schema'

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
  k_source: KSource
  /** How many thicknesses round which the paint bends unbroken; null unknown. */
  paint_t_bend: number | null
  alloy: string | null
}
export type StockInsert = Omit<StockRow, 'id' | 'paint_t_bend' | 'alloy'> &
  Partial<Pick<StockRow, 'id' | 'paint_t_bend' | 'alloy'>>
export type StockUpdate = Partial<Omit<StockRow, 'id'>>
