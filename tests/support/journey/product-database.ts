import type { Knex } from 'knex'
import { afterAll, beforeAll, inject } from 'vitest'
import { createDatabase } from '#server/db/knex'

/** The product's own database, for what no screen shows and no person can do. */
export function useProductDatabase(): () => Knex {
  let db: Knex
  beforeAll(() => {
    db = createDatabase(inject('productDatabaseUrl'), { poolSize: 1 })
  })
  afterAll(() => db.destroy())
  return () => db
}
