import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { ORDER_LINES, type OrderLineRow } from '#server/db/tables/order-lines'
import type { OrderEventRow } from '#server/db/tables/order-events'
import { isBeforeRelease } from '#server/features/orders/before-release'
import { frozenLineSchema, type FrozenLine } from '#server/features/orders/frozen-line'
import { searchOrders } from '#server/features/orders/order-search'
import { selectOrderSummaries, toOrderSummary } from '#server/features/orders/order-summary'
import { decodeCursor, toPage } from '#server/http/cursor'
import { handsSchema, pieceEndsSchema } from '#shared/ends/end.schema'
import type { AnswerOf, QueryOf } from '#shared/http/endpoint'
import type { OrderEvent, OrderLineInput, OrderSummary } from '#shared/orders/order.schema'
import type { listOrders } from '#shared/orders/orders.contract'
import { profileSchema } from '#shared/profile/profile.schema'
import { goodSchema, type Good } from '#shared/roof-line/goods.schema'

/** A line as written, with what was frozen at release. */
export interface StoredLine extends OrderLineInput {
  readonly id: string
  readonly position: number
  readonly frozen: FrozenLine | null
}

const cursorSchema = z.int()

const toStoredLine = (row: OrderLineRow): StoredLine => ({
  id: row.id,
  position: row.position,
  mark: row.mark,
  name: row.name,
  profile: profileSchema.parse(row.profile),
  stockId: row.stock_id,
  quantity: row.quantity,
  length: row.length,
  ends: pieceEndsSchema.nullable().parse(row.ends),
  hands: handsSchema.nullable().parse(row.hands),
  statedGirth: row.stated_girth,
  frozen: frozenLineSchema.nullable().parse(row.frozen),
})

export const createOrdersQueries = (db: Db) => ({
  /** By number, newest first. `scope` limits to one company. */
  async listOrders(
    { after, limit, states, jobId, search }: QueryOf<typeof listOrders>,
    scope: string | null,
  ): Promise<AnswerOf<typeof listOrders>> {
    const start = decodeCursor(after, cursorSchema)
    const query = selectOrderSummaries(db, scope)
      .orderBy('o.number', 'desc')
      .limit(limit + 1)
    if (start !== null) void query.where('o.number', '<', start)
    if (states) void query.whereIn('s.state', states)
    // Says nothing new, but spares the database deriving the state of every order ever released
    // when the counter looks for what came in.
    if (states?.every(isBeforeRelease)) {
      void query.whereNull('o.released_at').whereNull('o.withdrawn_at')
    }
    if (jobId !== undefined) void query.where('o.job_id', jobId)
    if (search) searchOrders(query, search)
    return toPage(await query, limit, toOrderSummary, (row) => row.number)
  },

  /** An order without its lines, pieces and events. */
  async findOrder(
    id: string,
    scope: string | null,
  ): Promise<(OrderSummary & { notes: string; goods: Good[] }) | undefined> {
    const row = await selectOrderSummaries(db, scope).where('o.id', id).first()
    if (!row) return undefined
    return {
      ...toOrderSummary(row),
      notes: row.notes,
      goods: z.array(goodSchema).parse(row.goods),
    }
  },

  async listLines(orderId: string): Promise<StoredLine[]> {
    const rows = await db(ORDER_LINES).where({ order_id: orderId }).orderBy('position')
    return rows.map(toStoredLine)
  },

  async listEvents(orderId: string): Promise<OrderEvent[]> {
    const rows = await db('order_events as e')
      .join('people as p', 'p.id', 'e.person_id')
      .where('e.order_id', orderId)
      .orderBy('e.id')
      .select<(Pick<OrderEventRow, 'id' | 'kind' | 'at' | 'text'> & { by: string })[]>(
        'e.id',
        'e.kind',
        'e.at',
        'e.text',
        'p.name as by',
      )
    return rows.map((row) => ({ ...row, at: row.at.toISOString() }))
  },
})

export type OrdersQueries = ReturnType<typeof createOrdersQueries>
