export const SHELF_PROFILES = 'shelf_profiles'

export interface ShelfProfileRow {
  id: string
  company_id: string | null
  starter_key: string | null
  name: string
  /** A Profile; parsed with profileSchema when read. */
  profile: unknown
  version: number
  updated_at: Date
}
/** JSON columns are written as text. */
export type ShelfProfileInsert = Pick<ShelfProfileRow, 'company_id' | 'starter_key' | 'name'> & {
  id?: string
  profile: string
  version?: number
  updated_at?: Date
}
export type ShelfProfileUpdate = Partial<ShelfProfileInsert>
