import type { Db } from '#server/db/knex'
import { ORDERS } from '#server/db/tables/orders'
import { announce } from '#server/live/announce'
import type { PieceState } from '#shared/pieces/piece-state'

interface Moved {
  readonly code: string
  readonly orderId: string
  readonly runId: string
}

const LYING: readonly PieceState[] = ['bent', 'bundled']

/**
 * Tells the screens that pieces moved: the crew's about their orders and pieces, the shop's about
 * runs and rack as well.
 */
export async function announceMoves(
  db: Db,
  moved: readonly Moved[],
  { from, to }: { readonly from: PieceState; readonly to: PieceState },
): Promise<void> {
  const orders = await db(ORDERS)
    .whereIn('id', distinct(moved.map((piece) => piece.orderId)))
    .orderBy('id')
    .select('id', 'company_id')
  for (const order of orders) {
    const codes = moved.filter((piece) => piece.orderId === order.id).map((piece) => piece.code)
    const crew = { companyId: order.company_id, audience: 'company' } as const
    await announce(db, { topic: 'orders', entityId: order.id, ...crew })
    await announce(db, { topic: 'pieces', entityId: onlyOne(codes), ...crew })
  }
  for (const runId of distinct(moved.map((piece) => piece.runId))) {
    await announce(db, { topic: 'runs', entityId: runId, companyId: null, audience: 'shop' })
  }
  if (LYING.includes(from) || LYING.includes(to)) await announceRack(db)
}

export const announceRack = (db: Db): Promise<void> =>
  announce(db, { topic: 'rack', entityId: null, companyId: null, audience: 'shop' })

const distinct = (ids: readonly string[]): string[] => [...new Set(ids)].sort()

/** An announcement names a thing only where one thing changed. */
const onlyOne = (codes: readonly string[]): string | null =>
  codes.length === 1 ? (codes[0] ?? null) : null
