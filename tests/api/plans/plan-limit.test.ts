import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { PLANS_A_MINUTE } from '#server/features/plans/plan-limit'
import { IDEMPOTENCY_KEYS } from '#server/db/tables/idempotency-keys'
import { FakeClock } from '../../support/fake-clock'
import { zProfile } from '../../support/shop-factories'
import { openShop, type Shop } from '../../support/shop-scene'

// From now on: the seconds to wait are reckoned from the time of the machine.
const clock = new FakeClock(new Date())
let shop: Shop
beforeAll(async () => {
  shop = await openShop({ clock })
})
afterAll(() => shop.close())

const ask = (by = shop.crew.agent) =>
  by.post('/plans', { profile: zProfile(), stockId: shop.stockId, pieceLength: 120 })

describe('The plans a person may ask for', () => {
  it('are so many a minute, counted for each person alone', async () => {
    for (let asked = 0; asked < PLANS_A_MINUTE; asked += 1) expect((await ask()).status).toBe(200)
    const refused = await ask()
    expect(refused.status).toBe(429)
    expect(refused.problem().code).toBe('too-many-requests')
    expect(Number(refused.headers.get('retry-after'))).toBeGreaterThan(0)
    expect((await ask(shop.counter)).status).toBe(200)

    clock.moveBy(60_000)
    expect((await ask()).status).toBe(200)
  })

  it('leave nothing behind: asking changes nothing', async () => {
    expect(await shop.db(IDEMPOTENCY_KEYS)).toEqual([])
  })
})
