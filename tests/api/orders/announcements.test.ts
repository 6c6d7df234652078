import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { orderInput } from '../../support/shop-factories'
import { openShop, type Shop } from '../../support/shop-scene'

let shop: Shop
beforeAll(async () => {
  shop = await openShop()
})
afterAll(() => shop.close())

/** What the screens were told while `act` ran. */
async function heardDuring(act: () => Promise<unknown>) {
  const last = await shop.db('live_events').max<{ id: number | null }[]>('id as id').first()
  await act()
  return shop
    .db('live_events')
    .where('id', '>', last?.id ?? 0)
    .orderBy('id')
    .select('topic', 'entity_id', 'company_id', 'audience')
}

const toCrew = (topic: string, entityId: string | null) => ({
  topic,
  entity_id: entityId,
  company_id: shop.crew.companyId,
  audience: 'company',
})

const toShop = (topic: string, entityId: unknown) => ({
  topic,
  entity_id: entityId,
  company_id: null,
  audience: 'shop',
})

describe('What the screens are told of an order', () => {
  it('goes to the shop and to its crew alone', async () => {
    let id = ''
    const heard = await heardDuring(async () => {
      id = (await shop.submit()).id
    })
    expect(heard).toEqual([
      toShop('mails', expect.any(String)),
      toCrew('orders', id),
      toCrew('jobs', shop.crew.jobId),
    ])
  })

  it('names runs to the shop only when an order is released', async () => {
    const order = await shop.submit()
    const heard = await heardDuring(() => shop.release(order))
    expect(heard).toHaveLength(4)
    expect(heard).toContainEqual(toShop('mails', expect.any(String)))
    expect(heard).toContainEqual(toCrew('orders', order.id))
    expect(heard).toContainEqual(toCrew('pieces', null))
    expect(heard).toContainEqual(toShop('runs', null))
  })

  it('is nothing when nothing changed', async () => {
    const order = await shop.submit()
    const heard = await heardDuring(() =>
      shop.crew.agent.put(`/orders/${order.id}`, { ...orderInput([shop.line()]), version: 99 }),
    )
    expect(heard).toEqual([])
  })
})
