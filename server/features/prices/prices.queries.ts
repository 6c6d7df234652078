import type { Db } from '#server/db/knex'
import type { PriceBookRow } from '#server/db/tables/price-books'
import { priceBookSchema, type PriceBook } from '#shared/pricing/price-book.schema'
import type { PriceBookVersion } from '#shared/pricing/pricing.contract'

export const createPricesQueries = (db: Db) => {
  const findVersion = async (): Promise<PriceBookVersion | null> => {
    const row = await db('price_books as b')
      .join('people as p', 'p.id', 'b.person_id')
      .orderBy('b.id', 'desc')
      .select<(Pick<PriceBookRow, 'id' | 'definition' | 'at'> & { by: string })[]>(
        'b.id',
        'b.definition',
        'b.at',
        'p.name as by',
      )
      .first()
    if (!row) return null
    const { id, definition, at, by } = row
    return { id, by, at: at.toISOString(), book: priceBookSchema.parse(definition) }
  }

  return {
    /** The newest version; null while the shop has no price book. */
    findVersion,

    findBook: async (): Promise<PriceBook | null> => (await findVersion())?.book ?? null,
  }
}

export type PricesQueries = ReturnType<typeof createPricesQueries>
