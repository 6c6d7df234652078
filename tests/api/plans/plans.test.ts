import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { DEMO_BRAKES } from '#shared/bend-plan/demo-brakes'
import { planProfile } from '#shared/bend-plan/plan-profile'
import { planDrawing } from '#shared/plans/plans.contract'
import { getStarter } from '#shared/profile/starters'
import { listStocks } from '#shared/stock/stock.contract'
import { flatStrip } from '#shared/strip/flat-strip'
import { unbendableProfile, zProfile } from '../../support/shop-factories'
import { openShop, type Shop } from '../../support/shop-scene'

let shop: Shop
beforeAll(async () => {
  shop = await openShop()
})
afterAll(() => shop.close())

const ask = (given: Record<string, unknown> = {}) =>
  shop.crew.agent.post('/plans', {
    profile: zProfile(),
    stockId: shop.stockId,
    pieceLength: 120,
    ...given,
  })

describe('Planning a drawing', () => {
  it('answers what the kernel answers, brake by brake', async () => {
    const { profile } = getStarter('ridge')
    const { items } = await shop.crew.agent.call(listStocks)
    const sheet = items[0]?.sheet
    if (!sheet) throw new Error('The shop has a stock.')
    const answer = await shop.crew.agent.call(planDrawing, {
      body: { profile, stockId: shop.stockId, pieceLength: 120 },
    })
    const strip = flatStrip(profile, sheet)
    expect(answer.strip).toEqual(strip)
    // 0.0239 in. x 0.284 lb/in³ over the strip's area.
    expect(answer.weight).toBeCloseTo(strip.stripWidth * 120 * 0.0239 * 0.284, 9)
    expect(answer.brakes.map(({ brakeName }) => brakeName)).toEqual(
      DEMO_BRAKES.map(({ name }) => name),
    )
    expect(answer.brakes.map(({ plan }) => plan)).toEqual(
      DEMO_BRAKES.map((brake) => planProfile(profile, sheet, brake, 120)),
    )
  })

  it('answers a drawing that bends nowhere with the reasons of each brake', async () => {
    const { brakes } = await shop.crew.agent.call(planDrawing, {
      body: { profile: unbendableProfile(), stockId: shop.stockId, pieceLength: 120 },
    })
    expect(brakes.map(({ plan }) => plan.feasible)).toEqual([false, false, false])
    for (const { plan } of brakes) expect(plan.reasons.length).toBeGreaterThan(0)
  })

  it('refuses a drawing that cannot be made, naming legs and bends by code', async () => {
    const answer = await ask({ profile: { ...zProfile(), legs: [1, 0.02, 1] } })
    expect(answer.status).toBe(422)
    expect(answer.problem()).toMatchObject({
      code: 'profile-problem',
      errors: [{ path: 'profile.legs.1', code: 'legEatenByBends' }],
    })
  })

  it.each([
    ['an unknown stock', { stockId: randomUUID() }, 'stockId'],
    ['a length of zero', { pieceLength: 0 }, 'pieceLength'],
    ['a length beyond any piece', { pieceLength: 601 }, 'pieceLength'],
    ['no profile', { profile: null }, 'profile'],
    ['thirty legs', { profile: { ...zProfile(), legs: Array(30).fill(1) } }, 'profile.legs'],
  ])('refuses %s, naming the field', async (_what, wrong, path) => {
    const answer = await ask(wrong)
    expect(answer.status).toBe(400)
    expect(answer.problem().errors?.map((error) => error.path)).toContain(path)
  })
})
