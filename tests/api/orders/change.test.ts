import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { orderSchema, type Order } from '#shared/orders/order.schema'
import { orderInput } from '../../support/shop-factories'
import { openShop, type Shop } from '../../support/shop-scene'

let shop: Shop
beforeAll(async () => {
  shop = await openShop()
})
afterAll(() => shop.close())

const amended = (order: Pick<Order, 'version'>, quantity: number, answer?: string) => ({
  ...orderInput([shop.line({ quantity })]),
  version: order.version,
  ...(answer !== undefined && { answer }),
})
const kinds = (order: Order) => order.events.map(({ kind }) => kind)

describe('Amending an order', () => {
  it('replaces its lines and counts the version up', async () => {
    const order = await shop.submit()
    const answer = await shop.crew.agent.put(`/orders/${order.id}`, {
      ...orderInput(
        [shop.line({ mark: 'X', quantity: 8 }), shop.line({ mark: 'Y', quantity: 1 })],
        {
          poNumber: 'PO-2',
        },
      ),
      version: order.version,
    })
    const now = orderSchema.parse(answer.body)
    expect(now).toMatchObject({ version: 2, poNumber: 'PO-2', pieceCount: 9, state: 'submitted' })
    expect(now.lines.map(({ mark, position }) => [mark, position])).toEqual([
      ['X', 1],
      ['Y', 2],
    ])
    expect(kinds(now)).toEqual(['submitted', 'amended'])
  })

  it('refuses an old version and shows the order as it is now', async () => {
    const order = await shop.submit()
    await shop.crew.agent.put(`/orders/${order.id}`, amended(order, 5))
    const late = await shop.counter.put(`/orders/${order.id}`, amended(order, 7))
    expect(late.status).toBe(409)
    const problem = late.problem()
    expect(problem.code).toBe('changed-meanwhile')
    const current = orderSchema.parse(problem.current)
    expect(current.version).toBe(2)
    expect(current.lines.map(({ quantity }) => quantity)).toEqual([5])
    expect(await shop.readOrder(order.id)).toEqual(current)
  })

  it('lets one of two through who save at the same time, and the other sees the winner', async () => {
    const order = await shop.submit()
    const answers = await Promise.all([
      shop.crew.agent.put(`/orders/${order.id}`, amended(order, 11)),
      shop.counter.put(`/orders/${order.id}`, amended(order, 22)),
    ])
    const statuses = answers.map(({ status }) => status)
    expect(statuses.toSorted()).toEqual([200, 409])
    const winner = statuses[0] === 200 ? 11 : 22
    const loser = answers.find(({ status }) => status === 409)
    expect(orderSchema.parse(loser?.problem().current).lines[0]?.quantity).toBe(winner)
    expect(kinds(await shop.readOrder(order.id))).toEqual(['submitted', 'amended'])
  })

  it('checks the lines anew and changes nothing when they are refused', async () => {
    const order = await shop.submit()
    const answer = await shop.crew.agent.put(`/orders/${order.id}`, {
      ...orderInput([shop.line(), shop.line()]),
      version: order.version,
    })
    expect(answer.status).toBe(400)
    expect(answer.problem().errors).toMatchObject([{ path: 'lines.1.mark' }])
    expect(await shop.readOrder(order.id)).toEqual(order)
  })

  it('lets a day stay that passed while the order waited, but takes no other past day', async () => {
    const order = await shop.submit()
    await shop.db('orders').where({ id: order.id }).update({ needed_by: '2020-01-02' })
    const other = await shop.crew.agent.put(`/orders/${order.id}`, {
      ...amended(order, 2),
      neededBy: '2020-01-03',
    })
    expect(other.problem().errors).toMatchObject([{ path: 'neededBy' }])
    const same = await shop.crew.agent.put(`/orders/${order.id}`, {
      ...amended(order, 2),
      neededBy: '2020-01-02',
    })
    expect(same.status).toBe(200)
  })
})

describe('A question about an order', () => {
  const ask = (order: Order, text = 'Is leg 2 right?') =>
    shop.counter.post(`/orders/${order.id}/questions`, { version: order.version, text })

  it('stays open until the crew answers, and then the order is submitted again', async () => {
    const order = await shop.submit()
    const asked = orderSchema.parse((await ask(order)).body)
    expect(asked).toMatchObject({ state: 'question', version: 2 })
    const answer = await shop.crew.agent.post(`/orders/${order.id}/answers`, {
      version: asked.version,
      text: 'Yes, two inches.',
    })
    const answered = orderSchema.parse(answer.body)
    expect(answered).toMatchObject({ state: 'submitted', version: 3 })
    expect(answered.events.slice(1)).toMatchObject([
      { kind: 'question', by: 'Cy Counter', text: 'Is leg 2 right?' },
      { kind: 'answered', by: 'Ada Ridge', text: 'Yes, two inches.' },
    ])
  })

  it('is answered by amending the order too', async () => {
    const order = await shop.submit()
    const asked = orderSchema.parse((await ask(order)).body)
    const answer = await shop.crew.agent.put(
      `/orders/${order.id}`,
      amended(asked, 6, 'It was wrong, now it is right.'),
    )
    const now = orderSchema.parse(answer.body)
    expect(now).toMatchObject({ state: 'submitted', pieceCount: 6 })
    expect(now.events.at(-1)).toMatchObject({
      kind: 'amended',
      text: 'It was wrong, now it is right.',
    })
  })

  it('can be asked again after an answer', async () => {
    const order = await shop.submit()
    const asked = orderSchema.parse((await ask(order)).body)
    const answered = await shop.crew.agent.post(`/orders/${order.id}/answers`, {
      version: asked.version,
      text: 'Yes.',
    })
    const again = orderSchema.parse((await ask(orderSchema.parse(answered.body))).body)
    expect(again.state).toBe('question')
    expect(kinds(again)).toEqual(['submitted', 'question', 'answered', 'question'])
  })

  it('cannot be answered where none is open; the version shown is the one that counts', async () => {
    const order = await shop.submit()
    const refused = await shop.crew.agent.post(`/orders/${order.id}/answers`, {
      version: order.version,
      text: 'Yes.',
    })
    expect(refused.status).toBe(409)
    expect(refused.problem().code).toBe('wrong-state')
    expect(orderSchema.parse(refused.problem().current)).toEqual(await shop.readOrder(order.id))
  })
})

describe('Withdrawing an order', () => {
  it('ends it with a reason', async () => {
    const order = await shop.submit()
    const answer = await shop.crew.agent.post(`/orders/${order.id}/withdrawal`, {
      version: order.version,
      reason: 'The roof is off',
    })
    const now = orderSchema.parse(answer.body)
    expect(now.state).toBe('withdrawn')
    expect(now.events.at(-1)).toMatchObject({ kind: 'withdrawn', text: 'The roof is off' })
  })

  it('tells whoever comes later who withdrew it and when', async () => {
    const order = await shop.submit()
    const withdrawn = orderSchema.parse(
      (
        await shop.crew.agent.post(`/orders/${order.id}/withdrawal`, {
          version: order.version,
          reason: 'The roof is off',
        })
      ).body,
    )
    // With the version that is right by now as much as with the old one.
    for (const version of [order.version, withdrawn.version]) {
      for (const [path, body] of [
        ['release', { version }],
        ['questions', { version, text: 'Which color?' }],
        ['answers', { version, text: 'Yes' }],
        ['withdrawal', { version, reason: 'Again' }],
      ] as const) {
        const agent = path === 'answers' ? shop.crew.agent : shop.counter
        const late = await agent.post(`/orders/${order.id}/${path}`, body)
        expect([path, late.status]).toEqual([path, 409])
        const problem = late.problem()
        expect(problem.code).toBe('wrong-state')
        expect(problem.detail).toContain('Ada Ridge withdrew')
        expect(problem.detail).toContain(withdrawn.events.at(-1)?.at)
        expect(orderSchema.parse(problem.current)).toEqual(withdrawn)
      }
    }
  })
})

describe('An order of another company', () => {
  it('is not there for a crew lead, whatever is asked of it', async () => {
    const order = await shop.submit()
    const unknown = randomUUID()
    const { version } = order
    const stranger = shop.otherCrew.agent
    const answersFor = (id: string) =>
      Promise.all([
        stranger.get(`/orders/${id}`),
        stranger.put(`/orders/${id}`, amended(order, 99)),
        stranger.post(`/orders/${id}/answers`, { version, text: 'x' }),
        stranger.post(`/orders/${id}/withdrawal`, { version, reason: 'x' }),
      ])
    const foreign = await answersFor(order.id)
    const missing = await answersFor(unknown)
    expect(foreign.map(({ status }) => status)).toEqual([404, 404, 404, 404])
    expect(foreign.map((answer) => answer.problem().detail)).toEqual(
      missing.map((answer) => answer.problem().detail),
    )
    expect(await shop.readOrder(order.id)).toEqual(order)
  })
})
