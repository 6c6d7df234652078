export const HAND_OFFS = 'hand_offs'

export interface HandOffRow {
  id: string
  order_id: string
  received_by: string
  handed_by: string
  /** A Signature; parsed when read. */
  signature: unknown
  at: Date
}
/** JSON columns are written as text. */
export type HandOffInsert = Pick<HandOffRow, 'order_id' | 'received_by' | 'handed_by'> & {
  id?: string
  signature: string
  at?: Date
}
