import type { z } from 'zod'
import { invalidField } from '#server/http/errors'

/** Packs the sort key of a page's last row; opaque to the client. */
export const encodeCursor = (key: unknown): string =>
  Buffer.from(JSON.stringify(key), 'utf8').toString('base64url')

/**
 * The sort key that `encodeCursor` packed, null for the first page.
 *
 * @throws invalid-input naming `after` for anything else
 */
export function decodeCursor<Key>(after: string | undefined, schema: z.ZodType<Key>): Key | null {
  if (after === undefined) return null
  const parsed = schema.safeParse(unpack(after))
  if (parsed.success && encodeCursor(parsed.data) === after) return parsed.data
  throw invalidField('after', 'This is no cursor of this list. Take `next` of the page before.')
}

function unpack(text: string): unknown {
  try {
    return JSON.parse(Buffer.from(text, 'base64url').toString('utf8'))
  } catch (error) {
    if (error instanceof SyntaxError) return undefined
    throw error
  }
}

/** Splits `limit + 1` rows into a page and the cursor of the next one. */
export function toPage<Row, Item>(
  rows: readonly Row[],
  limit: number,
  toItem: (row: Row) => Item,
  keyOf: (row: Row) => unknown,
): { items: Item[]; next: string | null } {
  const page = rows.slice(0, limit)
  const last = page.at(-1)
  const next = rows.length > limit && last !== undefined ? encodeCursor(keyOf(last)) : null
  return { items: page.map(toItem), next }
}
