import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { newCode } from '#server/features/pieces/new-code'
import { bendPiece, getPiece } from '#shared/pieces/pieces.contract'
import {
  at,
  codesOf,
  conflictOf,
  firstCode,
  openFloor,
  type Floor,
} from '../../support/making-factories'
import { zProfile } from '../../support/shop-factories'

let floor: Floor
beforeAll(async () => {
  floor = await openFloor()
})
afterAll(() => floor.close())

const NOWHERE = '00000000-0000-4000-8000-000000000000'

describe('Marking a piece bent', () => {
  it('moves it and answers the event to take back', async () => {
    const code = firstCode(await floor.queue())
    const { piece, eventId } = await floor.bend(code)
    expect(piece).toMatchObject({ code, state: 'bent' })
    expect(piece.events.at(-1)).toMatchObject({
      id: eventId,
      from: 'queued',
      to: 'bent',
      by: 'Wren Bender',
      station: 'brake',
      reason: null,
    })
  })

  it('a second time is told who did it and when', async () => {
    const code = firstCode(await floor.queue())
    const { piece } = await floor.bend(code)
    const answer = await floor.oak.post(`/pieces/${code}/bent`, {})
    expect(answer.status).toBe(409)
    const { code: problem, detail } = answer.problem()
    expect(problem).toBe('wrong-state')
    const moment = at(piece.events, 1).at
    expect(conflictOf(answer)).toEqual({
      code,
      state: 'bent',
      at: moment,
      by: 'Wren Bender',
      station: 'brake',
    })
    expect(detail).toBe(
      `${code} was already marked bent by Wren Bender at ${moment.slice(11, 16)} UTC on ${moment.slice(0, 10)}.`,
    )
    expect(await floor.countEvents(code)).toBe(2)
  })

  it('from two browsers at once: one wins, the other is told who', async () => {
    const order = await floor.queue([floor.line({ quantity: 12 })])
    for (const code of codesOf(order)) {
      const answers = await Promise.all(
        [floor.wren, floor.oak].map((agent) => agent.post(`/pieces/${code}/bent`, {})),
      )
      expect(answers.map((answer) => answer.status).sort()).toEqual([200, 409])
      const winner = answers[0]?.status === 200 ? 'Wren Bender' : 'Oak Bender'
      const loser = answers.find((answer) => answer.status === 409)
      if (!loser) throw new Error('Both won.')
      expect(conflictOf(loser)).toMatchObject({ code, state: 'bent', by: winner })
      expect(await floor.countEvents(code)).toBe(2)
    }
  })

  it('sent again with the same key moves once and answers the same', async () => {
    const code = firstCode(await floor.queue())
    const idempotencyKey = randomUUID()
    const send = () => floor.wren.post(`/pieces/${code}/bent`, {}, { idempotencyKey })
    const first = await send()
    const again = await send()
    expect(first.status).toBe(200)
    expect(again.status).toBe(200)
    expect(again.body).toEqual(first.body)
    expect(await floor.countEvents(code)).toBe(2)
  })

  it('of a scrapped piece says what it would have to be', async () => {
    const code = firstCode(await floor.queue())
    await floor.scrap(code)
    const answer = await floor.wren.post(`/pieces/${code}/bent`, {})
    expect(answer.status).toBe(409)
    expect(conflictOf(answer).state).toBe('scrapped')
    expect(answer.problem().detail).toContain('Only a piece that is queued can be marked bent.')
  })

  it('takes a piece of the run on the screen', async () => {
    const order = await floor.queue()
    const [runId] = await floor.runIds(order)
    const { piece } = await floor.wren.call(bendPiece, {
      params: { code: firstCode(order) },
      body: { runId },
    })
    expect(piece).toMatchObject({ state: 'bent', runId })
  })

  it('refuses a piece of another run and says which run it belongs to', async () => {
    const order = await floor.queue([
      floor.line({ mark: 'A', name: 'Closure', quantity: 1 }),
      floor.line({ mark: 'B', name: 'Tall closure', quantity: 1, profile: zProfile([1, 4, 1]) }),
    ])
    const [first = '', second = ''] = await floor.runIds(order)
    const code = at(codesOf(order), 1)
    const answer = await floor.wren.post(`/pieces/${code}/bent`, { runId: first })
    expect(answer.status).toBe(409)
    const { number } = await floor.readRun(second)
    expect(answer.problem().detail).toContain(`${code} belongs to run ${number} (Tall closure)`)
    expect(answer.problem().current).toEqual({ code, runId: second, runNumber: number })
    expect((await floor.readPiece(code)).state).toBe('queued')
  })

  it('on the screen of no run at all is refused', async () => {
    const code = firstCode(await floor.queue())
    const answer = await floor.wren.post(`/pieces/${code}/bent`, { runId: NOWHERE })
    expect(answer.status).toBe(409)
    expect(await floor.countEvents(code)).toBe(1)
  })

  it('is not for a crew lead or the counter', async () => {
    const code = firstCode(await floor.queue())
    for (const agent of [floor.crew.agent, floor.counter]) {
      expect((await agent.post(`/pieces/${code}/bent`, {})).status).toBe(403)
    }
    expect(await floor.countEvents(code)).toBe(1)
  })
})

describe('The code of a piece', () => {
  it('may be typed small, with gaps, and with O for 0 and I for 1', async () => {
    const code = firstCode(await floor.queue())
    const typed = ` ${code.slice(0, 4).toLowerCase()}-${code.slice(4)}`
      .replace(/0/g, 'O')
      .replace(/1/g, 'I')
    const piece = await floor.wren.call(getPiece, { params: { code: typed } })
    expect(piece.code).toBe(code)
  })

  it.each([
    ['one wrong character', (code: string) => wrongLast(code), 'One character is wrong'],
    ['a character too few', (code: string) => code.slice(1), 'eight characters'],
    ['no kind letter', (code: string) => `X${code.slice(1)}`, 'begins with P'],
    ['a sign', (code: string) => `${code.slice(0, -1)}*`, 'letters and digits'],
  ])('with %s is refused, naming the cure', async (_, spoil, cure) => {
    const code = firstCode(await floor.queue())
    const answer = await floor.wren.post(`/pieces/${spoil(code)}/bent`, {})
    expect(answer.status).toBe(400)
    const { code: problem, errors } = answer.problem()
    expect(problem).toBe('invalid-input')
    expect(errors).toHaveLength(1)
    expect(errors?.[0]?.path).toBe('code')
    expect(errors?.[0]?.message).toContain(cure)
    expect(errors?.[0]?.message).toContain('compare it with the label')
    expect(await floor.countEvents(code)).toBe(1)
  })

  it('that no label bears is not found', async () => {
    const answer = await floor.wren.post(`/pieces/${newCode('piece')}/bent`, {})
    expect(answer.status).toBe(404)
    expect(answer.problem().code).toBe('not-found')
  })

  it('of another kind is refused, saying what it is', async () => {
    const { bundle } = await floor.bundled()
    const answer = await floor.wren.post(`/pieces/${bundle.code}/bent`, {})
    expect(answer.status).toBe(400)
    expect(answer.problem().errors?.[0]?.message).toBe(
      `${bundle.code} is the code of a bundle. Type or scan the code of a piece.`,
    )
  })
})

describe('One piece', () => {
  it('is read with everything that happened to it, oldest first', async () => {
    const { order, bundle } = await floor.bundled([
      floor.line({ quantity: 1, mark: 'N', length: 96 }),
    ])
    await floor.handOver(order, [bundle.code])
    const piece = await floor.readPiece(firstCode(order))
    expect(piece).toMatchObject({
      state: 'pickedUp',
      mark: 'N',
      length: 96,
      sequence: 1,
      quantity: 1,
      orderId: order.id,
      orderNumber: order.number,
      bundleCode: bundle.code,
      rackPlace: null,
      remakeOf: null,
      remadeAs: null,
    })
    expect(piece.events.map(({ from, to, by, station }) => [from, to, by, station])).toEqual([
      [null, 'queued', 'Cy Counter', 'counter'],
      ['queued', 'bent', 'Wren Bender', 'brake'],
      ['bent', 'bundled', 'Wren Bender', 'rack'],
      ['bundled', 'pickedUp', 'Cy Counter', 'counter'],
    ])
    const moments = piece.events.map((event) => event.at)
    expect(moments).toEqual(moments.toSorted())
  })

  it('shows where it lies while it is bundled', async () => {
    const order = await floor.queue([floor.line({ quantity: 1 })])
    await floor.bundle(order, await floor.bendAll(order), 'F12')
    expect((await floor.readPiece(firstCode(order))).rackPlace).toBe('F12')
  })

  it('is read by the crew that ordered it and by no other', async () => {
    const code = firstCode(await floor.queue())
    expect((await floor.crew.agent.get(`/pieces/${code}`)).status).toBe(200)
    expect((await floor.otherCrew.agent.get(`/pieces/${code}`)).status).toBe(404)
    expect((await floor.counter.get(`/pieces/${code}`)).status).toBe(200)
  })

  it('tells its crew at once that it moved, and the shop about run and rack', async () => {
    const order = await floor.queue()
    const code = firstCode(order)
    const before = await floor.db('live_events').orderBy('id', 'desc').first('id')
    await floor.bend(code)
    const told = await floor
      .db('live_events')
      .where('id', '>', before?.id ?? 0)
      .orderBy('id')
    const company = { audience: 'company', company_id: floor.crew.companyId }
    const shop = { audience: 'shop', company_id: null }
    expect(
      told.map(({ topic, entity_id, audience, company_id }) => ({
        topic,
        entity_id,
        audience,
        company_id,
      })),
    ).toEqual([
      { topic: 'orders', entity_id: order.id, ...company },
      { topic: 'pieces', entity_id: code, ...company },
      { topic: 'runs', entity_id: (await floor.readPiece(code)).runId, ...shop },
      { topic: 'rack', entity_id: null, ...shop },
    ])
  })
})

/** Another letter in place of the last one. */
function wrongLast(code: string): string {
  return code.slice(0, -1) + (code.endsWith('7') ? '8' : '7')
}
