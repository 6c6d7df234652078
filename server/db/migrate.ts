import type { Knex } from 'knex'
import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { migrationSource } from '#server/db/migrations'

/** Knex answers with the batch number and the names. */
const outcomeSchema = z.tuple([z.number(), z.array(z.string())])
const namesOf = (outcome: unknown): string[] => outcomeSchema.parse(outcome)[1]

/** @returns the names of the migrations made */
export async function migrateToLatest(db: Knex): Promise<string[]> {
  return namesOf(await db.migrate.latest({ migrationSource }))
}

/** Takes back what the last run made, or with `all` everything. */
export async function rollbackMigrations(db: Knex, all: boolean): Promise<string[]> {
  return namesOf(await db.migrate.rollback({ migrationSource }, all))
}

/** Only reads; fails when the database does not answer or was never migrated. */
export async function listPendingMigrations(db: Db): Promise<string[]> {
  const migrations = await migrationSource.getMigrations([])
  const done = new Set(await db.table('knex_migrations').pluck<string[]>('name'))
  return migrations
    .map((migration) => migrationSource.getMigrationName(migration))
    .filter((name) => !done.has(name))
}
