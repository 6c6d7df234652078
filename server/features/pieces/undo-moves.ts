import type { Db } from '#server/db/knex'
import { BUNDLES, type BundleRow } from '#server/db/tables/bundles'
import { wrongState } from '#server/http/errors'
import type { SignedIn } from '#server/http/signed-in'
import { lockPieces, movePieces } from './move-piece'
import { movedOnConflict } from './piece-conflict'
import { findMovedOn, findPartOfBundle, getUndoable } from './undo.queries'
import { readUndone, type UndoneMove } from './undoable'

/**
 * Takes back moves by new events that name the old ones, all or none; answers the codes of the
 * pieces. An undo cannot be undone: the move is made again instead. Throws `not-found` (unknown
 * event, another company's), `not-allowed` and `wrong-state`.
 */
export async function undoMoves(
  db: Db,
  wish: { readonly eventIds: readonly number[]; readonly reason: string },
  person: SignedIn,
  at?: Date,
): Promise<string[]> {
  const events = await getUndoable(db, [...new Set(wish.eventIds)], person)
  const undone = events.map((event) => readUndone(event, person))

  // Bundles before pieces, each in the order of their ids: the order everywhere.
  const bundles = await lockBundles(db, undone)
  await lockPieces(
    db,
    events.map((event) => event.pieceId),
  )
  const movedOn = await findMovedOn(
    db,
    events.map((event) => event.id),
  )
  if (movedOn !== undefined) throw await movedOnConflict(db, movedOn)

  const cameBack = await bundlesComingBack(db, undone)
  for (const group of groupsOf(undone)) {
    const bundleId = bundleEntered(group[0], bundles)
    await movePieces(db, {
      pieceIds: group.map(({ event }) => event.pieceId),
      from: group[0].from,
      to: group[0].to,
      person,
      station: group[0].station,
      reason: wish.reason,
      undoes: new Map(group.map(({ event }) => [event.pieceId, event.id])),
      ...(bundleId !== undefined && { bundleId }),
      ...(at && { at }),
    })
  }
  await db(BUNDLES).whereIn('id', cameBack).update({ hand_off_id: null })
  return events.map((event) => event.code)
}

async function lockBundles(db: Db, undone: readonly UndoneMove[]): Promise<Map<string, BundleRow>> {
  const rows: BundleRow[] = await db(BUNDLES)
    .whereIn('id', bundleIdsOf(undone))
    .orderBy('id')
    .forNoKeyUpdate()
    .select('*')
  return new Map(rows.map((row) => [row.id, row]))
}

/** Bundles whose hand-off is taken back: each with all its pieces or not at all. */
async function bundlesComingBack(db: Db, undone: readonly UndoneMove[]): Promise<string[]> {
  const returning = undone.filter((move) => move.from === 'pickedUp')
  const bundleIds = bundleIdsOf(returning)
  const part = await findPartOfBundle(
    db,
    bundleIds,
    returning.map(({ event }) => event.pieceId),
  )
  if (part !== undefined) {
    throw wrongState(`Bundle ${part} was handed over whole. Undo it with all its pieces.`)
  }
  return bundleIds
}

/** The bundle that an opened-up piece goes back into; it must still lie on the rack. */
function bundleEntered(
  { event, from, to }: UndoneMove,
  bundles: ReadonlyMap<string, BundleRow>,
): string | undefined {
  if (!(from === 'bent' && to === 'bundled')) return undefined
  const bundle = bundles.get(event.bundleId ?? '')
  if (!bundle) throw new Error(`Event ${event.id} does not name the bundle that was opened.`)
  if (bundle.hand_off_id !== null) {
    throw wrongState(`Bundle ${bundle.code} has left, so ${event.code} cannot go back into it.`)
  }
  return bundle.id
}

/** Moves that can be made together: of the same states and the same bundle. */
function groupsOf(undone: readonly UndoneMove[]): [UndoneMove, ...UndoneMove[]][] {
  const groups = new Map<string, [UndoneMove, ...UndoneMove[]]>()
  for (const move of undone) {
    const key = [move.from, move.to, move.event.bundleId].join(' ')
    const group = groups.get(key)
    if (group) group.push(move)
    else groups.set(key, [move])
  }
  return [...groups.values()]
}

const bundleIdsOf = (undone: readonly UndoneMove[]): string[] => [
  ...new Set(undone.flatMap(({ event }) => event.bundleId ?? [])),
]
