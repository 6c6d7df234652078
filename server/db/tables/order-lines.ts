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
  /** PieceEnds; null: both square, the piece level. Parsed when read, as hands. */
  ends: unknown
  /** Hands; null: the pieces have none. */
  hands: unknown
  stated_girth: number | null
  /** A FrozenLine; null before release. */
  frozen: unknown
}
/** JSON columns are written as text. */
export type OrderLineInsert = Omit<
  OrderLineRow,
  'id' | 'profile' | 'ends' | 'hands' | 'stated_girth' | 'frozen'
> & {
  id?: string
  profile: string
  ends?: string | null
  hands?: string | null
  stated_girth?: number | null
  frozen?: string | null
}
export type OrderLineUpdate = Partial<OrderLineInsert>
