export const SHELF_VERSIONS = 'shelf_versions'

/** Written by the database whenever a company's saved profile is; never changed. */
export interface ShelfVersionRow {
  profile_id: string
  version: number
  name: string
  /** A Profile; parsed with profileSchema when read. */
  profile: unknown
  saved_by: string | null
  saved_at: Date
}
