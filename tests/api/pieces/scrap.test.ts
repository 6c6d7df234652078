import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import {
  at,
  codesOf,
  conflictOf,
  firstCode,
  openFloor,
  type Floor,
} from '../../support/making-factories'

let floor: Floor
beforeAll(async () => {
  floor = await openFloor()
})
afterAll(() => floor.close())

const REASON = 'Dented by the fork lift.'

describe('Scrapping a piece', () => {
  it.each(['queued', 'bent', 'bundled'] as const)(
    'that is %s queues its remake in the same place of the same run',
    async (state) => {
      const order = await floor.queue()
      const code = at(codesOf(order), 1)
      if (state !== 'queued') await floor.bend(code)
      if (state === 'bundled') await floor.bundle(order, [code])
      const { piece, remake } = await floor.scrap(code, REASON)
      expect(piece).toMatchObject({
        code,
        state: 'scrapped',
        remadeAs: remake.code,
        bundleCode: null,
        rackPlace: null,
      })
      expect(piece.events.at(-1)).toMatchObject({
        from: state,
        to: 'scrapped',
        reason: REASON,
        by: 'Wren Bender',
        station: state === 'bundled' ? 'rack' : 'brake',
      })
      expect(remake).toMatchObject({
        state: 'queued',
        remakeOf: code,
        remadeAs: null,
        sequence: piece.sequence,
        mark: piece.mark,
        length: piece.length,
        runId: piece.runId,
        orderId: order.id,
      })
      expect(remake.events).toHaveLength(1)
      expect(remake.events[0]).toMatchObject({ from: null, to: 'queued', by: 'Wren Bender' })
      expect(remake.code).not.toBe(code)
    },
  )

  it('keeps the count of living pieces, so the order is not done before the remake is', async () => {
    const order = await floor.queue()
    const [first = '', ...rest] = codesOf(order)
    for (const code of [first, ...rest]) await floor.bend(code)
    const { remake } = await floor.scrap(first)
    await floor.bundle(order, rest)
    expect((await floor.readOrder(order.id)).state).toBe('inWork')
    await floor.bend(remake.code)
    await floor.bundle(order, [remake.code])
    const done = await floor.readOrder(order.id)
    expect(done.state).toBe('ready')
    expect(done.progress).toMatchObject({ bundled: 3, scrapped: 1, queued: 0 })
  })

  it('a remake can be spoiled in its turn', async () => {
    const code = firstCode(await floor.queue())
    const { remake } = await floor.scrap(code)
    const again = await floor.scrap(remake.code)
    expect(again.piece).toMatchObject({ remakeOf: code, remadeAs: again.remake.code })
  })

  it('twice is refused with who scrapped it, and one remake is made', async () => {
    const order = await floor.queue()
    const code = firstCode(order)
    const answers = await Promise.all(
      [floor.wren, floor.oak].map((agent) =>
        agent.post(`/pieces/${code}/scrapped`, { reason: REASON }),
      ),
    )
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, 409])
    const loser = answers.find((answer) => answer.status === 409)
    if (loser) expect(conflictOf(loser)).toMatchObject({ code, state: 'scrapped' })
    expect(await floor.statesOf(order)).toEqual(['queued', 'queued', 'queued', 'scrapped'])
  })

  it('that was picked up is refused', async () => {
    const { order, bundle } = await floor.bundled()
    await floor.handOver(order, [bundle.code])
    const answer = await floor.wren.post(`/pieces/${firstCode(order)}/scrapped`, { reason: REASON })
    expect(answer.status).toBe(409)
    expect(conflictOf(answer)).toMatchObject({ state: 'pickedUp', by: 'Cy Counter' })
  })

  it('needs a reason', async () => {
    const code = firstCode(await floor.queue())
    const answer = await floor.wren.post(`/pieces/${code}/scrapped`, { reason: '  ' })
    expect(answer.status).toBe(400)
    expect(answer.problem().errors?.[0]?.path).toBe('reason')
    expect((await floor.readPiece(code)).state).toBe('queued')
  })
})
