import type { Db } from '#server/db/knex'
import { SLIPS } from '#server/db/tables/mails'
import { freshCode } from '#server/features/pieces/fresh-code'
import type { MakingPorts } from '#server/features/pieces/making-ports'

/** The code of an order's slip; made the first time it is asked for, and the same ever after. */
export async function slipCodeOf(
  db: Db,
  orderId: string,
  { at, drawCode }: Pick<MakingPorts, 'drawCode'> & { readonly at: Date },
): Promise<string> {
  const found = await findSlipCode(db, orderId)
  if (found !== undefined) return found
  const code = await freshCode(db, 'slip', { drawCode })
  await db(SLIPS).insert({ order_id: orderId, code, created_at: at })
  return code
}

export async function findSlipCode(db: Db, orderId: string): Promise<string | undefined> {
  const slip = await db(SLIPS).where({ order_id: orderId }).first('code')
  return slip?.code
}
