import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { readRows } from '#server/db/read-rows'
import { listOrderBundles } from '#server/features/bundles/bundles.queries'
import { selectOrderSummaries, toOrderSummary } from '#server/features/orders/order-summary'
import { notFound } from '#server/http/errors'
import {
  signatureSchema,
  type HandOff,
  type HandOffSheet,
} from '#shared/hand-off/hand-off.contract'

/** Throws `not-found`. */
export async function getHandOffSheet(db: Db, orderId: string): Promise<HandOffSheet> {
  const row = await selectOrderSummaries(db, null).where('o.id', orderId).first()
  if (!row) throw notFound('order')
  const order = toOrderSummary(row)
  return {
    order,
    bundles: await listOrderBundles(db, orderId),
    looseCount: order.progress.bent,
    handOffs: await listHandOffs(db, orderId),
  }
}

const handOffRowSchema = z.object({
  id: z.uuid(),
  at: z.date(),
  receivedBy: z.string(),
  handedBy: z.string(),
  bundleCodes: z.array(z.string()),
  signature: signatureSchema,
})

/** Latest first, each with the bundles it still stands for: a returned one is no longer named. */
async function listHandOffs(db: Db, orderId: string): Promise<HandOff[]> {
  const rows = await readRows(
    db,
    handOffRowSchema,
    `select h.id, h.at, h.received_by as "receivedBy", person.name as "handedBy",
       array(select code from bundles where hand_off_id = h.id order by number) as "bundleCodes",
       h.signature
     from hand_offs h
     join people person on person.id = h.handed_by
     where h.order_id = :orderId
     order by h.at desc, h.id`,
    { orderId },
  )
  return rows.map(({ at, ...handOff }) => ({ ...handOff, at: at.toISOString() }))
}
