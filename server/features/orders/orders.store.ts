import type { Db } from '#server/db/knex'
import { ORDER_EVENTS, type OrderEventInsert } from '#server/db/tables/order-events'
import { ORDER_LINES } from '#server/db/tables/order-lines'
import { ORDERS, type OrderInsert, type OrderUpdate } from '#server/db/tables/orders'
import type { OrderLineInput } from '#shared/orders/order.schema'
import type { Profile } from '#shared/profile/profile.schema'

export const createOrdersStore = (db: Db) => ({
  async createOrder(order: OrderInsert): Promise<string> {
    const [row] = await db(ORDERS).insert(order).returning('id')
    if (!row) throw new Error('The new order has no row.')
    return row.id
  },

  /**
   * Takes the order for a change in this transaction: false when it is no longer at `version`, or
   * was released or withdrawn. Of two at the same time the second waits and is told false.
   */
  async takeOrder(id: string, version: number): Promise<boolean> {
    const count = await db(ORDERS)
      .where({ id, version })
      .whereNull('released_at')
      .whereNull('withdrawn_at')
      .update({ version: version + 1 })
    return count === 1
  },

  /** Writes what an order that `takeOrder` took is changed to. */
  async updateOrder(id: string, changes: Omit<OrderUpdate, 'version'>): Promise<void> {
    await db(ORDERS).where({ id }).update(changes)
  },

  async replaceLines(orderId: string, lines: readonly OrderLineInput[]): Promise<void> {
    await db(ORDER_LINES).where({ order_id: orderId }).delete()
    await db(ORDER_LINES).insert(
      lines.map((line, index) => ({
        order_id: orderId,
        position: index + 1,
        mark: line.mark,
        name: line.name,
        profile: JSON.stringify(line.profile),
        stock_id: line.stockId,
        quantity: line.quantity,
        length: line.length,
        ends: line.ends && JSON.stringify(line.ends),
        hands: line.hands && JSON.stringify(line.hands),
        stated_girth: line.statedGirth,
      })),
    )
  },

  /**
   * The orders of a job that can still be changed, each locked until the transaction ends, in one
   * order everywhere. Those that were released or withdrawn while it waited drop out.
   */
  async lockOpenOrders(jobId: string): Promise<{ id: string; pitchRise: number }[]> {
    const rows = await db(ORDERS)
      .where({ job_id: jobId })
      .whereNull('released_at')
      .whereNull('withdrawn_at')
      .orderBy('id')
      .forNoKeyUpdate()
      .select('id', 'pitch_rise')
    return rows.map(({ id, pitch_rise: pitchRise }) => ({ id, pitchRise }))
  },

  async redrawLine(id: string, profile: Profile): Promise<void> {
    await db(ORDER_LINES)
      .where({ id })
      .update({ profile: JSON.stringify(profile) })
  },

  /** The pitch that a locked order is drawn for, and its next version where a person must look. */
  async followPitch(
    id: string,
    { pitchRise, nextVersion }: { readonly pitchRise: number; readonly nextVersion: boolean },
  ): Promise<void> {
    await db(ORDERS).where({ id }).update({ pitch_rise: pitchRise })
    if (nextVersion) await db(ORDERS).where({ id }).increment('version')
  },

  async addEvent(event: OrderEventInsert): Promise<void> {
    await db(ORDER_EVENTS).insert(event)
  },
})

export type OrdersStore = ReturnType<typeof createOrdersStore>
