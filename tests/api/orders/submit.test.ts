import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { listOrders, submitOrder } from '#shared/orders/orders.contract'
import { orderSchema } from '#shared/orders/order.schema'
import { pitchAngle } from '#shared/units/angle'
import { getStarter } from '#shared/profile/starters'
import { FakeClock } from '../../support/fake-clock'
import { orderInput, zProfile } from '../../support/shop-factories'
import { openShop, type Shop } from '../../support/shop-scene'

/** The evening of the 9th in Denver, the 10th already in UTC. */
const EVENING = new Date('2026-03-10T03:00:00Z')

let shop: Shop
beforeAll(async () => {
  shop = await openShop({
    clock: new FakeClock(EVENING),
    environment: { SHOP_TIME_ZONE: 'America/Denver' },
  })
})
afterAll(() => shop.close())

const body = (...lines: Parameters<Shop['line']>) => ({
  ...orderInput([shop.line(...lines)]),
  jobId: shop.crew.jobId,
})
const countOrders = async () =>
  (await shop.counter.call(listOrders, { query: { limit: 100 } })).items.length

describe('Submitting an order', () => {
  it('answers with the order as the shop will see it', async () => {
    const order = await shop.submit([shop.line({ mark: 'N rake', quantity: 4 })], {
      poNumber: 'PO-77',
      notes: 'Call before noon',
    })
    expect(order).toMatchObject({
      company: { id: shop.crew.companyId },
      job: { id: shop.crew.jobId, pitchRise: 6 },
      orderedBy: 'Ada Ridge',
      poNumber: 'PO-77',
      notes: 'Call before noon',
      submittedAt: EVENING.toISOString(),
      state: 'submitted',
      pieceCount: 4,
      version: 1,
    })
    expect(order.progress.queued).toBe(0)
    expect(order.events).toMatchObject([{ kind: 'submitted', by: 'Ada Ridge' }])
    expect(order.lines).toMatchObject([
      {
        position: 1,
        mark: 'N rake',
        bendsOn: ['Ten-six folder', 'Two-way folder', 'Site brake'],
        pieces: [],
      },
    ])
  })

  it('makes one order of a request that is sent again with the same key', async () => {
    const before = await countOrders()
    const idempotencyKey = randomUUID()
    const first = await shop.crew.agent.post('/orders', body(), { idempotencyKey })
    const again = await shop.crew.agent.post('/orders', body(), { idempotencyKey })
    expect(first.status).toBe(201)
    expect(again.status).toBe(201)
    expect(again.body).toEqual(first.body)
    expect(await countOrders()).toBe(before + 1)
  })

  it('makes one order of six requests with the same key at the same time', async () => {
    const before = await countOrders()
    const idempotencyKey = randomUUID()
    const answers = await Promise.all(
      Array.from({ length: 6 }, () => shop.crew.agent.post('/orders', body(), { idempotencyKey })),
    )
    expect(answers.map(({ status }) => status)).toEqual(Array(6).fill(201))
    expect(new Set(answers.map((answer) => orderSchema.parse(answer.body).id)).size).toBe(1)
    expect(await countOrders()).toBe(before + 1)
  })

  it('makes two orders of the same request under two keys', async () => {
    const before = await countOrders()
    await shop.crew.agent.post('/orders', body())
    await shop.crew.agent.post('/orders', body())
    expect(await countOrders()).toBe(before + 2)
  })

  it('gives bends that follow the roof the turn of the job’s pitch', async () => {
    await shop.db('jobs').where({ id: shop.crew.jobId }).update({ pitch_rise: 9 })
    const { profile } = getStarter('headwall')
    const order = await shop.submit([shop.line({ profile })])
    await shop.db('jobs').where({ id: shop.crew.jobId }).update({ pitch_rise: 6 })
    // Plane geometry: a headwall bend opens to 90° plus the slope.
    expect(order.lines[0]?.profile.bends[1]?.turn).toBeCloseTo(90 - pitchAngle(9), 9)
    expect(order.lines[0]?.profile.bends[0]).toEqual(profile.bends[0])
    expect(order.job.pitchRise).toBe(9)
  })

  it('belongs to the company of the job when the counter submits it for a crew', async () => {
    const order = await shop.counter.call(submitOrder, { body: body() })
    expect(order.company.id).toBe(shop.crew.companyId)
    expect(order.orderedBy).toBe('Cy Counter')
  })

  it('refuses a job of another company as if it did not exist', async () => {
    const foreign = await shop.crew.agent.post('/orders', {
      ...body(),
      jobId: shop.otherCrew.jobId,
    })
    const unknown = await shop.crew.agent.post('/orders', { ...body(), jobId: randomUUID() })
    expect(foreign.status).toBe(404)
    expect(foreign.problem().detail).toBe(unknown.problem().detail)
  })

  it('takes today by the day of the shop, and not yesterday', async () => {
    const today = await shop.crew.agent.post('/orders', { ...body(), neededBy: '2026-03-09' })
    expect(today.status).toBe(201)
    const yesterday = await shop.crew.agent.post('/orders', { ...body(), neededBy: '2026-03-08' })
    expect(yesterday.status).toBe(400)
    expect(yesterday.problem().errors).toMatchObject([{ path: 'neededBy' }])
  })

  it('names every mark, stock and length that is wrong at once', async () => {
    const lines = [
      shop.line({ mark: 'A' }),
      shop.line({ mark: 'a' }),
      shop.line({ mark: 'B', stockId: randomUUID() }),
      shop.line({ mark: 'C', length: 126.5 }),
    ]
    const answer = await shop.crew.agent.post('/orders', {
      ...orderInput(lines),
      jobId: shop.crew.jobId,
    })
    expect(answer.status).toBe(400)
    expect(answer.problem().errors?.map(({ path }) => path)).toEqual([
      'lines.1.mark',
      'lines.2.stockId',
      'lines.3.length',
    ])
  })

  it('names legs, bends and hems that cannot be made, by line and code', async () => {
    const z = zProfile()
    const lines = [
      shop.line({ mark: 'A' }),
      shop.line({ mark: 'B', profile: { ...z, legs: [1.25, -2, 1.25] } }),
      shop.line({ mark: 'C', profile: { ...z, bends: [{ turn: 90 }, { turn: 180 }] } }),
      shop.line({
        mark: 'D',
        profile: { ...z, hemB: { style: 'closed', length: 0.01, turn: 1 } },
      }),
      shop.line({ mark: 'E', profile: { ...z, legs: [20, 20, 15] } }),
    ]
    const answer = await shop.crew.agent.post('/orders', {
      ...orderInput(lines),
      jobId: shop.crew.jobId,
    })
    expect(answer.status).toBe(422)
    const problem = answer.problem()
    expect(problem.code).toBe('profile-problem')
    expect(problem.errors?.map(({ path, code }) => [path, code])).toEqual([
      ['lines.1.profile.legs.1', 'legNotPositive'],
      ['lines.2.profile.bends.1', 'turnOutOfRange'],
      ['lines.3.profile.hemB', 'hemTooShort'],
      ['lines.4.profile', 'stripWiderThanStock'],
    ])
    expect(problem.errors?.[0]?.message).toContain('Leg 2')
  })

  it.each([
    ['a profile that is no object', { profile: 'L-shape' }, 'lines.0.profile'],
    [
      'a leg that is text',
      { profile: { ...zProfile(), legs: ['2', 2, 2] } },
      'lines.0.profile.legs.0',
    ],
    [
      'a bend too few',
      { profile: { ...zProfile(), bends: [{ turn: 90 }] } },
      'lines.0.profile.bends',
    ],
    ['no pieces', { quantity: 0 }, 'lines.0.quantity'],
    ['half a piece', { quantity: 1.5 }, 'lines.0.quantity'],
    ['a length of zero', { length: 0 }, 'lines.0.length'],
    ['an empty mark', { mark: '  ' }, 'lines.0.mark'],
    ['a field nobody knows', { price: 1 }, 'lines.0.price'],
  ])('refuses %s, naming the field', async (_what, wrong, path) => {
    const answer = await shop.crew.agent.post('/orders', {
      ...orderInput([]),
      lines: [{ ...shop.line(), ...wrong }],
      jobId: shop.crew.jobId,
    })
    expect(answer.status).toBe(400)
    expect(answer.problem().errors).toEqual([expect.objectContaining({ path })])
  })

  it('leaves nothing behind when it is refused', async () => {
    const before = await countOrders()
    const lines = [shop.line({ profile: { ...zProfile(), legs: [1, 0, 1] } })]
    await shop.crew.agent.post('/orders', { ...orderInput(lines), jobId: shop.crew.jobId })
    expect(await countOrders()).toBe(before)
  })
})
