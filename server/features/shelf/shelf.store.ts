import type { Db } from '#server/db/knex'
import { SHELF_PROFILES } from '#server/db/tables/shelf-profiles'
import type { Profile } from '#shared/profile/profile.schema'

interface Saved {
  readonly name: string
  readonly profile: Profile
  readonly savedBy: string
}

export const createShelfStore = (db: Db) => ({
  async createShelfProfile(companyId: string, { name, profile, savedBy }: Saved): Promise<string> {
    const [row] = await db(SHELF_PROFILES)
      .insert({
        company_id: companyId,
        starter_key: null,
        name,
        profile: JSON.stringify(profile),
        saved_by: savedBy,
      })
      .returning('id')
    if (!row) throw new Error('The new shelf profile has no row.')
    return row.id
  },

  /** False when the profile is no longer at `version`. */
  async updateShelfProfile(
    id: string,
    version: number,
    { name, profile, savedBy }: Saved,
    now: Date,
  ): Promise<boolean> {
    const count = await db(SHELF_PROFILES)
      .where({ id, version })
      .update({
        name,
        profile: JSON.stringify(profile),
        version: version + 1,
        saved_by: savedBy,
        updated_at: now,
      })
    return count === 1
  },
})

export type ShelfStore = ReturnType<typeof createShelfStore>
