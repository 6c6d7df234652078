import type { Db } from '#server/db/knex'
import type { OrderState, OrderSummary } from '#shared/orders/order.schema'

interface OrderSummaryRow {
  id: string
  number: number
  company_id: string
  company_name: string
  job_id: string
  job_name: string
  pitch_rise: number
  ordered_by: string
  po_number: string
  needed_by: string
  notes: string
  goods: unknown
  submitted_at: Date
  version: number
  state: OrderState
  piece_count: number
  queued: number
  bent: number
  bundled: number
  picked_up: number
  scrapped: number
  withdrawn: number
}

/**
 * Orders with their derived state and counts; `scope` limits to one company. Join names for further
 * conditions: o (orders), c (companies), j (jobs), p (who ordered), s (order_states).
 *
 *     const row = await selectOrderSummaries(db, null).where('o.id', orderId).first()
 */
export function selectOrderSummaries(db: Db, scope: string | null) {
  const query = db('orders as o')
    .join('companies as c', 'c.id', 'o.company_id')
    .join('jobs as j', 'j.id', 'o.job_id')
    .join('people as p', 'p.id', 'o.ordered_by')
    .join('order_states as s', 's.order_id', 'o.id')
    .select<OrderSummaryRow[]>(
      'o.id',
      'o.number',
      'o.company_id',
      'c.name as company_name',
      'o.job_id',
      'j.name as job_name',
      'o.pitch_rise',
      'p.name as ordered_by',
      'o.po_number',
      'o.needed_by',
      'o.notes',
      'o.goods',
      'o.submitted_at',
      'o.version',
      's.state',
      's.piece_count',
      's.queued',
      's.bent',
      's.bundled',
      's.picked_up',
      's.scrapped',
      's.withdrawn',
    )
  return scope === null ? query : query.where('o.company_id', scope)
}

/** The job's pitch is shown as the order is drawn for it: one that was released keeps its own. */
export const toOrderSummary = (row: OrderSummaryRow): OrderSummary => ({
  id: row.id,
  number: row.number,
  company: { id: row.company_id, name: row.company_name },
  job: { id: row.job_id, name: row.job_name, pitchRise: row.pitch_rise },
  orderedBy: row.ordered_by,
  poNumber: row.po_number,
  neededBy: row.needed_by,
  submittedAt: row.submitted_at.toISOString(),
  state: row.state,
  pieceCount: row.piece_count,
  progress: {
    queued: row.queued,
    bent: row.bent,
    bundled: row.bundled,
    pickedUp: row.picked_up,
    scrapped: row.scrapped,
    withdrawn: row.withdrawn,
  },
  version: row.version,
})
