import type { Db } from '#server/db/knex'
import { PEOPLE } from '#server/db/tables/people'
import { SHELF_VERSIONS } from '#server/db/tables/shelf-versions'
import { profileSchema } from '#shared/profile/profile.schema'
import type { ShelfProfile, ShelfVersion } from '#shared/shelf/shelf.contract'

interface VersionRow {
  version: number
  name: string
  profile: unknown
  saved_by_name: string | null
  saved_at: Date
}

interface ShelfRow {
  id: string
  company_id: string | null
  company_name: string | null
  starter_key: string | null
  name: string
  profile: unknown
  version: number
  updated_at: Date
}

const toShelfProfile = (row: ShelfRow): ShelfProfile => ({
  id: row.id,
  company:
    row.company_id === null || row.company_name === null
      ? null
      : { id: row.company_id, name: row.company_name },
  starterKey: row.starter_key,
  name: row.name,
  profile: profileSchema.parse(row.profile),
  version: row.version,
  updatedAt: row.updated_at.toISOString(),
})

export const createShelfQueries = (db: Db) => {
  /** Starters are everyone's. */
  const shelf = (scope: string | null) => {
    const query = db('shelf_profiles as s')
      .leftJoin('companies as c', 'c.id', 's.company_id')
      .select<ShelfRow[]>('s.*', 'c.name as company_name')
    return scope === null
      ? query
      : query.where((own) => void own.whereNull('s.company_id').orWhere('s.company_id', scope))
  }

  return {
    async listShelf(scope: string | null): Promise<ShelfProfile[]> {
      const rows = await shelf(scope).orderByRaw(
        's.company_id is not null, c.name, lower(s.name), s.id',
      )
      return rows.map(toShelfProfile)
    },

    /** The latest first. */
    async listVersions(id: string): Promise<ShelfVersion[]> {
      const rows = await db(`${SHELF_VERSIONS} as v`)
        .leftJoin(`${PEOPLE} as p`, 'p.id', 'v.saved_by')
        .where('v.profile_id', id)
        .orderBy('v.version', 'desc')
        .select<VersionRow[]>('v.*', 'p.name as saved_by_name')
      return rows.map((row) => ({
        version: row.version,
        name: row.name,
        profile: profileSchema.parse(row.profile),
        savedBy: row.saved_by_name,
        savedAt: row.saved_at.toISOString(),
      }))
    },

    async findShelfProfile(id: string, scope: string | null): Promise<ShelfProfile | undefined> {
      const row = await shelf(scope).where('s.id', id).first()
      return row && toShelfProfile(row)
    },
  }
}

export type ShelfQueries = ReturnType<typeof createShelfQueries>
