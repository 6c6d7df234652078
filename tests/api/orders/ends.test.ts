import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { OrderInput, OrderLineInput } from '#shared/orders/order.schema'
import { getStarter } from '#shared/profile/starters'
import { gableEnds, lapEnd, plumbEnd, squareEnd } from '../../support/end-factories'
import { at } from '../../support/making-factories'
import { orderInput } from '../../support/shop-factories'
import { openShop, type Shop } from '../../support/shop-scene'

let shop: Shop
beforeAll(async () => {
  shop = await openShop()
})
afterAll(() => shop.close())

const hands = { drawn: 'left', left: 2, right: 1 } as const

const trySubmit = (given: Partial<OrderLineInput>, order: Partial<OrderInput> = {}) =>
  shop.crew.agent.post('/orders', {
    ...orderInput([shop.line(given)], order),
    jobId: shop.crew.jobId,
  })

describe('A line with dressed ends', () => {
  it('is kept as it was written: ends, hands and the girth the crew expects', async () => {
    const written = { ends: gableEnds(), hands, statedGirth: 4.5 }
    const order = await shop.submit([shop.line(written)])
    expect(at(order.lines, 0)).toMatchObject(written)
    expect(at((await shop.readOrder(order.id)).lines, 0)).toMatchObject(written)
    const amended = await shop.crew.agent.put(`/orders/${order.id}`, {
      ...orderInput([shop.line({ ends: null, statedGirth: null })]),
      version: order.version,
    })
    expect(amended.body).toMatchObject({ lines: [{ ends: null, hands: null, statedGirth: null }] })
  })

  it('has square ends and no hands where nothing is said of them', async () => {
    const { mark, name, profile, stockId, quantity, length } = shop.line()
    const answer = await shop.crew.agent.post('/orders', {
      poNumber: '',
      neededBy: '2099-12-31',
      notes: '',
      lines: [{ mark, name, profile, stockId, quantity, length }],
      jobId: shop.crew.jobId,
    })
    expect(answer.body).toMatchObject({
      lines: [{ ends: null, hands: null, statedGirth: null }],
      goods: [],
    })
  })

  it('weighs what is sheared: tabs are added, what a cut takes off is not taken off', async () => {
    const weightOf = async (given: Partial<OrderLineInput>) =>
      at((await shop.submit([shop.line(given)])).lines, 0).pieceWeight
    const square = await weightOf({ length: 63 })
    expect(await weightOf({ length: 63, ends: gableEnds() })).toBeCloseTo((square / 63) * 64, 9)
    const cut = { left: plumbEnd(-30), right: plumbEnd(30), lowEnd: null }
    expect(await weightOf({ length: 63, ends: cut })).toBeCloseTo(square, 9)
  })

  it.each([
    [
      'a leg that the profile has not',
      { ends: { ...gableEnds(), left: squareEnd([{ leg: 4, length: 1 }]) } },
      'lines.0.ends.left',
      'noSuchLeg',
      'Leg 4 is named and the profile has 3. Name one of its legs.',
    ],
    [
      'a leg named twice',
      { ends: { ...gableEnds(), right: squareEnd([1, 1].map((leg) => ({ leg, length: 1 }))) } },
      'lines.0.ends.right',
      'legNamedTwice',
      'Leg 1 is named more than once. Name each leg once.',
    ],
    [
      'a lap longer than the piece',
      { length: 3, ends: { ...gableEnds(), right: lapEnd(4) } },
      'lines.0.ends.right',
      'lapLongerThanPiece',
      'The lap of 4" is as long as the piece of 3". Shorten the lap.',
    ],
    [
      'a cut along the piece',
      { ends: { ...gableEnds(), right: plumbEnd(89.5) } },
      'lines.0.ends.right',
      'planeAlongPiece',
      'The right end is cut at 0.5° to the piece, which runs along it; at least 1°. Change slope or turn.',
    ],
    [
      'a corner that turns back',
      {
        ends: {
          ...gableEnds(),
          right: {
            ...plumbEnd(0),
            plane: { corner: { slopeIn: 0, slopeOut: 0, plan: 179 } },
          },
        },
      },
      'lines.0.ends.right',
      'cornerTurnsBack',
      'The corner turns the run by 179°, nearly back on itself; at most 178°. Change slopes or turn.',
    ],
    [
      'cuts that leave nothing',
      { length: 2, ends: { left: plumbEnd(-60), right: plumbEnd(60), lowEnd: null } },
      'lines.0.ends.right',
      'endsMeet',
      expect.stringMatching(
        /^Both cuts together take .* Lengthen the piece or cut less\.$/,
      ) as unknown,
    ],
  ])('is refused for %s, with what cures it', async (_what, given, path, code, message) => {
    const answer = await trySubmit(given)
    expect(answer.status).toBe(400)
    expect(answer.problem().errors).toEqual([{ path, code, message }])
  })

  it('is refused where its strip with the tabs is longer than the stock gives', async () => {
    const answer = await trySubmit({ length: 125.5, ends: gableEnds() })
    expect(answer.status).toBe(400)
    const [error] = answer.problem().errors ?? []
    expect(error?.path).toBe('lines.0.length')
    expect(error?.message).toBe(
      `With its tabs the strip is 10' 6 1/2"; the longest of this stock is 10' 6". Shorten the piece or its tabs.`,
    )
    expect((await trySubmit({ length: 125, ends: gableEnds() })).status).toBe(201)
  })

  it('is refused where its hands are not all its pieces', async () => {
    const answer = await trySubmit({ quantity: 4, ends: gableEnds(), hands })
    expect(answer.status).toBe(400)
    expect(answer.problem().errors).toEqual([
      { path: 'lines.0.hands', message: 'Left and right together must be the quantity.' },
    ])
  })

  it('cannot be released where a stock has changed so that its ends do not fit any more', async () => {
    const { profile } = getStarter('eaveDrip')
    const order = await shop.submit([shop.line({ profile, length: 5, ends: gableEnds() })])
    await shop
      .db('order_lines')
      .where({ order_id: order.id })
      .update({ ends: JSON.stringify({ ...gableEnds(), right: lapEnd(6) }) })
    const answer = await shop.counter.post(`/orders/${order.id}/release`, {
      version: order.version,
    })
    expect(answer.problem()).toMatchObject({
      code: 'profile-problem',
      errors: [{ path: 'lines.0.ends.right', code: 'lapLongerThanPiece' }],
    })
  })
})

describe('Small goods', () => {
  const goods: OrderInput['goods'] = [
    { kind: 'fasteners', quantity: 250, unit: 'each', stockId: null, note: 'Painted heads' },
    { kind: 'sealant', quantity: 3, unit: 'tube', stockId: null, note: '' },
  ]

  it('are kept with the order, in the order they were written', async () => {
    const ofColor = { ...at(goods, 0), stockId: shop.stockId }
    const order = await shop.submit([shop.line()], { goods: [...goods, ofColor] })
    expect(order.goods).toEqual([...goods, ofColor])
    const amended = await shop.crew.agent.put(`/orders/${order.id}`, {
      ...orderInput([shop.line()], { goods: goods.slice(1) }),
      version: order.version,
    })
    expect(amended.body).toMatchObject({ goods: goods.slice(1) })
    const released = await shop.release({ id: order.id, version: 2 })
    expect(released.goods).toEqual(goods.slice(1))
  })

  it('are refused in the color of a stock that is not there, beside everything else', async () => {
    const unknown = { ...at(goods, 1), stockId: randomUUID() }
    const answer = await trySubmit({ length: 130 }, { goods: [at(goods, 0), unknown] })
    expect(answer.status).toBe(400)
    expect(answer.problem().errors?.map(({ path }) => path)).toEqual([
      'lines.0.length',
      'goods.1.stockId',
    ])
  })

  it.each([
    ['none', { quantity: 0 }, 'goods.0.quantity'],
    ['half of one', { quantity: 1.5 }, 'goods.0.quantity'],
    ['a kind nobody keeps', { kind: 'ladders' }, 'goods.0.kind'],
  ])('are refused by %s, naming the field', async (_what, wrong, path) => {
    const answer = await shop.crew.agent.post('/orders', {
      ...orderInput([shop.line()]),
      goods: [{ ...at(goods, 0), ...wrong }],
      jobId: shop.crew.jobId,
    })
    expect(answer.problem().errors).toMatchObject([{ path }])
  })
})
