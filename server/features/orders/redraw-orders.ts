import { isMitered, redrawLine } from '#server/features/orders/redraw-line'
import type { OrdersQueries, StoredLine } from '#server/features/orders/orders.queries'
import type { OrdersStore } from '#server/features/orders/orders.store'
import type { Announcement } from '#server/live/announce'
import { redrawnText } from '#shared/orders/redrawn'

export interface RedrawDeps {
  readonly queries: OrdersQueries
  readonly store: OrdersStore
  readonly announce: (announcement: Announcement) => Promise<void>
}

export interface PitchChange {
  readonly jobId: string
  readonly companyId: string
  /** Rise in 12. */
  readonly to: number
  /** Who changed it. */
  readonly personId: string
}

/**
 * Draws the lines that follow the roof anew on every order of a job that can still be changed, in
 * the transaction that changes the job's pitch. An order with such a line, or with mitered ends,
 * comes to its next version and says so in its history; what cannot be made any more is kept as
 * drawn, and is refused when the order is to be released. Released orders never change.
 */
export type RedrawOrders = (change: PitchChange) => Promise<void>

export const createRedrawOrders =
  ({ queries, store, announce }: RedrawDeps): RedrawOrders =>
  async ({ jobId, companyId, to, personId }) => {
    const redraw = async (id: string, from: number): Promise<void> => {
      const lines = await queries.listLines(id)
      const drawn = lines.flatMap((line) => {
        const profile = redrawLine(line, to)
        return profile ? [{ ...line, profile }] : []
      })
      const mitered = lines.filter(isMitered)
      for (const line of drawn) await store.redrawLine(line.id, line.profile)
      const concerned = drawn.length > 0 || mitered.length > 0
      await store.followPitch(id, { pitchRise: to, nextVersion: concerned })
      if (concerned) {
        const text = redrawnText({ from, to, drawn: marksOf(drawn), mitered: marksOf(mitered) })
        await store.addEvent({ order_id: id, kind: 'redrawn', person_id: personId, text })
      }
      await announce({ topic: 'orders', entityId: id, companyId, audience: 'company' })
    }
    for (const { id, pitchRise } of await store.lockOpenOrders(jobId)) {
      if (pitchRise !== to) await redraw(id, pitchRise)
    }
  }

const marksOf = (lines: readonly StoredLine[]): string => lines.map(({ mark }) => mark).join(', ')
