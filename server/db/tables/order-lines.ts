export const ORDER_LINES = 'order_lines'

export interface OrderLineRow {
  id: string
  order_id: string
  position: number
  mark: string
  name: string
  /** A Profile; parsed with profileSchema when read. */
  profile: unknown
  stock_id: string
  quantity: number
  length: number
  /** A FrozenLine; null before release. */
  frozen: unknown
}
/** JSON columns are written as text. */
export type OrderLineInsert = Omit<OrderLineRow, 'id' | 'profile' | 'frozen'> & {
  id?: string
  profile: string
  frozen?: string | null
}
export type OrderLineUpdate = Partial<OrderLineInsert>
