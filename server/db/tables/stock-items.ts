import type { Film, StockItemKind } from '#shared/stock/stock-items.contract'

export const STOCK_ITEMS = 'stock_items'

export interface StockItemRow {
  id: string
  stock_id: string
  kind: StockItemKind
  lot: string
  width: number
  length: number
  count: number
  film: Film
  /** Where a drop lies; null for coils and sheets. */
  rack_mark: string | null
  /** YYYY-MM-DD */
  received_on: string
}
export type StockItemInsert = Omit<StockItemRow, 'id' | 'count' | 'rack_mark'> &
  Partial<Pick<StockItemRow, 'id' | 'count' | 'rack_mark'>>
