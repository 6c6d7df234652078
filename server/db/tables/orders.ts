export const ORDERS = 'orders'

export interface OrderRow {
  id: string
  number: number
  company_id: string
  job_id: string
  ordered_by: string
  po_number: string
  /** YYYY-MM-DD */
  needed_by: string
  notes: string
  pitch_rise: number
  /** Small goods; parsed with goodSchema when read. */
  goods: unknown
  submitted_at: Date
  released_at: Date | null
  withdrawn_at: Date | null
  version: number
}
export type OrderInsert = Pick<
  OrderRow,
  'company_id' | 'job_id' | 'ordered_by' | 'needed_by' | 'pitch_rise'
> &
  Partial<Omit<OrderRow, 'goods'>> & { goods?: string }
/** JSON columns are written as text. */
export type OrderUpdate = Partial<Omit<OrderRow, 'id' | 'number' | 'company_id' | 'goods'>> & {
  goods?: string
}
