import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { StockItemInsert } from '#server/db/tables/stock-items'
import { listStockItems } from '#shared/stock/stock-items.contract'
import { createStock } from '../../support/shop-factories'
import { openShop, type Shop } from '../../support/shop-scene'

let shop: Shop
beforeAll(async () => {
  shop = await openShop()
})
afterAll(() => shop.close())

const coil = (given: Partial<StockItemInsert> = {}): StockItemInsert => ({
  stock_id: shop.stockId,
  kind: 'coil',
  lot: 'LOT-1',
  width: 48,
  length: 3600,
  film: 'painted',
  received_on: '2026-02-03',
  ...given,
})
const add = (...items: StockItemInsert[]) => shop.db('stock_items').insert(items)

describe('What lies in the shop of a stock', () => {
  it('is its coils, sheets and drops, of each the oldest first', async () => {
    const stockId = await createStock(shop.db)
    await add(
      coil({ stock_id: stockId, kind: 'drop', lot: 'D', length: 90, rack_mark: 'D4' }),
      coil({ stock_id: stockId, lot: 'NEW', received_on: '2026-02-10' }),
      coil({ stock_id: stockId, kind: 'sheet', lot: 'S', length: 120, count: 12, film: 'none' }),
      coil({ stock_id: stockId, lot: 'OLD', received_on: '2026-01-10', film: 'bare' }),
      coil({ lot: 'OTHER STOCK' }),
    )
    const { items } = await shop.counter.call(listStockItems, { params: { stockId } })
    expect(items.map(({ kind, lot }) => [kind, lot])).toEqual([
      ['coil', 'OLD'],
      ['coil', 'NEW'],
      ['sheet', 'S'],
      ['drop', 'D'],
    ])
    expect(items[2]).toMatchObject({
      width: 48,
      length: 120,
      count: 12,
      film: 'none',
      rackMark: null,
      receivedOn: '2026-02-03',
    })
    expect(items[3]).toMatchObject({ count: 1, rackMark: 'D4' })
  })

  it('is read by the shop alone', async () => {
    const path = `/stocks/${shop.stockId}/items`
    expect((await shop.crew.agent.get(path)).status).toBe(403)
    for (const role of ['bender', 'counter', 'manager'] as const) {
      const agent = await shop.api.signInAs(role)
      expect((await agent.get(path)).status).toBe(200)
    }
  })

  it('is not found for a stock that is not there', async () => {
    const answer = await shop.counter.get('/stocks/00000000-0000-4000-8000-000000000000/items')
    expect(answer.status).toBe(404)
  })

  it.each([
    ['a coil of two', () => coil({ count: 2 }), 'stock_items_only_sheets_are_stacked'],
    ['a drop without a place', () => coil({ kind: 'drop' }), 'stock_items_drops_have_their_place'],
    ['a coil on a rack', () => coil({ rack_mark: 'D1' }), 'stock_items_drops_have_their_place'],
  ])('never is %s', async (_what, item, constraint) => {
    await expect(add(item())).rejects.toMatchObject({ constraint })
  })
})
