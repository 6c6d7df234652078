import { z } from 'zod'

/** Keyset paging: `after` is the opaque cursor of the last answer, absent for the first page. */
export const pageQuery = {
  after: z.string().max(200).optional(),
  limit: z.coerce.number().int().min(1).max(100).default(25),
}

export const pageOf = <Item extends z.ZodType>(item: Item) =>
  z.strictObject({
    items: z.array(item),
    /** Pass as `after` for the next page; null at the end. */
    next: z.string().nullable(),
  })
