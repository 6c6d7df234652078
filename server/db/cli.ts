import type { Knex } from 'knex'
import { DEMO_ACCOUNTS, seedDemo } from '#seeds/demo'
import { readDatabaseUrl } from '#server/config'
import { createDatabase } from '#server/db/knex'
import { migrateToLatest, rollbackMigrations } from '#server/db/migrate'
import { PEOPLE } from '#server/db/tables/people'
import { exitOnConfigError } from '#server/exit-on-config-error'
import { installJobs, removeJobs } from '#server/jobs/job-schema'

/** A refusal in words, without a stack. */
class Refusal extends Error {}

type Verb = (db: Knex, flags: readonly string[]) => Promise<string>

const VERBS: Record<string, Verb> = {
  migrate: async (db) => countOf(await migrate(db), 'made'),

  rollback: async (db, flags) => countOf(await rollback(db, flags.includes('--all')), 'taken back'),

  seed: async (db) => {
    if (await hasPeople(db)) {
      throw new Refusal('The database has people already; demo data goes into an empty one only.')
    }
    return seed(db)
  },

  'seed-if-empty': async (db) =>
    (await hasPeople(db)) ? 'people are there already, nothing added' : seed(db),

  reset: async (db, flags) => {
    if (!flags.includes('--force') && (await hasRealPeople(db))) {
      throw new Refusal(
        'The database has people beside the demo ones. To delete everything give --force.',
      )
    }
    await rollback(db, true)
    await migrate(db)
    return seed(db)
  },

  accounts: () => Promise.resolve(JSON.stringify(DEMO_ACCOUNTS)),
}

const countOf = (names: readonly string[], done: string): string =>
  names.length === 0 ? 'nothing to do' : `${names.length} ${done}, last ${names.at(-1) ?? ''}`

async function hasPeople(db: Knex): Promise<boolean> {
  return (await db(PEOPLE).first('id')) !== undefined
}

/** Demo people have addresses at example.com, which belong to nobody. */
async function hasRealPeople(db: Knex): Promise<boolean> {
  if (!(await db.schema.hasTable(PEOPLE))) return false
  return (await db(PEOPLE).whereNot('email', 'like', '%@example.com').first('id')) !== undefined
}

/** Ours, then the tables of the job queue. */
async function migrate(db: Knex): Promise<string[]> {
  const names = await migrateToLatest(db)
  await installJobs(databaseUrl)
  return names
}

async function rollback(db: Knex, all: boolean): Promise<string[]> {
  if (all) await removeJobs(db)
  return rollbackMigrations(db, all)
}

async function seed(db: Knex): Promise<string> {
  await db.transaction(seedDemo)
  return 'demo data added'
}

const [name = '', ...flags] = process.argv.slice(2)
const verb = VERBS[name]
if (!verb) {
  process.stderr.write(`Give one of: ${Object.keys(VERBS).join(', ')}.\n`)
  process.exit(2)
}
const databaseUrl = exitOnConfigError(readDatabaseUrl)
const db = createDatabase(databaseUrl)
try {
  process.stdout.write(`${await verb(db, flags)}\n`)
} catch (error) {
  if (!(error instanceof Refusal)) throw error
  process.stderr.write(`${error.message}\n`)
  process.exitCode = 1
} finally {
  await db.destroy()
}
