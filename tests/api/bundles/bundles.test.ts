import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { getBundle, getRack, moveBundle, openBundle } from '#shared/bundles/bundles.contract'
import { parseCode } from '#shared/pieces/codes'
import { at, codesOf, conflictOf, openFloor, type Floor } from '../../support/making-factories'

let floor: Floor
beforeAll(async () => {
  floor = await openFloor()
})
afterAll(() => floor.close())

const readRack = () => floor.wren.call(getRack)
const readBundle = (code: string) => floor.wren.call(getBundle, { params: { code } })
const wish = (orderId: string, pieceCodes: string[]) => ({ orderId, pieceCodes, rackPlace: 'R2' })

describe('Bundling', () => {
  it('straps bent pieces together under a code and a number of their order', async () => {
    const order = await floor.queue([
      floor.line({ mark: 'A', quantity: 2, length: 120 }),
      floor.line({ mark: 'B', quantity: 1, length: 60 }),
    ])
    const codes = await floor.bendAll(order)
    const first = await floor.bundle(order, codes.slice(0, 1))
    const second = await floor.bundle(order, codes.slice(1), 'f3')
    expect(parseCode(first.code)).toMatchObject({ ok: true, kind: 'bundle' })
    expect([first.number, second.number]).toEqual([1, 2])
    expect(second).toMatchObject({
      orderId: order.id,
      orderNumber: order.number,
      rackPlace: 'F3',
      by: 'Wren Bender',
      longest: 120,
      pickedUpAt: null,
    })
    expect(second.pieces.map(({ code, state }) => [code, state])).toEqual([
      [codes[1], 'bundled'],
      [codes[2], 'bundled'],
    ])
    const [a = 0, b = 0] = order.lines.map((line) => line.pieceWeight)
    expect(second.weight).toBeCloseTo(a + b, 9)
  })

  it('all or none: a piece that is not bent keeps the others loose', async () => {
    const order = await floor.queue()
    const [first = '', second = ''] = codesOf(order)
    await floor.bend(first)
    const answer = await floor.wren.post('/bundles', wish(order.id, [first, second]))
    expect(answer.status).toBe(409)
    expect(conflictOf(answer)).toMatchObject({ code: second, state: 'queued' })
    expect(answer.problem().detail).toContain('Only a piece that is bent can be bundled.')
    expect((await floor.readPiece(first)).state).toBe('bent')
    expect(await floor.db('bundles').where({ order_id: order.id })).toEqual([])
  })

  it('refuses a piece of another order and names that order', async () => {
    const order = await floor.queue()
    const other = await floor.queue()
    const [first = ''] = await floor.bendAll(order)
    const [stray = ''] = await floor.bendAll(other)
    const answer = await floor.wren.post('/bundles', wish(order.id, [first, stray]))
    expect(answer.status).toBe(409)
    expect(answer.problem().detail).toContain(`${stray} belongs to order F-${other.number}`)
    expect(await floor.statesOf(order)).toEqual(['bent', 'bent', 'bent'])
  })

  it('of one piece from two racks at once: one bundle gets it', async () => {
    const order = await floor.queue()
    const codes = await floor.bendAll(order)
    const answers = await Promise.all(
      [floor.wren, floor.oak].map((agent) => agent.post('/bundles', wish(order.id, codes))),
    )
    expect(answers.map((answer) => answer.status).sort()).toEqual([201, 409])
    const loser = answers.find((answer) => answer.status === 409)
    if (loser) expect(conflictOf(loser)).toMatchObject({ state: 'bundled' })
    expect(await floor.db('bundles').where({ order_id: order.id })).toHaveLength(1)
  })

  it('of two bundles at once gives them different numbers', async () => {
    const order = await floor.queue([floor.line({ quantity: 6 })])
    const codes = await floor.bendAll(order)
    const bundles = await Promise.all(codes.map((code) => floor.bundle(order, [code])))
    expect(bundles.map((bundle) => bundle.number).sort()).toEqual([1, 2, 3, 4, 5, 6])
  })

  it('sent again with the same key makes one bundle', async () => {
    const order = await floor.queue()
    const body = wish(order.id, await floor.bendAll(order))
    const idempotencyKey = randomUUID()
    const first = await floor.wren.post('/bundles', body, { idempotencyKey })
    const again = await floor.wren.post('/bundles', body, { idempotencyKey })
    expect([first.status, again.status]).toEqual([201, 201])
    expect(again.body).toEqual(first.body)
    expect(await floor.db('bundles').where({ order_id: order.id })).toHaveLength(1)
  })

  it('takes a piece scanned twice once', async () => {
    const order = await floor.queue()
    const [first = ''] = await floor.bendAll(order)
    const bundle = await floor.bundle(order, [first, first.toLowerCase(), first])
    expect(bundle.pieces).toHaveLength(1)
  })

  it('names the field of a mistyped code and of a place that is none', async () => {
    const order = await floor.queue()
    const [first = ''] = await floor.bendAll(order)
    const mistyped = await floor.wren.post('/bundles', wish(order.id, [first, 'P123']))
    expect(mistyped.status).toBe(400)
    expect(mistyped.problem().errors?.[0]?.path).toBe('pieceCodes.1')
    const nowhere = await floor.wren.post('/bundles', {
      ...wish(order.id, [first]),
      rackPlace: 'by the door',
    })
    expect(nowhere.status).toBe(400)
    expect(nowhere.problem().errors?.[0]?.path).toBe('rackPlace')
  })
})

describe('A bundle on the rack', () => {
  it('can lie somewhere else', async () => {
    const { bundle } = await floor.bundled()
    const moved = await floor.counter.call(moveBundle, {
      params: { bundleId: bundle.id },
      body: { rackPlace: 'F9' },
    })
    expect(moved).toEqual({ ...bundle, rackPlace: 'F9' })
  })

  it('that left is not moved or opened; who handed it over is told', async () => {
    const { order, bundle } = await floor.bundled()
    await floor.handOver(order, [bundle.code])
    const moved = await floor.wren.patch(`/bundles/${bundle.id}`, { rackPlace: 'F9' })
    const opened = await floor.wren.post(`/bundles/${bundle.id}/opened`, { reason: 'Why not.' })
    for (const answer of [moved, opened]) {
      expect(answer.status).toBe(409)
      expect(conflictOf(answer)).toMatchObject({
        code: bundle.code,
        state: 'pickedUp',
        by: 'Cy Counter',
      })
      expect(answer.problem().detail).toContain('handed over to Ada Ridge by Cy Counter')
    }
  })

  it('opened altogether lets all its pieces go, each with the reason', async () => {
    const { order, bundle } = await floor.bundled()
    const opened = await floor.wren.call(openBundle, {
      params: { bundleId: bundle.id },
      body: { reason: 'Strapped the wrong way round.' },
    })
    expect(opened.pieces).toEqual([])
    const piece = await floor.readPiece(at(codesOf(order), 0))
    expect(piece).toMatchObject({ state: 'bent', bundleCode: null })
    expect(piece.events.at(-1)).toMatchObject({
      from: 'bundled',
      to: 'bent',
      reason: 'Strapped the wrong way round.',
      station: 'rack',
    })
  })

  it('opened for one piece keeps the others', async () => {
    const { order, bundle } = await floor.bundled()
    const [first = '', ...rest] = codesOf(order)
    const opened = await floor.wren.call(openBundle, {
      params: { bundleId: bundle.id },
      body: { pieceCodes: [first], reason: 'Scratched.' },
    })
    expect(opened.pieces.map((piece) => piece.code)).toEqual(rest)
    expect(opened.weight).toBeCloseTo((bundle.weight * 2) / 3, 9)
  })

  it('is not opened for a piece that is not in it', async () => {
    const { bundle } = await floor.bundled()
    const other = await floor.bundled()
    const [stray = ''] = codesOf(other.order)
    const answer = await floor.wren.post(`/bundles/${bundle.id}/opened`, {
      pieceCodes: [stray],
      reason: 'Scratched.',
    })
    expect(answer.status).toBe(409)
    expect(answer.problem().detail).toBe(`${stray} is not in bundle ${bundle.code}.`)
  })

  it('is read by its code, and not found under one that no label bears', async () => {
    const { bundle } = await floor.bundled()
    expect(await readBundle(bundle.code.toLowerCase())).toEqual(bundle)
    const piece = await floor.wren.get(`/bundles/${bundle.pieces[0]?.code}`)
    expect(piece.status).toBe(400)
  })

  it('loses a piece that is scrapped', async () => {
    const { order, bundle } = await floor.bundled()
    const [first = '', ...rest] = codesOf(order)
    await floor.scrap(first)
    expect((await readBundle(bundle.code)).pieces.map((piece) => piece.code)).toEqual(rest)
  })
})

describe('The rack', () => {
  it('shows bent pieces to bundle by order, what is needed first on top, and what lies there', async () => {
    const lines = () => [floor.line({ quantity: 2 })]
    const late = await floor.release(await floor.submit(lines(), { neededBy: '2097-03-02' }))
    const soon = await floor.release(await floor.submit(lines(), { neededBy: '2097-03-01' }))
    const [lateCode = ''] = codesOf(late)
    await floor.bend(lateCode)
    const soonCodes = await floor.bendAll(soon)
    const bundle = await floor.bundle(soon, soonCodes.slice(0, 1))
    const { work, bundles } = await readRack()
    const mine = work.filter((item) => [late.id, soon.id].includes(item.orderId))
    expect(
      mine.map(({ orderId, queued, loose }) => ({
        orderId,
        queued,
        loose: loose.map((piece) => piece.code),
      })),
    ).toEqual([
      { orderId: soon.id, queued: 0, loose: [soonCodes[1]] },
      { orderId: late.id, queued: 1, loose: [lateCode] },
    ])
    expect(bundles.find((item) => item.id === bundle.id)).toEqual(bundle)
  })

  it('no longer shows what was handed over', async () => {
    const { order, bundle } = await floor.bundled()
    const lies = async () => (await readRack()).bundles.some((item) => item.id === bundle.id)
    expect(await lies()).toBe(true)
    await floor.handOver(order, [bundle.code])
    expect(await lies()).toBe(false)
  })

  it('is not shown to crew leads', async () => {
    expect((await floor.crew.agent.get('/rack')).status).toBe(403)
  })
})
