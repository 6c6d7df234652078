import type { Knex } from 'knex'
import { readDatabaseUrl } from '#server/config'
import { migrationSource } from '#server/db/migrations'

/**
 * For Knex's own command line (`node --import tsx node_modules/knex/bin/cli.js migrate:status`).
 * The product migrates with `npm run db:migrate`; both read the same list.
 */
const config: Knex.Config = {
  client: 'pg',
  connection: readDatabaseUrl(),
  migrations: { migrationSource },
}

export default config
