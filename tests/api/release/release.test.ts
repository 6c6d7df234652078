import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { frozenLineSchema } from '#server/features/orders/frozen-line'
import { brakeSchema } from '#shared/bend-plan/brake.schema'
import { orderSchema, type Order } from '#shared/orders/order.schema'
import { parseCode } from '#shared/pieces/codes'
import { planDrawing } from '#shared/plans/plans.contract'
import { getStarter } from '#shared/profile/starters'
import { createStock, unbendableProfile, zProfile } from '../../support/shop-factories'
import { openShop, type Shop } from '../../support/shop-scene'

let shop: Shop
beforeAll(async () => {
  shop = await openShop()
})
afterAll(() => shop.close())

const runsOf = (order: Pick<Order, 'id'>) =>
  shop.db('runs').where({ order_id: order.id }).orderBy('number')
const piecesOf = (order: Pick<Order, 'id'>) => shop.db('pieces').where({ order_id: order.id })

describe('Releasing an order', () => {
  it('brings as many queued pieces into being as were ordered, each with its own code', async () => {
    const order = await shop.submit([
      shop.line({ mark: 'A', quantity: 4 }),
      shop.line({ mark: 'B', quantity: 2, profile: zProfile([2, 2, 2]) }),
    ])
    const released = await shop.release(order)
    expect(released).toMatchObject({ state: 'released', version: 2, pieceCount: 6 })
    expect(released.progress).toMatchObject({ queued: 6, bent: 0 })
    expect(released.lines.map(({ pieces }) => pieces.map(({ sequence }) => sequence))).toEqual([
      [1, 2, 3, 4],
      [1, 2],
    ])
    const pieces = released.lines.flatMap((line) => line.pieces)
    expect(new Set(pieces.map(({ code }) => code)).size).toBe(6)
    for (const piece of pieces) {
      expect(parseCode(piece.code)).toMatchObject({ ok: true, kind: 'piece' })
      expect(piece).toMatchObject({
        state: 'queued',
        by: 'Cy Counter',
        bundleCode: null,
        rackPlace: null,
        remakeOf: null,
      })
    }
    expect(released.events.at(-1)).toMatchObject({ kind: 'released', by: 'Cy Counter' })
  })

  it('writes the first event of every piece at the counter', async () => {
    const order = await shop.release(await shop.submit())
    const events = await shop
      .db('piece_events as e')
      .join('pieces as p', 'p.id', 'e.piece_id')
      .where('p.order_id', order.id)
      .select('e.from_state', 'e.to_state', 'e.station', 'e.person_id')
    expect(events).toEqual(
      Array(3).fill({
        from_state: null,
        to_state: 'queued',
        station: 'counter',
        person_id: shop.clerk.id,
      }),
    )
  })

  it('gathers lines of one shape and stock into one run, whatever their lengths', async () => {
    const otherStock = await createStock(shop.db)
    const order = await shop.release(
      await shop.submit([
        shop.line({ mark: 'A', length: 120 }),
        shop.line({ mark: 'B', length: 96, name: 'Shorter' }),
        shop.line({ mark: 'C', stockId: otherStock }),
        shop.line({ mark: 'D', profile: zProfile([1.25, 2.5, 1.25]) }),
        shop.line({ mark: 'E', profile: { ...zProfile(), colorSide: 'right' } }),
      ]),
    )
    const runs = order.lines.map(({ pieces }) => [...new Set(pieces.map((p) => p.runNumber))])
    const [first = NaN] = runs[0] ?? []
    expect(runs).toEqual([[first], [first], [first + 1], [first + 2], [first + 3]])
    const [run] = await runsOf(order)
    expect(run).toMatchObject({ name: 'Closure', claimed_by: null })
    expect(parseCode(run?.code ?? '')).toMatchObject({ ok: true, kind: 'run' })
  })

  it('never puts pieces of two orders into one run', async () => {
    const one = await shop.release(await shop.submit())
    const two = await shop.release(await shop.submit())
    expect(one.lines[0]?.pieces[0]?.runNumber).not.toBe(two.lines[0]?.pieces[0]?.runNumber)
  })

  it('plans a run for its longest piece, and each line holds the plan it is bent by', async () => {
    const wide = zProfile([1.25, 9, 9])
    const order = await shop.release(
      await shop.submit([
        shop.line({ mark: 'A', profile: wide, length: 24 }),
        shop.line({ mark: 'B', profile: wide, length: 120 }),
      ]),
    )
    const asked = await shop.counter.call(planDrawing, {
      body: { profile: wide, stockId: shop.stockId, pieceLength: 120 },
    })
    const lines = await shop.db('order_lines').where({ order_id: order.id }).orderBy('position')
    const frozen = lines.map((line) => frozenLineSchema.parse(line.frozen))
    const chosen = asked.brakes.find(({ brakeId }) => brakeId === frozen[0]?.brakeId)
    expect(frozen.map(({ plan }) => plan)).toEqual([chosen?.plan, chosen?.plan])
    const [run] = await runsOf(order)
    expect(run?.plan).toEqual(chosen?.plan)
  })

  it.each([
    ['eaveDrip', [4, 0, 4], 'Two-way folder'],
    ['ridge', [12, 8, 6], 'Site brake'],
  ] as const)('chooses the brake whose plan costs least: %s', async (key, handling, brake) => {
    const { profile } = getStarter(key)
    const asked = await shop.counter.call(planDrawing, {
      body: { profile, stockId: shop.stockId, pieceLength: 120 },
    })
    expect(asked.brakes.map(({ plan }) => plan.cost?.handling)).toEqual(handling)
    const order = await shop.release(await shop.submit([shop.line({ profile })]))
    expect(order.lines[0]?.bendsOn).toEqual([brake])
  })

  it('holds after stock, brakes and job have changed', async () => {
    const stockId = await createStock(shop.db)
    const order = await shop.release(await shop.submit([shop.line({ stockId })]))
    const [runBefore] = await runsOf(order)
    await shop
      .db('stocks')
      .where({ id: stockId })
      .update({ thickness: 0.06, inside_radius: 0.1, color_hex: '#000000', widest_strip: 2 })
    const brake = await shop.db('brakes').where({ name: order.lines[0]?.bendsOn[0] }).first()
    const definition = brakeSchema.parse(brake?.definition)
    await shop
      .db('brakes')
      .where({ id: brake?.id })
      .update({ definition: JSON.stringify({ ...definition, length: 12, name: 'Renamed' }) })
    await shop.db('jobs').where({ id: shop.crew.jobId }).update({ pitch_rise: 12 })

    expect(await shop.readOrder(order.id)).toEqual(order)
    expect((await runsOf(order))[0]).toEqual(runBefore)

    await shop.db('jobs').where({ id: shop.crew.jobId }).update({ pitch_rise: 6 })
    await shop
      .db('brakes')
      .where({ id: brake?.id })
      .update({ definition: JSON.stringify(definition) })
  })

  it('lets one of two through who release at once; the other is told who and when', async () => {
    const order = await shop.submit()
    const second = await shop.api.signInAs(
      await shop.api.make.person('manager', { name: 'Di Office' }),
    )
    const body = { version: order.version }
    const answers = await Promise.all([
      shop.counter.post(`/orders/${order.id}/release`, body),
      second.post(`/orders/${order.id}/release`, body),
    ])
    expect(answers.map(({ status }) => status).toSorted()).toEqual([200, 409])
    const winner = answers[0].status === 200 ? 'Cy Counter' : 'Di Office'
    const problem = answers.find(({ status }) => status === 409)?.problem()
    const now = await shop.readOrder(order.id)
    expect(problem?.code).toBe('wrong-state')
    expect(problem?.detail).toContain(`${winner} released`)
    expect(problem?.detail).toContain(now.events.at(-1)?.at)
    expect(orderSchema.parse(problem?.current)).toEqual(now)
    expect(await piecesOf(order)).toHaveLength(3)
    expect(await runsOf(order)).toHaveLength(1)
  })

  it('meets an amendment at the same time: what is released is what was seen', async () => {
    const order = await shop.submit()
    const { version } = order
    const [released, amended] = await Promise.all([
      shop.counter.post(`/orders/${order.id}/release`, { version }),
      shop.crew.agent.put(`/orders/${order.id}`, {
        poNumber: '',
        neededBy: order.neededBy,
        notes: '',
        lines: [shop.line({ quantity: 9 })],
        version,
      }),
    ])
    expect([released.status, amended.status].toSorted()).toEqual([200, 409])
    const now = await shop.readOrder(order.id)
    const expected = released.status === 200 ? [3, 3, 'released'] : [9, 0, 'submitted']
    expect([now.pieceCount, now.progress.queued, now.state]).toEqual(expected)
  })

  it('is refused while a question is open and taken once it is answered', async () => {
    const order = await shop.submit()
    await shop.counter.post(`/orders/${order.id}/questions`, {
      version: order.version,
      text: 'Which color?',
    })
    const asked = await shop.readOrder(order.id)
    const refused = await shop.counter.post(`/orders/${order.id}/release`, {
      version: asked.version,
    })
    expect(refused.status).toBe(409)
    expect(refused.problem().code).toBe('wrong-state')
    expect(orderSchema.parse(refused.problem().current)).toEqual(asked)
    await shop.crew.agent.post(`/orders/${order.id}/answers`, {
      version: asked.version,
      text: 'The red one.',
    })
    const released = await shop.release(await shop.readOrder(order.id))
    expect(released.state).toBe('released')
  })

  it('is refused with the lines that bend nowhere and why, and nothing of it is released', async () => {
    const order = await shop.submit([
      shop.line({ mark: 'A' }),
      shop.line({ mark: 'B', profile: unbendableProfile() }),
    ])
    expect(order.lines.map(({ bendsOn }) => bendsOn.length)).toEqual([3, 0])
    const refused = await shop.counter.post(`/orders/${order.id}/release`, {
      version: order.version,
    })
    expect(refused.status).toBe(422)
    const problem = refused.problem()
    expect(problem.code).toBe('cannot-bend')
    expect(problem.detail).toContain('line B')
    expect(new Set(problem.errors?.map(({ path }) => path))).toEqual(new Set(['lines.1']))
    for (const brake of ['Ten-six folder', 'Two-way folder', 'Site brake']) {
      expect(problem.errors?.some(({ message }) => message.startsWith(`${brake}: `))).toBe(true)
    }
    expect(await shop.readOrder(order.id)).toEqual(order)
    expect(await piecesOf(order)).toEqual([])
    expect(await runsOf(order)).toEqual([])
  })

  it('is refused when the stock has changed so that a line cannot be made of it', async () => {
    const stockId = await createStock(shop.db)
    const order = await shop.submit([shop.line(), shop.line({ mark: 'B', stockId })])
    await shop.db('stocks').where({ id: stockId }).update({ widest_strip: 2 })
    const refused = await shop.counter.post(`/orders/${order.id}/release`, {
      version: order.version,
    })
    expect(refused.status).toBe(422)
    expect(refused.problem().errors).toMatchObject([
      { path: 'lines.1.profile', code: 'stripWiderThanStock' },
    ])
    const now = await shop.readOrder(order.id)
    expect(now.lines[1]?.bendsOn).toEqual([])
    expect(now.state).toBe('submitted')
  })

  it('ends what the crew and the counter may change, also with the version that is right', async () => {
    const order = await shop.release(await shop.submit())
    const { version } = order
    const amended = { poNumber: '', neededBy: order.neededBy, notes: '', lines: [shop.line()] }
    const answers = await Promise.all([
      shop.crew.agent.put(`/orders/${order.id}`, { ...amended, version }),
      shop.crew.agent.post(`/orders/${order.id}/answers`, { version, text: 'Yes' }),
      shop.crew.agent.post(`/orders/${order.id}/withdrawal`, { version, reason: 'Too late' }),
      shop.counter.post(`/orders/${order.id}/questions`, { version, text: 'Which?' }),
      shop.counter.post(`/orders/${order.id}/release`, { version }),
    ])
    for (const answer of answers) {
      expect(answer.status).toBe(409)
      expect(answer.problem().code).toBe('wrong-state')
      expect(answer.problem().detail).toContain('Cy Counter released')
    }
    expect(await shop.readOrder(order.id)).toEqual(order)
  })

  it('takes an order of more pieces than one statement writes', async () => {
    const lines = ['A', 'B', 'C'].map((mark) => shop.line({ mark, quantity: 450 }))
    const order = await shop.release(await shop.submit(lines))
    expect(order.progress.queued).toBe(1350)
    for (const { pieces } of order.lines) {
      expect(pieces.map(({ sequence }) => sequence)).toEqual(
        Array.from({ length: 450 }, (_, index) => index + 1),
      )
    }
  })
})
