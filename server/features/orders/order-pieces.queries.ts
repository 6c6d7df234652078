import type { Db } from '#server/db/knex'
import { lineLaySchema, pieceLay } from '#server/features/pieces/piece-lay'
import type { PieceSummary } from '#shared/orders/order.schema'
import type { PieceState } from '#shared/pieces/piece-state'

interface OrderPieceRow {
  line_id: string
  code: string
  sequence: number
  state: PieceState
  at: Date
  by: string
  run_number: number
  bundle_code: string | null
  rack_place: string | null
  remake_of: string | null
  ends: unknown
  hands: unknown
}

export const createOrderPiecesQueries = (db: Db) => ({
  /** The pieces of an order by line, each with the event that made its state; remakes come last. */
  async mapPieces(orderId: string): Promise<Map<string, PieceSummary[]>> {
    const rows = await db('pieces as x')
      .join('order_lines as l', 'l.id', 'x.line_id')
      .join('runs as r', 'r.id', 'x.run_id')
      .joinRaw(
        `cross join lateral (
           select min(id) as first_id, max(id) as last_id from piece_events where piece_id = x.id
         ) ids`,
      )
      .join('piece_events as e', 'e.id', 'ids.last_id')
      .join('people as p', 'p.id', 'e.person_id')
      .leftJoin('bundles as b', 'b.id', 'x.bundle_id')
      .leftJoin('pieces as spoiled', 'spoiled.id', 'x.remake_of')
      .where('x.order_id', orderId)
      .orderBy([{ column: 'x.sequence' }, { column: 'ids.first_id' }])
      .select<OrderPieceRow[]>(
        'x.line_id',
        'x.code',
        'x.sequence',
        'x.state',
        'e.at',
        'p.name as by',
        'r.number as run_number',
        'b.code as bundle_code',
        'b.rack_place',
        'spoiled.code as remake_of',
        'l.ends',
        'l.hands',
      )
    const byLine = new Map<string, PieceSummary[]>()
    for (const row of rows) {
      const pieces = byLine.get(row.line_id) ?? []
      pieces.push(toPieceSummary(row))
      byLine.set(row.line_id, pieces)
    }
    return byLine
  },
})

const toPieceSummary = (row: OrderPieceRow): PieceSummary => ({
  code: row.code,
  sequence: row.sequence,
  hand: pieceLay(lineLaySchema.parse(row), row.sequence).hand,
  state: row.state,
  since: row.at.toISOString(),
  by: row.by,
  runNumber: row.run_number,
  bundleCode: row.bundle_code,
  rackPlace: row.rack_place,
  remakeOf: row.remake_of,
})

export type OrderPiecesQueries = ReturnType<typeof createOrderPiecesQueries>
