import type { Db } from '#server/db/knex'
import { HAND_OFFS, type HandOffInsert } from '#server/db/tables/hand-offs'
import { ORDER_EVENTS } from '#server/db/tables/order-events'

/** The record that was signed, and the word of it in the order's events. */
export async function createHandOff(db: Db, handOff: HandOffInsert): Promise<{ id: string }> {
  const [made] = await db(HAND_OFFS).insert(handOff).returning('id')
  if (!made) throw new Error('The new hand-off has no row.')
  await db(ORDER_EVENTS).insert({
    order_id: handOff.order_id,
    kind: 'handedOff',
    person_id: handOff.handed_by,
    text: handOff.received_by,
    ...(handOff.at && { at: handOff.at }),
  })
  return made
}
