import type { Db } from '#server/db/knex'
import type { CodeKind } from '#shared/pieces/codes'
import type { MakingPorts } from './making-ports'

const TABLES = { piece: 'pieces', bundle: 'bundles', run: 'runs', slip: 'slips' } as const

/**
 * A new code that no label bears yet: drawn and looked up. Should another transaction draw the same
 * one meanwhile, the unique constraint refuses it.
 */
export async function freshCode(
  db: Db,
  kind: CodeKind,
  { drawCode }: Pick<MakingPorts, 'drawCode'>,
): Promise<string> {
  for (;;) {
    const code = drawCode(kind)
    const taken = await db(TABLES[kind]).where({ code }).first('code')
    if (!taken) return code
  }
}
