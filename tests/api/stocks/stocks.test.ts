import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { DEMO_BRAKES } from '#shared/bend-plan/demo-brakes'
import { listBrakes } from '#shared/brakes/brakes.contract'
import { listStocks } from '#shared/stock/stock.contract'
import { createStock } from '../../support/shop-factories'
import { openShop, type Shop } from '../../support/shop-scene'

let shop: Shop
beforeAll(async () => {
  shop = await openShop()
})
afterAll(() => shop.close())

describe('Stocks and brakes', () => {
  it('lists the stocks in the shop’s order with the sheet the kernel asks for', async () => {
    const first = await createStock(shop.db, {
      position: -1,
      metal: 'copper',
      thickness_name: '16 oz',
      color_name: 'Bare',
      color_hex: '#b06a3c',
      painted: false,
      thickness: 0.0216,
      density: 0.322,
      k_source: 'handbookSoft',
      alloy: 'C110',
    })
    const { items } = await shop.crew.agent.call(listStocks)
    expect(items.map(({ id }) => id)).toEqual([first, shop.stockId])
    expect(items[0]).toEqual({
      id: first,
      thicknessName: '16 oz',
      colorName: 'Bare',
      colorHex: '#b06a3c',
      painted: false,
      widestStrip: 48,
      longestPiece: 126,
      sheet: {
        metal: 'copper',
        thickness: 0.0216,
        insideRadius: 0.03,
        kFactor: 0.4,
        density: 0.322,
        springbackPer90: 2,
      },
      kSource: 'handbookSoft',
      paintTBend: null,
      alloy: 'C110',
      calibrations: [],
    })
  })

  it('lists the brakes in the shop’s order, whole', async () => {
    const { items } = await shop.crew.agent.call(listBrakes)
    expect(items.map(({ brake }) => brake)).toEqual(DEMO_BRAKES)
  })

  it('never sends a brake whose definition is broken', async () => {
    const broken = await openShop()
    await broken.db('brakes').update({ definition: JSON.stringify({ name: 'Half a brake' }) })
    const answer = await broken.crew.agent.get('/brakes')
    expect(answer.status).toBe(500)
    expect(JSON.stringify(answer.body)).not.toContain('Half a brake')
    await broken.close()
  })
})
