import { z } from 'zod'
import { endpoint } from '#shared/http/endpoint'
import { daySchema, idParams } from '#shared/http/fields'

export const STOCK_ITEM_KINDS = ['coil', 'sheet', 'drop'] as const
/** The face that the protective film lies on. */
export const FILMS = ['none', 'painted', 'bare'] as const

/** A coil, a stack of sheets of one size, or a drop. Inches. */
export const stockItemSchema = z.strictObject({
  id: z.uuid(),
  kind: z.enum(STOCK_ITEM_KINDS),
  /** As the mill marks it: color and temper differ a little from lot to lot. */
  lot: z.string(),
  width: z.number().positive(),
  /** What is left on a coil; of one sheet or drop else. */
  length: z.number().positive(),
  /** Sheets of this size; 1 for a coil or a drop. */
  count: z.int().positive(),
  film: z.enum(FILMS),
  /** The mark of the rack on which a drop lies; null for coils and sheets. */
  rackMark: z.string().nullable(),
  receivedOn: daySchema,
})

export const listStockItems = endpoint({
  method: 'GET',
  path: '/stocks/:stockId/items',
  permission: 'stockItems.read',
  summary: 'What lies in the shop of a stock: coils, sheets and drops, the oldest first.',
  params: idParams('stockId'),
  answer: z.strictObject({ items: z.array(stockItemSchema) }),
})

export type Film = (typeof FILMS)[number]
export type StockItemKind = (typeof STOCK_ITEM_KINDS)[number]
export type StockItem = z.infer<typeof stockItemSchema>
