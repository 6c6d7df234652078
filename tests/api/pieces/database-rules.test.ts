import pg from 'pg'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Db } from '#server/db/knex'
import { PIECE_MOVES, PIECE_STATES, type PieceState } from '#shared/pieces/piece-state'
import { firstCode, openFloor, type Floor } from '../../support/making-factories'

let floor: Floor
let pieceId: string
let bundleId: string
beforeAll(async () => {
  floor = await openFloor()
  const order = await floor.queue()
  const piece = await floor
    .db('pieces')
    .where({ code: firstCode(order) })
    .first('id')
  pieceId = piece?.id ?? ''
  const [bundle] = await floor
    .db('bundles')
    .insert({
      code: 'B0000001',
      order_id: order.id,
      number: 1,
      rack_place: 'R1',
      created_by: floor.wrenPerson.id,
    })
    .returning('id')
  bundleId = bundle?.id ?? ''
})
afterAll(() => floor.close())

/** Works in a transaction that never commits. */
async function inVain(work: (trx: Db) => Promise<void>): Promise<void> {
  const trx = await floor.db.transaction()
  try {
    await work(trx)
  } finally {
    await trx.rollback()
  }
}

const setState = (trx: Db, state: PieceState) =>
  trx('pieces')
    .where({ id: pieceId })
    .update({ state, bundle_id: ['bundled', 'pickedUp'].includes(state) ? bundleId : null })

const addEvent = (
  trx: Db,
  from: PieceState | null,
  to: PieceState,
  reason: string | null = 'why',
) =>
  trx('piece_events').insert({
    piece_id: pieceId,
    from_state: from,
    to_state: to,
    person_id: floor.wrenPerson.id,
    station: 'brake',
    reason,
  })

/** The shortest legal way from queued to a state. */
const WAY: Record<PieceState, PieceState[]> = {
  queued: [],
  bent: ['bent'],
  bundled: ['bent', 'bundled'],
  pickedUp: ['bent', 'bundled', 'pickedUp'],
  scrapped: ['scrapped'],
  withdrawn: ['withdrawn'],
}

async function bring(trx: Db, to: PieceState): Promise<void> {
  let from: PieceState = 'queued'
  for (const state of WAY[to]) {
    await setState(trx, state)
    await addEvent(trx, from, state)
    from = state
  }
}

/** The code of the error that the database refuses with; fails when it does not refuse. */
async function refusal(work: PromiseLike<unknown>): Promise<string | undefined> {
  try {
    await work
  } catch (error) {
    if (error instanceof pg.DatabaseError) return error.code
    throw error
  }
  throw new Error('The database did not refuse.')
}

const PAIRS = PIECE_STATES.flatMap((from) =>
  PIECE_STATES.filter((to) => to !== from).map((to) => [from, to] as const),
)
const isLegal = (from: PieceState, to: PieceState) =>
  PIECE_MOVES.some((move) => move.from === from && move.to === to)

describe('The database itself', () => {
  it('holds the same moves as PIECE_MOVES', async () => {
    const rows = await floor.db('piece_moves')
    const listed = (moves: readonly { from: string; to: string; needsReason: boolean }[]) =>
      moves.map((move) => `${move.from} ${move.to} ${move.needsReason}`).sort()
    expect(
      listed(
        rows.map((row) => ({
          from: row.from_state,
          to: row.to_state,
          needsReason: row.needs_reason,
        })),
      ),
    ).toEqual(listed(PIECE_MOVES))
  })

  it.each(PAIRS.filter(([from, to]) => !isLegal(from, to)))(
    'refuses a piece to go from %s to %s',
    async (from, to) => {
      await inVain(async (trx) => {
        await bring(trx, from)
        expect(await refusal(setState(trx, to))).toBe('FY001')
      })
    },
  )

  it.each(PAIRS.filter(([from, to]) => isLegal(from, to)))(
    'lets a piece go from %s to %s',
    async (from, to) => {
      await inVain(async (trx) => {
        await bring(trx, from)
        expect(await setState(trx, to)).toBe(1)
        await addEvent(trx, from, to)
        await trx.raw('set constraints all immediate')
      })
    },
  )

  it.each(PAIRS.filter(([from, to]) => !isLegal(from, to)))(
    'refuses an event from %s to %s',
    async (from, to) => {
      await inVain(async (trx) => {
        await bring(trx, from)
        expect(await refusal(addEvent(trx, from, to))).toBe('FY001')
      })
    },
  )

  it.each(PIECE_MOVES.filter((move) => move.needsReason))(
    'refuses $from to $to without a reason',
    async ({ from, to }) => {
      await inVain(async (trx) => {
        await bring(trx, from)
        await setState(trx, to)
        expect(await refusal(addEvent(trx, from, to, '  '))).toBe('FY003')
      })
    },
  )

  it('refuses, at the end of the transaction, a state without its event', async () => {
    const work = floor.db.transaction((trx) => setState(trx, 'bent'))
    expect(await refusal(work)).toBe('FY002')
    expect(await floor.db('pieces').where({ id: pieceId }).first('state')).toEqual({
      state: 'queued',
    })
  })

  it('refuses, at the end of the transaction, an event without its state', async () => {
    const work = floor.db.transaction((trx) => addEvent(trx, 'queued', 'bent'))
    expect(await refusal(work)).toBe('FY002')
  })

  it('refuses an event that does not start where the last one of its piece ended', async () => {
    await inVain(async (trx) => {
      expect(await refusal(addEvent(trx, 'bent', 'bundled'))).toBe('FY006')
    })
  })

  it('refuses a second beginning', async () => {
    await inVain(async (trx) => {
      expect(await refusal(addEvent(trx, null, 'queued'))).toBe('FY006')
    })
  })

  it('refuses a piece that does not begin queued', async () => {
    await inVain(async (trx) => {
      const insert = trx.raw(
        `insert into pieces (code, order_id, line_id, run_id, sequence, state)
         select 'P0000000', order_id, line_id, run_id, 499, 'bent' from pieces where id = ?`,
        [pieceId],
      )
      expect(await refusal(insert)).toBe('FY001')
    })
  })

  it('refuses two living pieces for one place in a line', async () => {
    await inVain(async (trx) => {
      const insert = trx.raw(
        `insert into pieces (code, order_id, line_id, run_id, sequence)
         select 'P0000000', order_id, line_id, run_id, sequence from pieces where id = ?`,
        [pieceId],
      )
      expect(await refusal(insert)).toBe('23505')
    })
  })

  it('refuses a bundled piece without a bundle and a bent one with a bundle', async () => {
    await inVain(async (trx) => {
      await bring(trx, 'bent')
      const bundled = trx('pieces').where({ id: pieceId }).update({ state: 'bundled' })
      expect(await refusal(bundled)).toBe('23514')
    })
    await inVain(async (trx) => {
      await bring(trx, 'bent')
      const inBundle = trx('pieces').where({ id: pieceId }).update({ bundle_id: bundleId })
      expect(await refusal(inBundle)).toBe('23514')
    })
  })

  it('refuses a piece in the bundle of another order', async () => {
    const other = await floor.queue()
    await inVain(async (trx) => {
      const code = firstCode(other)
      await trx('pieces').where({ code }).update({ state: 'bent' })
      const stray = trx('pieces').where({ code }).update({ state: 'bundled', bundle_id: bundleId })
      expect(await refusal(stray)).toBe('23503')
    })
  })

  it.each(['piece_events', 'order_events'] as const)('never changes %s', async (table) => {
    const rows = () => floor.db.select('*').from(table).orderBy('id')
    const before: unknown[] = await rows()
    expect(before.length).toBeGreaterThan(0)
    expect(await refusal(floor.db.raw('update ?? set at = now()', [table]))).toBe('FY004')
    expect(await refusal(floor.db.raw('delete from ??', [table]))).toBe('FY004')
    expect(await refusal(floor.db.raw('truncate ?? cascade', [table]))).toBe('FY004')
    expect(await rows()).toEqual(before)
  })
})
