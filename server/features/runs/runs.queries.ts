import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { findRow, readRows } from '#server/db/read-rows'
import { lineLaySchema, pieceLay } from '#server/features/pieces/piece-lay'
import { LAST_BENT } from '#server/features/runs/last-bent'
import { frozenStockSchema } from '#server/features/stocks/frozen-stock'
import { notFound } from '#server/http/errors'
import type { Progress } from '#shared/orders/order.schema'
import { pieceStateSchema } from '#shared/pieces/piece-state'
import {
  runLineSchema,
  runSummarySchema,
  type Run,
  type RunLine,
  type RunPiece,
  type RunSummary,
} from '#shared/runs/runs.contract'
import { brakeSchema } from '#shared/bend-plan/brake.schema'
import { planSchema } from '#shared/bend-plan/plan.schema'

/** The contract's summary, with its pieces counted by state and who took it as columns. */
const summaryRowSchema = z.object({
  ...runSummarySchema.omit({ progress: true, claimedBy: true }).shape,
  stock: frozenStockSchema,
  counts: z.partialRecord(pieceStateSchema, z.int()),
  claimerId: z.uuid().nullable(),
  claimerName: z.string().nullable(),
  claimedAt: z.date().nullable(),
})

/** Lengths in the order of the run, counted without the pieces that came to an end. */
const SUMMARY = `
  select r.id, r.number, r.code, r.name, r.profile, r.stock, r.strip, r.brake_id as "brakeId",
    r.brake ->> 'name' as "brakeName", c.name as company, j.name as job,
    o.number as "orderNumber", o.needed_by as "neededBy",
    r.override, r.claimed_by as "claimerId", claimer.name as "claimerName", r.claimed_at as "claimedAt",
    counted.counts, measured.lengths,
    coalesce(
      counted.counts -> 'queued' is not null
        and last.run_id <> r.id and last.stock_id = r.stock ->> 'id',
      false
    ) as "sameStock"
  from runs r
  join orders o on o.id = r.order_id
  join companies c on c.id = o.company_id
  join jobs j on j.id = o.job_id
  left join people claimer on claimer.id = r.claimed_by
  left join last_bent last on last.brake_id = r.brake_id
  cross join lateral (
    select coalesce(jsonb_object_agg(state, pieces), '{}') as counts from (
      select state, count(*) as pieces from pieces where run_id = r.id group by state
    ) by_state
  ) counted
  cross join lateral (
    select coalesce(
      jsonb_agg(jsonb_build_object('length', length, 'count', pieces) order by first_line), '[]'
    ) as lengths from (
      select l.length, count(*) as pieces, min(l.position) as first_line
      from pieces p join order_lines l on l.id = p.line_id
      where p.run_id = r.id and p.state not in ('scrapped', 'withdrawn')
      group by l.length
    ) by_length
  ) measured`

const HAS_QUEUED = `exists (select 1 from pieces where run_id = r.id and state = 'queued')`

const DONE_SHOWN = 50

/**
 * Open runs (some piece is queued) by the day they are needed; done ones latest first, no more
 * than the last 50.
 */
export async function listRuns(db: Db, state: 'open' | 'done'): Promise<RunSummary[]> {
  const rest =
    state === 'open'
      ? `where ${HAS_QUEUED} order by o.needed_by, r.number`
      : `where not ${HAS_QUEUED} order by r.number desc limit ${DONE_SHOWN}`
  return (await readRows(db, summaryRowSchema, `${LAST_BENT} ${SUMMARY} ${rest}`)).map(toSummary)
}

const runRowSchema = summaryRowSchema.extend({ plan: planSchema, brake: brakeSchema })

/** A run with all that the bend card shows; throws `not-found`. */
export async function getRun(db: Db, id: string): Promise<Run> {
  const row = await findRow(
    db,
    runRowSchema,
    `${LAST_BENT} select run.*, frozen.plan, frozen.brake
     from (${SUMMARY} where r.id = :id) run join runs frozen on frozen.id = run.id`,
    { id },
  )
  if (!row) throw notFound('run')
  return {
    ...toSummary(row),
    plan: row.plan,
    brake: row.brake,
    lines: await listLines(db, id),
    pieces: await listPieces(db, id),
  }
}

/** The lines whose pieces the run bends, in the order's order. */
const listLines = (db: Db, runId: string): Promise<RunLine[]> =>
  readRows(
    db,
    runLineSchema,
    `select id, mark, name, length, quantity, ends, hands from order_lines
     where id in (select line_id from pieces where run_id = :runId)
     order by position`,
    { runId },
  )

const pieceRowSchema = lineLaySchema.extend({
  code: z.string(),
  lineId: z.uuid(),
  mark: z.string(),
  sequence: z.int(),
  quantity: z.int(),
  length: z.number(),
  weight: z.number(),
  state: pieceStateSchema,
  at: z.date(),
  by: z.string(),
  lastEventId: z.int(),
})

/** In the order in which they are bent; a remake comes after the piece it replaces. */
async function listPieces(db: Db, runId: string): Promise<RunPiece[]> {
  const rows = await readRows(
    db,
    pieceRowSchema,
    `select p.code, p.line_id as "lineId", l.mark, l.ends, l.hands, p.sequence, l.quantity, l.length,
       cast(l.frozen ->> 'pieceWeight' as double precision) as weight,
       p.state, e.at, person.name as by, e.id as "lastEventId"
     from pieces p
     join order_lines l on l.id = p.line_id
     cross join lateral (
       select min(id) as first_id, max(id) as last_id from piece_events where piece_id = p.id
     ) events
     join piece_events e on e.id = events.last_id
     join people person on person.id = e.person_id
     where p.run_id = :runId
     order by l.position, p.sequence, events.first_id`,
    { runId },
  )
  return rows.map(({ at, ends, hands, ...piece }) => ({
    ...piece,
    ...pieceLay({ ends, hands }, piece.sequence),
    since: at.toISOString(),
  }))
}

const toSummary = (row: z.infer<typeof summaryRowSchema>): RunSummary => ({
  id: row.id,
  number: row.number,
  code: row.code,
  name: row.name,
  profile: row.profile,
  stock: row.stock,
  strip: row.strip,
  brakeId: row.brakeId,
  brakeName: row.brakeName,
  company: row.company,
  job: row.job,
  orderNumber: row.orderNumber,
  neededBy: row.neededBy,
  lengths: row.lengths,
  progress: toProgress(row.counts),
  sameStock: row.sameStock,
  override: row.override,
  claimedBy: toClaim(row),
})

const toProgress = (counts: z.infer<typeof summaryRowSchema>['counts']): Progress => ({
  queued: counts.queued ?? 0,
  bent: counts.bent ?? 0,
  bundled: counts.bundled ?? 0,
  pickedUp: counts.pickedUp ?? 0,
  scrapped: counts.scrapped ?? 0,
  withdrawn: counts.withdrawn ?? 0,
})

function toClaim(row: z.infer<typeof summaryRowSchema>): RunSummary['claimedBy'] {
  const { claimerId, claimerName, claimedAt } = row
  if (claimerId === null || claimerName === null || claimedAt === null) return null
  return { id: claimerId, name: claimerName, at: claimedAt.toISOString() }
}
