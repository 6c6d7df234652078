export const PRICE_BOOKS = 'price_books'

export interface PriceBookRow {
  id: number
  /** A PriceBook; parsed with priceBookSchema when read. */
  definition: unknown
  person_id: string
  at: Date
}
/** JSON columns are written as text. Versions are never changed. */
export type PriceBookInsert = Pick<PriceBookRow, 'person_id'> & {
  definition: string
  at?: Date
}
