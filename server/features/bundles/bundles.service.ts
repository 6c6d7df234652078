import type { Db } from '#server/db/knex'
import type { BundleRow } from '#server/db/tables/bundles'
import type { PieceRow } from '#server/db/tables/pieces'
import type { OrderMails } from '#server/features/mail/order-mails'
import { announceRack } from '#server/features/pieces/announce-moves'
import { freshCode } from '#server/features/pieces/fresh-code'
import { makingPorts, type MakingPorts } from '#server/features/pieces/making-ports'
import { movePieces } from '#server/features/pieces/move-piece'
import { readCode, readCodes } from '#server/features/pieces/read-code'
import { notFound, wrongState } from '#server/http/errors'
import type { SignedIn } from '#server/http/signed-in'
import type {
  Bundle,
  BundleWork,
  createBundle,
  moveBundle,
  openBundle,
} from '#shared/bundles/bundles.contract'
import type { BodyOf } from '#shared/http/endpoint'
import { orderNumber } from '#shared/orders/order.schema'
import { goneConflict } from './bundle-conflict'
import { getBundle, listBundleWork, listRackBundles } from './bundles.queries'
import * as store from './bundles.store'

export interface BundlesService {
  readonly getRack: () => Promise<{ work: BundleWork[]; bundles: Bundle[] }>
  readonly getBundle: (code: string) => Promise<Bundle>
  /** Throws `not-found`, `wrong-state` (a piece of another order, or one that is not bent). */
  readonly createBundle: (wish: BodyOf<typeof createBundle>, person: SignedIn) => Promise<Bundle>
  /** Throws `wrong-state` when it has left. */
  readonly moveBundle: (id: string, wish: BodyOf<typeof moveBundle>) => Promise<Bundle>
  /** Throws `wrong-state` when it has left or a piece is not in it. */
  readonly openBundle: (
    id: string,
    wish: BodyOf<typeof openBundle>,
    person: SignedIn,
  ) => Promise<Bundle>
}

export const createBundlesService = (
  db: Db,
  mails: Pick<OrderMails, 'bundled'>,
  ports: MakingPorts = makingPorts,
): BundlesService => ({
  getRack: async () => ({ work: await listBundleWork(db), bundles: await listRackBundles(db) }),

  getBundle: (code) => getBundle(db, { code: readCode(code, 'bundle') }),

  createBundle: async ({ orderId, pieceCodes, rackPlace }, person) => {
    const codes = readCodes(pieceCodes, 'piece', 'pieceCodes')
    if (!(await store.lockOrder(db, orderId))) throw notFound('order')
    const pieces = await getPiecesOf(db, orderId, codes)
    const at = ports.clock?.now()
    const bundle = await store.createBundle(db, {
      code: await freshCode(db, 'bundle', ports),
      order_id: orderId,
      rack_place: rackPlace,
      created_by: person.id,
      ...(at && { created_at: at }),
    })
    await movePieces(db, {
      pieceIds: pieces.map((piece) => piece.id),
      from: 'bent',
      to: 'bundled',
      person,
      station: 'rack',
      bundleId: bundle.id,
      at,
    })
    await mails.bundled(orderId)
    return getBundle(db, bundle)
  },

  moveBundle: async (id, { rackPlace }) => {
    await getLockedHere(db, id)
    await store.updateBundles(db, [id], { rack_place: rackPlace })
    await announceRack(db)
    return getBundle(db, { id })
  },

  openBundle: async (id, { pieceCodes, reason }, person) => {
    const codes = pieceCodes && readCodes(pieceCodes, 'piece', 'pieceCodes')
    const bundle = await getLockedHere(db, id)
    const inside = await store.lockPiecesIn(db, [id])
    const taken = codes ? codes.map((code) => getInside(bundle, inside, code)) : inside
    if (taken.length === 0) throw wrongState(`Bundle ${bundle.code} is empty already.`)
    await movePieces(db, {
      pieceIds: taken.map((piece) => piece.id),
      from: 'bundled',
      to: 'bent',
      person,
      station: 'rack',
      reason,
      at: ports.clock?.now(),
    })
    return getBundle(db, { id })
  },
})

/** The pieces with these codes; all must be of the order. */
async function getPiecesOf(
  db: Db,
  orderId: string,
  codes: readonly string[],
): Promise<{ id: string }[]> {
  const rows = await db('pieces as p')
    .join('orders as o', 'o.id', 'p.order_id')
    .whereIn('p.code', [...codes])
    .select<{ id: string; code: string; order_id: string; number: number }[]>(
      'p.id',
      'p.code',
      'p.order_id',
      'o.number',
    )
  return codes.map((code) => {
    const piece = rows.find((row) => row.code === code)
    if (!piece) throw notFound(`piece as ${code}`)
    if (piece.order_id !== orderId) {
      throw wrongState(
        `${code} belongs to order ${orderNumber(piece.number)}. A bundle holds pieces of one order only.`,
        { code, orderId: piece.order_id, orderNumber: piece.number },
      )
    }
    return piece
  })
}

/** The bundle, locked; it must not have left. */
async function getLockedHere(db: Db, id: string): Promise<BundleRow> {
  const [bundle] = await store.lockBundles(db, { ids: [id] })
  if (!bundle) throw notFound('bundle')
  if (bundle.hand_off_id !== null) throw await goneConflict(db, id)
  return bundle
}

function getInside(bundle: BundleRow, inside: readonly PieceRow[], code: string): PieceRow {
  const piece = inside.find((candidate) => candidate.code === code)
  if (!piece) throw wrongState(`${code} is not in bundle ${bundle.code}.`, { code })
  return piece
}
