export const SHELF_PROFILES = 'shelf_profiles'

export interface ShelfProfileRow {
  id: string
  company_id: string | null
  starter_key: string | null
  name: string
  /** A Profile; parsed with profileSchema when read. */
  profile: unknown
  version: number
  /** Null for starters, and where it was not noted yet. */
  saved_by: string | null
  updated_at: Date
}
/** JSON columns are written as text. */
export type ShelfProfileInsert = Pick<ShelfProfileRow, 'company_id' | 'starter_key' | 'name'> & {
  id?: string
  profile: string
  version?: number
  saved_by?: string
  updated_at?: Date
}
export type ShelfProfileUpdate = Partial<ShelfProfileInsert>
