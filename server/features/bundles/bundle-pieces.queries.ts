import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { readRows } from '#server/db/read-rows'
import { lineLaySchema, pieceLay } from '#server/features/pieces/piece-lay'
import type { BundlePiece } from '#shared/bundles/bundles.contract'
import { pieceStateSchema } from '#shared/pieces/piece-state'

const pieceRowSchema = lineLaySchema.extend({
  owner: z.uuid(),
  code: z.string(),
  mark: z.string(),
  name: z.string(),
  sequence: z.int(),
  length: z.number(),
  weight: z.number(),
  state: pieceStateSchema,
})

type Owner = 'bundle' | 'order'

const CONDITIONS: Record<Owner, { owner: string; where: string }> = {
  bundle: { owner: 'p.bundle_id', where: 'p.bundle_id = any(:ids)' },
  order: { owner: 'p.order_id', where: `p.order_id = any(:ids) and p.state = 'bent'` },
}

/** The pieces in bundles, or the bent pieces that lie loose of orders, by the id of either. */
export async function mapBundlePieces(
  db: Db,
  of: Owner,
  ids: readonly string[],
): Promise<Map<string, BundlePiece[]>> {
  const { owner, where } = CONDITIONS[of]
  const rows = await readRows(
    db,
    pieceRowSchema,
    `select ${owner} as owner, p.code, l.mark, l.name, p.sequence, l.length, p.state,
       l.ends, l.hands,
       cast(l.frozen ->> 'pieceWeight' as double precision) as weight
     from pieces p join order_lines l on l.id = p.line_id
     where ${where}
     order by l.position, p.sequence`,
    { ids },
  )
  const byOwner = new Map<string, BundlePiece[]>(ids.map((id) => [id, []]))
  for (const { owner: id, ends, hands, ...piece } of rows) {
    const { hand } = pieceLay({ ends, hands }, piece.sequence)
    byOwner.get(id)?.push({ ...piece, hand })
  }
  return byOwner
}
