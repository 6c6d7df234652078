import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Order } from '#shared/orders/order.schema'
import { openShop, type Shop } from '../../support/shop-scene'

let shop: Shop
let order: Order
beforeAll(async () => {
  shop = await openShop()
  order = await shop.release(await shop.submit())
})
afterAll(() => shop.close())

const lineRow = () => ({
  order_id: order.id,
  position: 2,
  mark: 'B',
  name: 'Late',
  profile: JSON.stringify(order.lines[0]?.profile),
  stock_id: shop.stockId,
  quantity: 1,
  length: 12,
})

describe('The database itself', () => {
  it('refuses to change, remove or add a line of a released order', async () => {
    const lines = () => shop.db('order_lines').where({ order_id: order.id })
    await expect(lines().update({ quantity: 1 })).rejects.toMatchObject({ code: 'FY005' })
    await expect(lines().update({ frozen: null })).rejects.toMatchObject({ code: 'FY005' })
    await expect(lines().delete()).rejects.toMatchObject({ code: 'FY005' })
    await expect(shop.db('order_lines').insert(lineRow())).rejects.toMatchObject({ code: 'FY005' })
    expect(await shop.readOrder(order.id)).toEqual(order)
  })

  it('lets the lines of an order that is not released be changed', async () => {
    const open = await shop.submit()
    const changed = await shop
      .db('order_lines')
      .where({ order_id: open.id })
      .update({ quantity: 1 })
    expect(changed).toBe(1)
  })

  it('refuses to change or remove what happened to an order', async () => {
    const events = () => shop.db('order_events').where({ order_id: order.id })
    await expect(events().update({ text: 'Never said' })).rejects.toMatchObject({ code: 'FY004' })
    await expect(events().delete()).rejects.toMatchObject({ code: 'FY004' })
    await expect(shop.db.raw('truncate order_events')).rejects.toMatchObject({ code: 'FY004' })
    expect((await shop.readOrder(order.id)).events).toEqual(order.events)
  })

  it('refuses to release an order that was withdrawn', async () => {
    const withdrawn = await shop.submit()
    await shop.crew.agent.post(`/orders/${withdrawn.id}/withdrawal`, {
      version: withdrawn.version,
      reason: 'Not needed',
    })
    await expect(
      shop.db('orders').where({ id: withdrawn.id }).update({ released_at: new Date() }),
    ).rejects.toMatchObject({ constraint: 'orders_one_end' })
  })
})
