import type { Db } from '#server/db/knex'
import { BUNDLES } from '#server/db/tables/bundles'
import { SLIPS } from '#server/db/tables/mails'
import { PIECES } from '#server/db/tables/pieces'
import { RUNS } from '#server/db/tables/runs'
import { notFound } from '#server/http/errors'
import type { CodeKind } from '#shared/pieces/codes'
import type { ResolvedCode } from '#shared/pieces/lookup.contract'

type Find = (db: Db, code: string) => Promise<ResolvedCode | undefined>

const FIND: Record<CodeKind, Find> = {
  piece: async (db, code) => {
    const piece = await db(PIECES).where({ code }).first('state', 'run_id', 'order_id')
    if (!piece) return undefined
    return { kind: 'piece', code, state: piece.state, runId: piece.run_id, orderId: piece.order_id }
  },
  bundle: async (db, code) => {
    const bundle = await db(BUNDLES).where({ code }).first('id', 'order_id')
    return bundle && { kind: 'bundle', code, bundleId: bundle.id, orderId: bundle.order_id }
  },
  run: async (db, code) => {
    const run = await db(RUNS).where({ code }).first('id')
    return run && { kind: 'run', code, runId: run.id }
  },
  slip: async (db, code) => {
    const slip = await db(SLIPS).where({ code }).first('order_id')
    return slip && { kind: 'slip', code, orderId: slip.order_id }
  },
}

/** What a good code stands for; throws `not-found` when no label was printed with it. */
export async function getResolvedCode(
  db: Db,
  { code, kind }: { readonly code: string; readonly kind: CodeKind },
): Promise<ResolvedCode> {
  const found = await FIND[kind](db, code)
  if (!found) throw notFound(kind)
  return found
}
