import type { Db } from '#server/db/knex'
import { BUNDLES, type BundleRow } from '#server/db/tables/bundles'
import { goneConflict } from '#server/features/bundles/bundle-conflict'
import {
  lockBundles,
  lockOrder,
  lockPiecesIn,
  updateBundles,
} from '#server/features/bundles/bundles.store'
import { makingPorts, type MakingPorts } from '#server/features/pieces/making-ports'
import { movePieces } from '#server/features/pieces/move-piece'
import { readCodes } from '#server/features/pieces/read-code'
import { notFound, wrongState } from '#server/http/errors'
import type { SignedIn } from '#server/http/signed-in'
import type { handOff, HandOffSheet } from '#shared/hand-off/hand-off.contract'
import type { BodyOf } from '#shared/http/endpoint'
import { getHandOffSheet } from './hand-off.queries'
import { createHandOff } from './hand-off.store'

export interface HandOffService {
  readonly getHandOffSheet: (orderId: string) => Promise<HandOffSheet>
  /** Throws `not-found`, `wrong-state` (gone already, another order's, empty). */
  readonly handOff: (
    orderId: string,
    wish: BodyOf<typeof handOff>,
    person: SignedIn,
  ) => Promise<HandOffSheet>
  /** Throws `wrong-state` when the bundle lies on the rack. */
  readonly returnBundle: (
    bundleId: string,
    reason: string,
    person: SignedIn,
  ) => Promise<HandOffSheet>
}

export const createHandOffService = (db: Db, ports: MakingPorts = makingPorts): HandOffService => ({
  getHandOffSheet: (orderId) => getHandOffSheet(db, orderId),

  handOff: async (orderId, { bundleCodes, receivedBy, signature }, person) => {
    const codes = readCodes(bundleCodes, 'bundle', 'bundleCodes')
    if (!(await lockOrder(db, orderId))) throw notFound('order')
    const bundles = await getLockedOf(db, orderId, codes)
    const bundleIds = bundles.map((bundle) => bundle.id)
    const pieces = await lockPiecesIn(db, bundleIds)
    const empty = bundles.find((bundle) => pieces.every((piece) => piece.bundle_id !== bundle.id))
    if (empty) throw wrongState(`Bundle ${empty.code} is empty: there is nothing to hand over.`)

    const at = ports.clock?.now()
    const made = await createHandOff(db, {
      order_id: orderId,
      received_by: receivedBy,
      handed_by: person.id,
      signature: JSON.stringify(signature),
      ...(at && { at }),
    })
    await movePieces(db, {
      pieceIds: pieces.map((piece) => piece.id),
      from: 'bundled',
      to: 'pickedUp',
      person,
      station: 'counter',
      at,
    })
    await updateBundles(db, bundleIds, { hand_off_id: made.id })
    return getHandOffSheet(db, orderId)
  },

  returnBundle: async (bundleId, reason, person) => {
    const found = await db(BUNDLES).where({ id: bundleId }).first('order_id')
    if (!found || !(await lockOrder(db, found.order_id))) throw notFound('bundle')
    const [bundle] = await lockBundles(db, { ids: [bundleId] })
    if (!bundle) throw notFound('bundle')
    if (bundle.hand_off_id === null) {
      throw wrongState(`Bundle ${bundle.code} lies on the rack at ${bundle.rack_place} already.`)
    }
    const pieces = await lockPiecesIn(db, [bundleId])
    await movePieces(db, {
      pieceIds: pieces.map((piece) => piece.id),
      from: 'pickedUp',
      to: 'bundled',
      person,
      station: 'counter',
      reason,
      at: ports.clock?.now(),
    })
    await updateBundles(db, [bundleId], { hand_off_id: null })
    return getHandOffSheet(db, found.order_id)
  },
})

/** The bundles with these codes, locked; all must be of the order and still here. */
async function getLockedOf(
  db: Db,
  orderId: string,
  codes: readonly string[],
): Promise<BundleRow[]> {
  const bundles = await lockBundles(db, { codes })
  const unknown = codes.find((code) => bundles.every((bundle) => bundle.code !== code))
  if (unknown !== undefined) throw notFound(`bundle as ${unknown}`)
  const stray = bundles.find((bundle) => bundle.order_id !== orderId)
  if (stray) {
    throw wrongState(`Bundle ${stray.code} belongs to another order.`, {
      code: stray.code,
      orderId: stray.order_id,
    })
  }
  const gone = bundles.find((bundle) => bundle.hand_off_id !== null)
  if (gone) throw await goneConflict(db, gone.id)
  return bundles
}
