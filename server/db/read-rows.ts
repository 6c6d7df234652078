import { z } from 'zod'
import type { Db } from './knex'

/** Plain values by name; a list is sent as one array, so write `any(:name)`. */
export type SqlValues = Readonly<
  Record<string, string | number | boolean | Date | null | readonly string[] | readonly number[]>
>

/**
 * Runs a query written in SQL and parses its rows, so that what comes out is what the schema says.
 * Write `cast(:name as uuid)`: Knex takes `:name::uuid` for an identifier.
 *
 *     await readRows(db, z.object({ code: z.string() }), 'select code from runs where id = :id', { id })
 */
export async function readRows<Row extends z.ZodType>(
  db: Db,
  row: Row,
  sql: string,
  values: SqlValues = {},
): Promise<z.output<Row>[]> {
  const result = await db.raw<{ rows: unknown }>(sql, { ...values })
  return z.array(row).parse(result.rows)
}

/** Like `readRows` where one row at most can answer. */
export async function findRow<Row extends z.ZodType>(
  db: Db,
  row: Row,
  sql: string,
  values: SqlValues = {},
): Promise<z.output<Row> | undefined> {
  const [found] = await readRows(db, row, sql, values)
  return found
}
