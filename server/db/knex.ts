import knex, { type Knex } from 'knex'
import pg from 'pg'
import type {} from './tables/register'

/** A pool or an open transaction: services are built on either (`Knex.Transaction` extends `Knex`). */
export type Db = Knex

const wholeNumber = (text: string): number => {
  const value = Number(text)
  if (!Number.isSafeInteger(value)) {
    throw new RangeError(`The whole number ${text} of the database is too large for JavaScript.`)
  }
  return value
}

const asText = (text: string): string => text

/**
 * How values come out of the database: `int8` and `numeric` as numbers, `date` as `YYYY-MM-DD`
 * (a calendar day has no time zone), everything else as `pg` reads it (`timestamptz` as Date).
 */
const columnTypes = new pg.TypeOverrides()
columnTypes.setTypeParser(pg.types.builtins.INT8, wholeNumber)
columnTypes.setTypeParser(pg.types.builtins.NUMERIC, Number)
columnTypes.setTypeParser(pg.types.builtins.DATE, asText)

const types = {
  getTypeParser: (oid: number, format: string): unknown =>
    columnTypes.getTypeParser(oid, format === 'binary' ? 'binary' : 'text'),
}

export interface DatabaseOptions {
  /** The most connections of this pool. */
  readonly poolSize?: number
}

/**
 * Opens the pool. Knex listens for errors of idle connections itself and drops them, so a database
 * that goes away does not end the process.
 */
export function createDatabase(url: string, { poolSize = 10 }: DatabaseOptions = {}): Knex {
  return knex({
    client: 'pg',
    connection: { connectionString: url, types, application_name: 'foldyard' },
    pool: { min: 0, max: poolSize },
    acquireConnectionTimeout: 10_000,
  })
}
