import type { Db } from '#server/db/knex'
import { BRAKES, type BrakeRow } from '#server/db/tables/brakes'
import { brakeSchema } from '#shared/bend-plan/brake.schema'
import type { ShopBrake } from '#shared/brakes/brakes.contract'

const toShopBrake = ({ id, position, definition }: BrakeRow): ShopBrake => ({
  id,
  position,
  brake: brakeSchema.parse(definition),
})

export const createBrakesQueries = (db: Db) => ({
  /** In the shop's order, which decides between brakes that do equally well. */
  async listBrakes(): Promise<ShopBrake[]> {
    const rows = await db(BRAKES).orderBy([{ column: 'position' }, { column: 'id' }])
    return rows.map(toShopBrake)
  },
})

export type BrakesQueries = ReturnType<typeof createBrakesQueries>
