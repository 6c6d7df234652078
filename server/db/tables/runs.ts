export const RUNS = 'runs'

export interface RunRow {
  id: string
  number: number
  code: string
  order_id: string
  brake_id: string
  name: string
  /** Profile, Stock, Strip, Brake, Plan as frozen at release; parsed when read. */
  profile: unknown
  stock: unknown
  strip: unknown
  brake: unknown
  plan: unknown
  /** An Override; null where the brake bends the pieces. */
  override: unknown
  claimed_by: string | null
  claimed_at: Date | null
  created_at: Date
}
/** JSON columns are written as text. */
export interface RunInsert {
  id?: string
  code: string
  order_id: string
  brake_id: string
  name: string
  profile: string
  stock: string
  strip: string
  brake: string
  plan: string
  override?: string | null
  claimed_by?: string | null
  claimed_at?: Date | null
  created_at?: Date
}
export type RunUpdate = Partial<Pick<RunRow, 'claimed_by' | 'claimed_at'>>
