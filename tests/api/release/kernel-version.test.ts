import { afterAll, afterEach, beforeAll, describe, expect, it, vi } from 'vitest'
import { PLAN_CACHE } from '#server/db/tables/plan-cache'
import { KERNEL_VERSION } from '#server/planning/kernel-version'
import type { Order } from '#shared/orders/order.schema'
import { openShop, type Shop } from '../../support/shop-scene'

const MODULE = '#server/planning/kernel-version'

let shop: Shop
let order: Order
beforeAll(async () => {
  shop = await openShop()
  order = await shop.release(await shop.submit())
})
afterAll(() => shop.close())
afterEach(() => {
  vi.doUnmock(MODULE)
  vi.resetModules()
})

/** The same database under the server of a later kernel. */
async function startLater() {
  vi.resetModules()
  vi.doMock(MODULE, () => ({ KERNEL_VERSION: KERNEL_VERSION + 1 }))
  const { startApi } = await import('../../support/api-app')
  return startApi({ sharing: shop.api })
}

/** What is frozen, as the database holds it. */
const frozen = async () => ({
  lines: await shop.db
    .raw<{ rows: unknown[] }>('select id, frozen::text from order_lines order by id')
    .then(({ rows }) => rows),
  runs: await shop.db
    .raw<{ rows: unknown[] }>(
      'select id, plan::text, strip::text, brake::text from runs order by id',
    )
    .then(({ rows }) => rows),
})

describe('When the kernel gives other answers', () => {
  it('what is released stays to the byte, and is read from nothing but what was frozen', async () => {
    const before = await frozen()
    // A cache that lies, and no version that fits.
    await shop.db.raw(`update plan_cache set plan = jsonb_set(plan, '{steps}', '[]')`)
    const later = await startLater()
    try {
      const agent = await later.signInAs(shop.clerk)
      expect((await agent.get(`/orders/${order.id}`)).body).toEqual(order)
      const [run] = await shop.db('runs').where({ order_id: order.id })
      const bender = await later.signInAs('bender')
      expect((await bender.get(`/runs/${run?.id ?? ''}`)).body).toMatchObject({ plan: run?.plan })
    } finally {
      await later.close()
    }
    expect(await frozen()).toEqual(before)
  })

  it('what is not released is planned anew, under keys of its own', async () => {
    const open = await shop.submit()
    const kept = await shop.db(PLAN_CACHE)
    const later = await startLater()
    try {
      const agent = await later.signInAs(shop.clerk)
      expect((await agent.get(`/orders/${open.id}`)).body).toEqual(open)
    } finally {
      await later.close()
    }
    const hashes = kept.map(({ hash }) => hash)
    expect(await shop.db(PLAN_CACHE).whereNotIn('hash', hashes)).toHaveLength(3)
    expect(await shop.db(PLAN_CACHE).whereIn('hash', hashes)).toEqual(kept)
  })
})
