import type { Db } from '#server/db/knex'
import { newCode } from '#server/features/pieces/new-code'
import type { CodeKind } from '#shared/pieces/codes'

const TABLES = { piece: 'pieces', bundle: 'bundles', run: 'runs' } as const

/**
 * So many new codes that no label bears yet. Drawn at random and looked up; should another
 * transaction draw the same one meanwhile, the unique constraint refuses it.
 */
export async function freshCodes(db: Db, kind: CodeKind, count: number): Promise<string[]> {
  const fresh = new Set<string>()
  while (fresh.size < count) {
    const drawn = Array.from({ length: count - fresh.size }, () => newCode(kind))
    const taken = new Set(await db(TABLES[kind]).whereIn('code', drawn).pluck('code'))
    for (const code of drawn) if (!taken.has(code)) fresh.add(code)
  }
  return [...fresh]
}

export async function freshCode(db: Db, kind: CodeKind): Promise<string> {
  const [code] = await freshCodes(db, kind, 1)
  if (code === undefined) throw new Error('A code was asked for and none was drawn.')
  return code
}
