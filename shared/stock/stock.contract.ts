import { z } from 'zod'
import { endpoint } from '#shared/http/endpoint'
import { stockSchema } from '#shared/stock/stock.schema'

export const listStocks = endpoint({
  method: 'GET',
  path: '/stocks',
  permission: 'stocks.read',
  summary: 'The stocks the shop sells.',
  answer: z.strictObject({ items: z.array(stockSchema) }),
})
