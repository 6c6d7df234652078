import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { getHandOffSheet, returnBundle } from '#shared/hand-off/hand-off.contract'
import {
  codesOf,
  conflictOf,
  openFloor,
  SIGNATURE,
  type Floor,
} from '../../support/making-factories'

let floor: Floor
beforeAll(async () => {
  floor = await openFloor()
})
afterAll(() => floor.close())

const readSheet = (orderId: string) => floor.counter.call(getHandOffSheet, { params: { orderId } })

const wish = (bundleCodes: string[]) => ({
  bundleCodes,
  receivedBy: 'Ada Ridge',
  signature: SIGNATURE,
})

/** Two bundles of an order of four pieces, one piece still loose and one still queued. */
const partDone = async () => {
  const order = await floor.queue([floor.line({ quantity: 4 })])
  const codes = codesOf(order)
  for (const code of codes.slice(0, 3)) await floor.bend(code)
  const one = await floor.bundle(order, codes.slice(0, 1), 'R1')
  const two = await floor.bundle(order, codes.slice(1, 2), 'F2')
  return { order, one, two }
}

describe('Handing over', () => {
  it('the sheet says what lies where, what is loose and what is missing', async () => {
    const { order, one, two } = await partDone()
    const sheet = await readSheet(order.id)
    expect(sheet.order).toMatchObject({
      id: order.id,
      number: order.number,
      state: 'inWork',
      progress: { queued: 1, bent: 1, bundled: 2 },
    })
    expect(sheet.bundles).toEqual([one, two])
    expect(sheet).toMatchObject({ looseCount: 1, handOffs: [] })
  })

  it('a part picks up the pieces of its bundles and leaves the rest', async () => {
    const { order, one, two } = await partDone()
    const sheet = await floor.handOver(order, [one.code])
    expect(sheet.order).toMatchObject({
      state: 'partPickedUp',
      progress: { pickedUp: 1, bundled: 1, bent: 1, queued: 1 },
    })
    expect(sheet.bundles.map((bundle) => [bundle.code, bundle.pickedUpAt !== null])).toEqual([
      [one.code, true],
      [two.code, false],
    ])
    expect(sheet.handOffs).toHaveLength(1)
    expect(sheet.handOffs[0]).toMatchObject({
      receivedBy: 'Ada Ridge',
      handedBy: 'Cy Counter',
      bundleCodes: [one.code],
      signature: SIGNATURE,
    })
  })

  it('the whole of an order makes it picked up, and its events say to whom', async () => {
    const { order, bundle } = await floor.bundled()
    const sheet = await floor.handOver(order, [bundle.code])
    expect(sheet.order.state).toBe('pickedUp')
    const { events } = await floor.readOrder(order.id)
    expect(events.at(-1)).toMatchObject({
      kind: 'handedOff',
      by: 'Cy Counter',
      text: 'Ada Ridge',
    })
  })

  it('several bundles is one hand-off with one signature', async () => {
    const { order, one, two } = await partDone()
    const { handOffs } = await floor.handOver(order, [two.code, one.code, one.code])
    expect(handOffs.map((handOff) => handOff.bundleCodes)).toEqual([[one.code, two.code]])
  })

  it('all or none: a bundle that is gone keeps the others here, and who took it is told', async () => {
    const { order, one, two } = await partDone()
    await floor.handOver(order, [one.code])
    const answer = await floor.counter.post(
      `/orders/${order.id}/hand-off`,
      wish([two.code, one.code]),
    )
    expect(answer.status).toBe(409)
    const { handOffs } = await readSheet(order.id)
    expect(handOffs).toHaveLength(1)
    expect(conflictOf(answer)).toEqual({
      code: one.code,
      state: 'pickedUp',
      at: handOffs[0]?.at,
      by: 'Cy Counter',
      station: 'counter',
    })
    expect(answer.problem().detail).toContain('Ada Ridge')
  })

  it('from two counters at once: one hands over, the other is told', async () => {
    const { order, bundle } = await floor.bundled()
    const path = `/orders/${order.id}/hand-off`
    const answers = await Promise.all(
      [floor.counter, floor.manager].map((agent) => agent.post(path, wish([bundle.code]))),
    )
    expect(answers.map((answer) => answer.status).sort()).toEqual([201, 409])
    const winner = answers[0]?.status === 201 ? 'Cy Counter' : 'Mo Manager'
    const loser = answers.find((answer) => answer.status === 409)
    if (loser) expect(conflictOf(loser)).toMatchObject({ code: bundle.code, by: winner })
    expect((await readSheet(order.id)).handOffs).toHaveLength(1)
  })

  it('while the bundle is opened at the rack: one of the two wins, pieces never split', async () => {
    const { order, bundle } = await floor.bundled()
    const [handed, opened] = await Promise.all([
      floor.counter.post(`/orders/${order.id}/hand-off`, wish([bundle.code])),
      floor.wren.post(`/bundles/${bundle.id}/opened`, { reason: 'Restrap.' }),
    ])
    expect([handed.status === 201, opened.status === 200].filter(Boolean)).toHaveLength(1)
    const states = await floor.statesOf(order)
    expect(new Set(states)).toEqual(new Set([handed.status === 201 ? 'pickedUp' : 'bent']))
  })

  it('sent again with the same key is one hand-off', async () => {
    const { order, bundle } = await floor.bundled()
    const idempotencyKey = randomUUID()
    const send = () =>
      floor.counter.post(`/orders/${order.id}/hand-off`, wish([bundle.code]), { idempotencyKey })
    const first = await send()
    const again = await send()
    expect([first.status, again.status]).toEqual([201, 201])
    expect(again.body).toEqual(first.body)
    expect((await readSheet(order.id)).handOffs).toHaveLength(1)
  })

  it('refuses a bundle of another order', async () => {
    const { order } = await floor.bundled()
    const other = await floor.bundled()
    const answer = await floor.counter.post(
      `/orders/${order.id}/hand-off`,
      wish([other.bundle.code]),
    )
    expect(answer.status).toBe(409)
    expect(answer.problem().detail).toContain('belongs to another order')
  })

  it('refuses a bundle that was emptied', async () => {
    const { order, bundle } = await floor.bundled()
    await floor.wren.post(`/bundles/${bundle.id}/opened`, { reason: 'Restrap.' })
    const answer = await floor.counter.post(`/orders/${order.id}/hand-off`, wish([bundle.code]))
    expect(answer.status).toBe(409)
    expect(answer.problem().detail).toContain('empty')
  })

  it('is for the counter, not for a bender', async () => {
    const { order, bundle } = await floor.bundled()
    const path = `/orders/${order.id}/hand-off`
    expect((await floor.wren.post(path, wish([bundle.code]))).status).toBe(403)
    expect((await floor.crew.agent.post(path, wish([bundle.code]))).status).toBe(403)
  })
})

describe('Returning a bundle', () => {
  const giveBack = (bundleId: string) =>
    floor.counter.call(returnBundle, {
      params: { bundleId },
      body: { reason: 'Wrong color for this roof.' },
    })

  it('puts it back onto its place, each piece with the reason', async () => {
    const { order, bundle } = await floor.bundled()
    await floor.handOver(order, [bundle.code])
    const sheet = await giveBack(bundle.id)
    expect(sheet.order.state).toBe('ready')
    expect(sheet.bundles).toEqual([bundle])
    const piece = await floor.readPiece(codesOf(order)[0] ?? '')
    expect(piece).toMatchObject({ state: 'bundled', rackPlace: bundle.rackPlace })
    expect(piece.events.at(-1)).toMatchObject({
      from: 'pickedUp',
      to: 'bundled',
      reason: 'Wrong color for this roof.',
      station: 'counter',
    })
  })

  it('keeps the record that was signed, and the bundle can go again', async () => {
    const { order, bundle } = await floor.bundled()
    await floor.handOver(order, [bundle.code])
    await giveBack(bundle.id)
    const { handOffs, order: now } = await floor.handOver(order, [bundle.code])
    expect(now.state).toBe('pickedUp')
    expect(handOffs.map((handOff) => handOff.bundleCodes)).toEqual([[bundle.code], []])
  })

  it('that lies on the rack is refused, saying where', async () => {
    const { bundle } = await floor.bundled()
    const answer = await floor.counter.post(`/bundles/${bundle.id}/returned`, { reason: 'Eh.' })
    expect(answer.status).toBe(409)
    expect(answer.problem().detail).toContain(`lies on the rack at ${bundle.rackPlace}`)
  })
})
