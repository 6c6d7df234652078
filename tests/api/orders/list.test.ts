import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { encodeCursor } from '#server/http/cursor'
import { listOrders } from '#shared/orders/orders.contract'
import { orderSchema, type Order } from '#shared/orders/order.schema'
import { openShop, type Shop } from '../../support/shop-scene'

let shop: Shop
/** Four of the crew, the oldest first, then one of the other crew. */
let orders: Order[]
let foreign: Order

beforeAll(async () => {
  shop = await openShop()
  await shop.db('companies').where({ id: shop.crew.companyId }).update({ name: 'Gable & Sons' })
  await shop.db('jobs').where({ id: shop.crew.jobId }).update({ name: 'Mill 100% dry' })
  orders = []
  for (const poNumber of ['PO_1', 'POX1', '50%', '']) {
    orders.push(await shop.submit(undefined, { poNumber }))
  }
  foreign = await shop.submit(undefined, { poNumber: 'PO_1' }, shop.otherCrew)
})
afterAll(() => shop.close())

const find = async (query: { search?: string; states?: string; jobId?: string }) =>
  (await shop.counter.call(listOrders, { query })).items.map(({ number }) => number)
const numbers = (...listed: (Order | undefined)[]) => listed.map((order) => order?.number)

describe('The list of orders', () => {
  it('shows the shop every order, the newest first', async () => {
    expect(await find({})).toEqual(numbers(foreign, ...orders.toReversed()))
  })

  it('shows a crew lead the orders of the own company only', async () => {
    const own = await shop.crew.agent.call(listOrders)
    expect(own.items.map(({ number }) => number)).toEqual(numbers(...orders.toReversed()))
    const searched = await shop.crew.agent.call(listOrders, {
      query: { search: String(foreign.number) },
    })
    expect(searched.items).toEqual([])
    const ofForeignJob = await shop.crew.agent.call(listOrders, {
      query: { jobId: shop.otherCrew.jobId },
    })
    expect(ofForeignJob.items).toEqual([])
  })

  it('gives each order exactly once over its pages, also when one is submitted in between', async () => {
    const seen: number[] = []
    let after: string | undefined
    for (let page = 0; page < 4; page += 1) {
      const answer = await shop.crew.agent.call(listOrders, { query: { limit: 2, after } })
      seen.push(...answer.items.map(({ number }) => number))
      if (page === 0) orders.push(await shop.submit())
      if (answer.next === null) break
      after = answer.next
    }
    expect(seen).toEqual(numbers(...orders.slice(0, 4).toReversed()))
  })

  it.each([
    ['cut short', (cursor: string) => cursor.slice(0, -1)],
    ['padded', (cursor: string) => `${cursor}=`],
    ['made up', () => 'not-a-cursor'],
    ['another list’s', () => encodeCursor(['2026-01-01T00:00:00Z', 'x'])],
    ['too far for the database', () => encodeCursor(Number.MAX_VALUE)],
    ['empty', () => ''],
  ])('refuses a cursor that is %s, naming `after`', async (_what, tamper) => {
    const { next } = await shop.crew.agent.call(listOrders, { query: { limit: 2 } })
    const after = encodeURIComponent(tamper(next ?? ''))
    const answer = await shop.crew.agent.get(`/orders?after=${after}`)
    expect(answer.status).toBe(400)
    expect(answer.problem().errors).toMatchObject([{ path: 'after' }])
  })

  it('finds an order by its number, with or without the F and in part', async () => {
    const wanted = orders[1]
    const number = String(wanted?.number)
    for (const search of [number, `F-${number}`, `f-${number}`, `F${number}`, ` ${number} `]) {
      expect([search, await find({ search })]).toEqual([search, numbers(wanted)])
    }
    expect(await find({ search: `F-${number.slice(0, 3)}` })).toContain(wanted?.number)
  })

  it('finds orders by company, job, person and purchase-order number', async () => {
    expect(await find({ search: 'gable & s' })).toEqual(numbers(...orders.toReversed()))
    expect(await find({ search: 'mill 100% d' })).toEqual(numbers(...orders.toReversed()))
    expect(await find({ search: 'bo vall' })).toEqual(numbers(foreign))
    expect(await find({ search: 'pox' })).toEqual(numbers(orders[1]))
  })

  it('takes the wildcards of the database as plain characters', async () => {
    expect(await find({ search: 'PO_1' })).toEqual(numbers(foreign, orders[0]))
    expect(await find({ search: '50%' })).toEqual(numbers(orders[2]))
    expect(await find({ search: '%' })).toEqual(numbers(...orders.toReversed()))
    expect(await find({ search: '\\' })).toEqual([])
  })

  it('keeps to the states asked for, as they are derived', async () => {
    const [first, second] = orders
    if (!first || !second) throw new Error('Two orders are needed.')
    await shop.release(first)
    const asked = await shop.counter.post(`/orders/${second.id}/questions`, {
      version: second.version,
      text: 'Which way up?',
    })
    expect(orderSchema.parse(asked.body).state).toBe('question')
    expect(await find({ states: 'released' })).toEqual(numbers(first))
    expect(await find({ states: 'question,released' })).toEqual(numbers(second, first))
    const unknown = await shop.counter.get('/orders?states=released,lost')
    expect(unknown.status).toBe(400)
    expect(unknown.problem().errors?.[0]?.path).toBe('states.1')
  })

  it('keeps to the job asked for', async () => {
    expect(await find({ jobId: shop.otherCrew.jobId })).toEqual(numbers(foreign))
  })
})
