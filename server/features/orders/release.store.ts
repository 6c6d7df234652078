import { randomUUID } from 'node:crypto'
import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { readRows } from '#server/db/read-rows'
import { PIECES, type PieceInsert } from '#server/db/tables/pieces'
import { RUNS, type RunInsert } from '#server/db/tables/runs'
import type { FrozenLine } from '#server/features/orders/frozen-line'
import type { PlannedRun } from '#server/features/orders/gather-runs'
import { newCode } from '#server/features/pieces/new-code'
import type { BrakeLoad } from '#server/planning/choose-brake'
import type { CodeKind } from '#shared/pieces/codes'

export interface NewPiece {
  readonly lineId: string
  readonly runId: string
  readonly sequence: number
}

/** Rows of one insert, well below the parameters that one statement may have. */
const CHUNK = 1000
/** A code is taken once in a thousand pieces at worst: five draws in a row mean a fault. */
const MOST_DRAWS = 5

const loadSchema = z.object({ brakeId: z.uuid(), busy: z.boolean(), queued: z.int() })

export const createReleaseStore = (db: Db) => ({
  /** What is still to be bent, by brake; brakes without work are left out. */
  async mapBrakeLoads(): Promise<Map<string, BrakeLoad>> {
    const rows = await readRows(
      db,
      loadSchema,
      `select r.brake_id as "brakeId", bool_or(r.claimed_by is not null) as busy, count(*) as queued
       from pieces p join runs r on r.id = p.run_id
       where p.state = 'queued' group by r.brake_id`,
    )
    return new Map(rows.map(({ brakeId, busy, queued }) => [brakeId, { busy, queued }]))
  },

  async freezeLines(frozen: ReadonlyMap<string, FrozenLine>): Promise<void> {
    await db.raw(
      `update order_lines set frozen = given.value
       from jsonb_each(?::jsonb) as given where order_lines.id = given.key::uuid`,
      [JSON.stringify(Object.fromEntries(frozen))],
    )
  },

  /** In the given order, which becomes the order of their numbers. */
  async createRuns(
    orderId: string,
    runs: readonly (PlannedRun & { readonly id: string })[],
  ): Promise<void> {
    const rows = runs.map(({ id, lines: [first], stock, strip, brake, plan, override }) => ({
      id,
      order_id: orderId,
      brake_id: brake.id,
      name: first.name,
      profile: JSON.stringify(first.profile),
      stock: JSON.stringify(stock),
      strip: JSON.stringify(strip),
      brake: JSON.stringify(brake.brake),
      plan: JSON.stringify(plan),
      override: override && JSON.stringify(override),
    }))
    await insertWithCodes('run', rows, (coded: RunInsert[]) =>
      db(RUNS).insert(coded).onConflict('code').ignore().returning('id'),
    )
  },

  /** Each piece with the event that queues it. */
  async createPieces(
    orderId: string,
    pieces: readonly NewPiece[],
    personId: string,
  ): Promise<void> {
    const rows = pieces.map(({ lineId, runId, sequence }) => ({
      id: randomUUID(),
      order_id: orderId,
      line_id: lineId,
      run_id: runId,
      sequence,
    }))
    await insertWithCodes('piece', rows, (coded: PieceInsert[]) =>
      db(PIECES).insert(coded).onConflict('code').ignore().returning('id'),
    )
    await db.raw(
      `insert into piece_events (piece_id, from_state, to_state, person_id, station)
       select id, null, 'queued', ?, 'counter' from pieces where order_id = ?`,
      [personId, orderId],
    )
  },
})

export type ReleaseStore = ReturnType<typeof createReleaseStore>

/** Inserts every row under a fresh code; rows whose code is taken are tried again under another. */
async function insertWithCodes<Row extends { readonly id: string }>(
  kind: CodeKind,
  rows: readonly Row[],
  insert: (rows: (Row & { code: string })[]) => Promise<{ id: string }[]>,
): Promise<void> {
  for (let start = 0; start < rows.length; start += CHUNK) {
    let waiting = rows.slice(start, start + CHUNK)
    for (let draw = 1; waiting.length > 0; draw += 1) {
      if (draw > MOST_DRAWS) throw new Error(`No free ${kind} code in ${MOST_DRAWS} draws.`)
      const inserted = await insert(waiting.map((row) => ({ ...row, code: newCode(kind) })))
      const done = new Set(inserted.map(({ id }) => id))
      waiting = waiting.filter(({ id }) => !done.has(id))
    }
  }
}
