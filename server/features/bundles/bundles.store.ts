import type { Db } from '#server/db/knex'
import {
  BUNDLES,
  type BundleInsert,
  type BundleRow,
  type BundleUpdate,
} from '#server/db/tables/bundles'
import { ORDERS } from '#server/db/tables/orders'
import { PIECES, type PieceRow } from '#server/db/tables/pieces'

/**
 * Locks an order until the transaction ends: bundling, handing over and returning of one order come
 * one after another. Locks are taken in the order order, bundles, pieces, everywhere.
 */
export async function lockOrder(db: Db, id: string): Promise<boolean> {
  const order = await db(ORDERS).where({ id }).forNoKeyUpdate().first('id')
  return order !== undefined
}

/** Locks bundles, in the order of their ids, and shows them as they are then. */
export async function lockBundles(
  db: Db,
  by: { readonly codes: readonly string[] } | { readonly ids: readonly string[] },
): Promise<BundleRow[]> {
  const query = db(BUNDLES).orderBy('id').forNoKeyUpdate()
  return 'codes' in by
    ? query.whereIn('code', [...by.codes]).select('*')
    : query.whereIn('id', [...by.ids]).select('*')
}

/** The pieces in bundles, locked in the order of their ids. */
export async function lockPiecesIn(db: Db, bundleIds: readonly string[]): Promise<PieceRow[]> {
  return db(PIECES)
    .whereIn('bundle_id', [...bundleIds])
    .orderBy('id')
    .forUpdate()
    .select('*')
}

/** The next number within the order; the order must be locked. */
export async function createBundle(
  db: Db,
  bundle: Omit<BundleInsert, 'number'>,
): Promise<{ id: string }> {
  const last = await db(BUNDLES)
    .where({ order_id: bundle.order_id })
    .orderBy('number', 'desc')
    .first('number')
  const [made] = await db(BUNDLES)
    .insert({ ...bundle, number: (last?.number ?? 0) + 1 })
    .returning('id')
  if (!made) throw new Error('The new bundle has no row.')
  return made
}

export async function updateBundles(
  db: Db,
  ids: readonly string[],
  changes: BundleUpdate,
): Promise<void> {
  await db(BUNDLES)
    .whereIn('id', [...ids])
    .update(changes)
}
