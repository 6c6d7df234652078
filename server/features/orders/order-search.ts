import type { Knex } from 'knex'
import { containing } from '#server/db/like'

/** `F-2047`, `f2047` or `2047`; the first digits are enough. */
const ORDER_NUMBER = /^(?:f-?)?0*([1-9]\d{0,8})$/i

/** Order number, company, job, person or purchase-order number, on the joins of the summaries. */
export function searchOrders(query: Knex.QueryBuilder, search: string): void {
  const pattern = containing(search)
  const digits = ORDER_NUMBER.exec(search)?.[1]
  void query.where((any) => {
    for (const column of ['c.name', 'j.name', 'p.name', 'o.po_number']) {
      void any.orWhereILike(column, pattern)
    }
    if (digits !== undefined) void any.orWhereRaw('o.number::text like ?', [`${digits}%`])
  })
}
