import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Order } from '#shared/orders/order.schema'
import { getBundle, openBundle } from '#shared/bundles/bundles.contract'
import { returnBundle } from '#shared/hand-off/hand-off.contract'
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

const REASON = 'Scanned by mistake.'

const lastEvent = async (code: string): Promise<number> => {
  const { events } = await floor.readPiece(code)
  return at(events, events.length - 1).id
}
const lastEvents = (order: Order): Promise<number[]> => Promise.all(codesOf(order).map(lastEvent))

describe('Undoing', () => {
  it('is a new event that names the old one and its reason; nothing is erased', async () => {
    const code = firstCode(await floor.queue())
    const { eventId } = await floor.bend(code)
    expect((await floor.undo([eventId])).status).toBe(200)
    const piece = await floor.readPiece(code)
    expect(piece.state).toBe('queued')
    expect(piece.events).toHaveLength(3)
    expect(piece.events.at(-1)).toMatchObject({
      from: 'bent',
      to: 'queued',
      undoes: eventId,
      reason: REASON,
      station: 'brake',
    })
  })

  it('takes back many at once', async () => {
    const order = await floor.queue([floor.line({ quantity: 8 })])
    const [runId = ''] = await floor.runIds(order)
    const { eventIds } = await floor.bendNext(runId, 8)
    expect((await floor.undo(eventIds)).status).toBe(200)
    expect(await floor.statesOf(order)).toEqual(Array(8).fill('queued'))
  })

  it('all or none: one event that is not the last of its piece stops the rest', async () => {
    const order = await floor.queue()
    const [first = '', second = ''] = codesOf(order)
    const one = await floor.bend(first)
    const two = await floor.bend(second)
    await floor.bundle(order, [second])
    const answer = await floor.undo([one.eventId, two.eventId])
    expect(answer.status).toBe(409)
    expect(conflictOf(answer)).toMatchObject({ code: second, state: 'bundled', by: 'Wren Bender' })
    expect((await floor.readPiece(first)).state).toBe('bent')
  })

  it('twice at once takes back once', async () => {
    const code = firstCode(await floor.queue())
    const { eventId } = await floor.bend(code)
    const answers = await Promise.all([floor.undo([eventId]), floor.undo([eventId], floor.oak)])
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, 409])
    expect(await floor.countEvents(code)).toBe(3)
  })

  it('sent again with the same key takes back once', async () => {
    const code = firstCode(await floor.queue())
    const { eventId } = await floor.bend(code)
    const key = { idempotencyKey: randomUUID() }
    const body = { eventIds: [eventId], reason: REASON }
    const first = await floor.wren.post('/piece-events/undo', body, key)
    const again = await floor.wren.post('/piece-events/undo', body, key)
    expect([first.status, again.status]).toEqual([200, 200])
    expect(again.body).toEqual(first.body)
    expect(await floor.countEvents(code)).toBe(3)
  })

  it('cannot itself be undone', async () => {
    const code = firstCode(await floor.queue())
    await floor.undo([(await floor.bend(code)).eventId])
    const answer = await floor.undo([await lastEvent(code)])
    expect(answer.status).toBe(409)
    expect(answer.problem().detail).toContain('Make the move again instead.')
    expect((await floor.readPiece(code)).state).toBe('queued')
  })

  it('does not take back that a piece came into being, or that it was scrapped', async () => {
    const code = firstCode(await floor.queue())
    expect((await floor.undo([await lastEvent(code)])).status).toBe(409)
    await floor.scrap(code)
    const answer = await floor.undo([await lastEvent(code)])
    expect(answer.status).toBe(409)
    expect(answer.problem().detail).toContain('final')
  })

  it('needs a reason', async () => {
    const { eventId } = await floor.bend(firstCode(await floor.queue()))
    const answer = await floor.undo([eventId], floor.wren, ' ')
    expect(answer.status).toBe(400)
    expect(answer.problem().errors?.[0]?.path).toBe('reason')
  })

  it('of an event that does not exist is not found', async () => {
    expect((await floor.undo([999_999_999])).status).toBe(404)
  })

  describe('asks for the permission of the move', () => {
    it('a bender takes back bending, the counter does not', async () => {
      const { eventId } = await floor.bend(firstCode(await floor.queue()))
      expect((await floor.undo([eventId], floor.counter)).status).toBe(403)
      expect((await floor.undo([eventId], floor.wren)).status).toBe(200)
    })

    it('the counter takes back bundling', async () => {
      const { order } = await floor.bundled()
      expect((await floor.undo(await lastEvents(order), floor.counter)).status).toBe(200)
      expect(await floor.statesOf(order)).toEqual(['bent', 'bent', 'bent'])
    })

    it('the counter takes back a hand-off, a bender does not', async () => {
      const { order, bundle } = await floor.bundled()
      await floor.handOver(order, [bundle.code])
      const events = await lastEvents(order)
      expect((await floor.undo(events, floor.wren)).status).toBe(403)
      expect((await floor.undo(events, floor.counter)).status).toBe(200)
    })

    it('a crew lead takes back nothing, and learns nothing of another company', async () => {
      const { eventId } = await floor.bend(firstCode(await floor.queue()))
      expect((await floor.undo([eventId], floor.crew.agent)).status).toBe(403)
      expect((await floor.undo([eventId], floor.otherCrew.agent)).status).toBe(404)
    })
  })

  describe('of bundling', () => {
    it('leaves an emptied bundle as a record that no rack shows', async () => {
      const { order, bundle } = await floor.bundled()
      await floor.undo(await lastEvents(order))
      const record = await floor.wren.call(getBundle, { params: { code: bundle.code } })
      expect(record).toMatchObject({ pieces: [], weight: 0, longest: 0 })
      const { body } = await floor.wren.get('/rack')
      expect(JSON.stringify(body)).not.toContain(bundle.code)
      const again = await floor.bundle(order, codesOf(order))
      expect(again.number).toBe(bundle.number + 1)
    })

    it('of a piece taken out puts it back into its bundle', async () => {
      const { order, bundle } = await floor.bundled()
      const code = firstCode(order)
      await floor.wren.call(openBundle, {
        params: { bundleId: bundle.id },
        body: { pieceCodes: [code], reason: 'Wrong end up.' },
      })
      expect((await floor.undo([await lastEvent(code)])).status).toBe(200)
      expect((await floor.readPiece(code)).bundleCode).toBe(bundle.code)
    })

    it('of a piece taken out is refused once its bundle has left', async () => {
      const { order, bundle } = await floor.bundled()
      const code = firstCode(order)
      await floor.wren.call(openBundle, {
        params: { bundleId: bundle.id },
        body: { pieceCodes: [code], reason: 'Wrong end up.' },
      })
      await floor.handOver(order, [bundle.code])
      const answer = await floor.undo([await lastEvent(code)])
      expect(answer.status).toBe(409)
      expect(answer.problem().detail).toContain(bundle.code)
      expect((await floor.readPiece(code)).state).toBe('bent')
    })

    it('while its bundle is handed over: the piece leaves with it or stays out', async () => {
      for (let round = 0; round < 6; round += 1) {
        const { order, bundle } = await floor.bundled()
        const code = firstCode(order)
        await floor.wren.call(openBundle, {
          params: { bundleId: bundle.id },
          body: { pieceCodes: [code], reason: 'Wrong end up.' },
        })
        const events = [await lastEvent(code)]
        const [undone, sheet] = await Promise.all([
          floor.undo(events),
          floor.handOver(order, [bundle.code]),
        ])
        const left = undone.status === 200 ? 'pickedUp' : 'bent'
        expect((await floor.readPiece(code)).state).toBe(left)
        expect(sheet.bundles[0]?.pieces).toHaveLength(undone.status === 200 ? 3 : 2)
      }
    })
  })

  describe('of a hand-off', () => {
    it('brings a whole bundle back onto its place', async () => {
      const { order, bundle } = await floor.bundled()
      await floor.handOver(order, [bundle.code])
      expect((await floor.undo(await lastEvents(order), floor.counter)).status).toBe(200)
      const back = await floor.wren.call(getBundle, { params: { code: bundle.code } })
      expect(back).toMatchObject({ pickedUpAt: null, rackPlace: bundle.rackPlace })
      expect((await floor.readOrder(order.id)).state).toBe('ready')
      await floor.handOver(order, [bundle.code])
      expect((await floor.readOrder(order.id)).state).toBe('pickedUp')
    })

    it('of a part of a bundle is refused', async () => {
      const { order, bundle } = await floor.bundled()
      await floor.handOver(order, [bundle.code])
      const [first = 0] = await lastEvents(order)
      const answer = await floor.undo([first], floor.counter)
      expect(answer.status).toBe(409)
      expect(answer.problem().detail).toContain('with all its pieces')
      expect(await floor.statesOf(order)).toEqual(['pickedUp', 'pickedUp', 'pickedUp'])
    })

    it('is not how a return is taken back: it is signed for again', async () => {
      const { order, bundle } = await floor.bundled()
      await floor.handOver(order, [bundle.code])
      await floor.counter.call(returnBundle, {
        params: { bundleId: bundle.id },
        body: { reason: 'Roof not ready.' },
      })
      const answer = await floor.undo(await lastEvents(order), floor.counter)
      expect(answer.status).toBe(409)
      expect(answer.problem().detail).toContain('signed for')
    })
  })
})
