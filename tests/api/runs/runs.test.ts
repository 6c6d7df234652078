import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { leaveRun, listRuns } from '#shared/runs/runs.contract'
import { at, codesOf, openFloor, type Floor } from '../../support/making-factories'
import { createStock, zProfile } from '../../support/shop-factories'

let floor: Floor
beforeAll(async () => {
  floor = await openFloor()
})
afterAll(() => floor.close())

const NOWHERE = '00000000-0000-4000-8000-000000000000'

const queueRun = async (quantity = 3) => {
  const order = await floor.queue([floor.line({ quantity })])
  return { order, runId: at(await floor.runIds(order), 0) }
}
const list = async (state: 'open' | 'done') =>
  (await floor.wren.call(listRuns, { query: { state } })).items

describe('The queue of runs', () => {
  it('shows a run as long as one of its pieces is queued, afterwards among the done ones', async () => {
    const { runId } = await queueRun(2)
    const ids = async (state: 'open' | 'done') => (await list(state)).map((run) => run.id)
    await floor.bendNext(runId, 1)
    expect(await ids('open')).toContain(runId)
    expect(await ids('done')).not.toContain(runId)
    await floor.bendNext(runId, 1)
    expect(await ids('open')).not.toContain(runId)
    expect((await ids('done'))[0]).toBe(runId)
  })

  it('opens a done run again for a remake', async () => {
    const { order, runId } = await queueRun(1)
    await floor.bendNext(runId, 1)
    await floor.scrap(at(codesOf(order), 0))
    expect((await list('open')).map((run) => run.id)).toContain(runId)
  })

  it('begins with what is needed first, then goes by number', async () => {
    const lines = () => [floor.line({ quantity: 1 })]
    const late = await floor.release(await floor.submit(lines(), { neededBy: '2098-05-02' }))
    const soon = await floor.release(await floor.submit(lines(), { neededBy: '2098-05-01' }))
    const soonToo = await floor.release(await floor.submit(lines(), { neededBy: '2098-05-01' }))
    const open = await list('open')
    const numbers = open
      .map((run) => run.orderNumber)
      .filter((number) => [late, soon, soonToo].some((order) => order.number === number))
    expect(numbers).toEqual([soon.number, soonToo.number, late.number])
  })

  it('says of each run what it is made of and how far it is', async () => {
    const order = await floor.queue([
      floor.line({ mark: 'A', quantity: 2, length: 120, name: 'Long ones' }),
      floor.line({ mark: 'B', quantity: 4, length: 96 }),
    ])
    const [runId = ''] = await floor.runIds(order)
    await floor.bendNext(runId, 2)
    await floor.scrap(at(codesOf(order), 0))
    const run = (await list('open')).find((candidate) => candidate.id === runId)
    expect(run).toMatchObject({
      name: 'Long ones',
      orderNumber: order.number,
      company: order.company.name,
      job: order.job.name,
      neededBy: order.neededBy,
      claimedBy: null,
      stock: { id: floor.stockId },
      lengths: [
        { length: 120, count: 2 },
        { length: 96, count: 4 },
      ],
      progress: { queued: 5, bent: 1, bundled: 0, pickedUp: 0, scrapped: 1, withdrawn: 0 },
    })
    expect(run?.strip.stripWidth).toBeGreaterThan(0)
  })

  describe('marks runs of the stock that their brake bent last', () => {
    /** Runs of two pieces each, all on one brake: two of the shop's stock and one of another. */
    const queueThree = async () => {
      const otherStock = await createStock(floor.db)
      const ids: string[] = []
      for (const stockId of [floor.stockId, floor.stockId, otherStock]) {
        const order = await floor.queue([floor.line({ stockId, quantity: 2 })])
        ids.push(at(await floor.runIds(order), 0))
      }
      const { brakeId } = await floor.readRun(at(ids, 0))
      await floor.db.raw('update runs set brake_id = ? where id = any(?)', [brakeId, ids])
      return {
        ids,
        marks: () => Promise.all(ids.map(async (id) => (await floor.readRun(id)).sameStock)),
      }
    }

    it('in the list and alone, but neither that run itself nor what is done', async () => {
      const { ids, marks } = await queueThree()
      const [first = '', second = '', other = ''] = ids
      await floor.bendNext(first, 1)
      expect(await marks()).toEqual([false, true, false])
      const listed = (await list('open')).filter(({ id }) => ids.includes(id))
      expect(listed.map(({ sameStock }) => sameStock)).toEqual([false, true, false])
      await floor.bendNext(other, 1)
      expect(await marks()).toEqual([false, false, false])
      await floor.bendNext(second, 2)
      expect(await marks()).toEqual([true, false, false])
      await floor.bendNext(first, 1)
      expect(await marks()).toEqual([false, false, false])
    })

    it('and forgets what was taken back', async () => {
      const { ids, marks } = await queueThree()
      const [first = '', , other = ''] = ids
      await floor.bendNext(other, 1)
      const { eventIds } = await floor.bendNext(first, 1)
      expect(await marks()).toEqual([false, true, false])
      expect((await floor.undo(eventIds)).status).toBe(200)
      expect(await marks()).toEqual([false, false, false])
    })
  })

  it('is not shown to crew leads', async () => {
    expect((await floor.crew.agent.get('/runs')).status).toBe(403)
  })
})

describe('One run', () => {
  it('lists its pieces in the order in which they are bent, with their weights', async () => {
    const order = await floor.queue([
      floor.line({ mark: 'A', quantity: 2, length: 120 }),
      floor.line({ mark: 'B', quantity: 1, length: 60 }),
    ])
    const [runId = ''] = await floor.runIds(order)
    const [first = ''] = codesOf(order)
    const { eventId } = await floor.bend(first)
    const run = await floor.readRun(runId)
    expect(run.pieces.map((piece) => piece.code)).toEqual(codesOf(order))
    expect(run.pieces.map(({ mark, sequence, quantity }) => [mark, sequence, quantity])).toEqual([
      ['A', 1, 2],
      ['A', 2, 2],
      ['B', 1, 1],
    ])
    expect(run.pieces[0]).toMatchObject({ state: 'bent', by: 'Wren Bender', lastEventId: eventId })
    expect(run.pieces[1]).toMatchObject({ state: 'queued', by: 'Cy Counter' })
    const [long, , short] = run.pieces
    expect(long?.weight).toBeCloseTo(2 * (short?.weight ?? 0), 9)
    expect(long?.weight).toBe(order.lines[0]?.pieceWeight)
    expect(run.plan.feasible).toBe(true)
    expect(run.brake.name).toBe(run.brakeName)
  })

  it('puts a remake right behind the piece it replaces', async () => {
    const { order, runId } = await queueRun(3)
    const [first = '', second = '', third = ''] = codesOf(order)
    const { remake } = await floor.scrap(second)
    const codes = (await floor.readRun(runId)).pieces.map((piece) => piece.code)
    expect(codes).toEqual([first, second, remake.code, third])
  })

  it('that does not exist is not found', async () => {
    expect((await floor.wren.get(`/runs/${NOWHERE}`)).status).toBe(404)
    expect((await floor.wren.post(`/runs/${NOWHERE}/claim`, {})).status).toBe(404)
    expect((await floor.wren.post(`/runs/${NOWHERE}/bent`, { count: 1 })).status).toBe(404)
  })
})

describe('Taking a run', () => {
  it('shows who has it', async () => {
    const { runId } = await queueRun()
    const run = await floor.claim(runId)
    expect(run.claimedBy).toMatchObject({ id: floor.wrenPerson.id, name: 'Wren Bender' })
  })

  it('two at once: one gets it, the other is told who and when', async () => {
    for (let round = 0; round < 8; round += 1) {
      const { runId } = await queueRun(1)
      const answers = await Promise.all(
        [floor.wren, floor.oak].map((agent) => agent.post(`/runs/${runId}/claim`, {})),
      )
      expect(answers.map((answer) => answer.status).sort()).toEqual([200, 409])
      const { claimedBy } = await floor.readRun(runId)
      expect(claimedBy?.name).toBe(answers[0]?.status === 200 ? 'Wren Bender' : 'Oak Bender')
      const loser = answers.find((answer) => answer.status === 409)?.problem()
      expect(loser?.code).toBe('wrong-state')
      expect(loser?.current).toEqual({ claimedBy })
      expect(loser?.detail).toContain(`${claimedBy?.name} took run`)
    }
  })

  it('again by the same person changes nothing', async () => {
    const { runId } = await queueRun()
    const first = await floor.claim(runId)
    expect((await floor.claim(runId)).claimedBy).toEqual(first.claimedBy)
  })

  it('is given back by who has it, and then free for another', async () => {
    const { runId } = await queueRun()
    await floor.claim(runId)
    const left = await floor.wren.call(leaveRun, { params: { runId }, body: {} })
    expect(left.claimedBy).toBeNull()
    expect((await floor.claim(runId, floor.oak)).claimedBy?.name).toBe('Oak Bender')
  })

  it('is not given back by another bender, but by a manager', async () => {
    const { runId } = await queueRun()
    await floor.claim(runId)
    const answer = await floor.oak.post(`/runs/${runId}/leave`, {})
    expect(answer.status).toBe(403)
    expect((await floor.readRun(runId)).claimedBy?.name).toBe('Wren Bender')
    const left = await floor.manager.call(leaveRun, { params: { runId }, body: {} })
    expect(left.claimedBy).toBeNull()
  })

  it('that nobody has can be given back without harm', async () => {
    const { runId } = await queueRun()
    const left = await floor.wren.call(leaveRun, { params: { runId }, body: {} })
    expect(left.claimedBy).toBeNull()
  })
})

describe('Bending by count', () => {
  it('marks the next pieces in the order of the run, one event a piece', async () => {
    const { order, runId } = await queueRun(5)
    const codes = codesOf(order)
    await floor.bend(at(codes, 1))
    const { run, eventIds } = await floor.bendNext(runId, 2)
    expect(eventIds).toHaveLength(2)
    expect(run.pieces.map((piece) => piece.state)).toEqual([
      'bent',
      'bent',
      'bent',
      'queued',
      'queued',
    ])
    expect([run.pieces[0]?.lastEventId, run.pieces[2]?.lastEventId]).toEqual(eventIds)
  })

  it('of one length leaves the other lengths alone', async () => {
    const order = await floor.queue([
      floor.line({ mark: 'A', quantity: 2, length: 120 }),
      floor.line({ mark: 'B', quantity: 2, length: 84.5 }),
    ])
    const [runId = ''] = await floor.runIds(order)
    const answer = await floor.wren.post(`/runs/${runId}/bent`, { count: 2, length: 84.5 })
    expect(answer.status).toBe(200)
    const states = (await floor.readRun(runId)).pieces.map((piece) => piece.state)
    expect(states).toEqual(['queued', 'queued', 'bent', 'bent'])
    const none = await floor.wren.post(`/runs/${runId}/bent`, { count: 1, length: 84.5 })
    expect(none.status).toBe(409)
    expect(none.problem().current).toEqual({ left: 0 })
  })

  it('of more than are left bends none and tells how many there are', async () => {
    const { order, runId } = await queueRun(3)
    const answer = await floor.wren.post(`/runs/${runId}/bent`, { count: 4 })
    expect(answer.status).toBe(409)
    expect(answer.problem().current).toEqual({ left: 3 })
    expect(answer.problem().detail).toContain('Only 3 pieces are left to bend')
    expect(await floor.statesOf(order)).toEqual(['queued', 'queued', 'queued'])
  })

  it('by two at once never bends a piece twice, nor more than there are', async () => {
    const { order, runId } = await queueRun(9)
    const answers = await Promise.all(
      [floor.wren, floor.oak, floor.manager].map((agent) =>
        agent.post(`/runs/${runId}/bent`, { count: 4 }),
      ),
    )
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, 200, 409])
    const refused = answers.find((answer) => answer.status === 409)
    expect(refused?.problem().current).toEqual({ left: 1 })
    const states = await floor.statesOf(order)
    expect(states.filter((state) => state === 'bent')).toHaveLength(8)
    const { pieces } = await floor.readRun(runId)
    for (const { code, state } of pieces) {
      expect(await floor.countEvents(code)).toBe(state === 'bent' ? 2 : 1)
    }
  })

  it('beside scans of single pieces takes only what they left', async () => {
    const { order, runId } = await queueRun(6)
    const codes = codesOf(order)
    const scans = codes.slice(0, 3).map((code) => floor.oak.post(`/pieces/${code}/bent`, {}))
    const [counted, ...scanned] = await Promise.all([
      floor.wren.post(`/runs/${runId}/bent`, { count: 3 }),
      ...scans,
    ])
    expect(counted.status).toBe(200)
    const bentByScan = scanned.filter((answer) => answer.status === 200).length
    const states = await floor.statesOf(order)
    expect(states.filter((state) => state === 'bent')).toHaveLength(3 + bentByScan)
    for (const code of codes) expect(await floor.countEvents(code)).toBeLessThanOrEqual(2)
  })

  it("does not touch the order's other runs", async () => {
    const order = await floor.queue([
      floor.line({ mark: 'A', quantity: 2 }),
      floor.line({ mark: 'B', quantity: 2, profile: zProfile([2, 3, 2]) }),
    ])
    const [first = '', second = ''] = await floor.runIds(order)
    await floor.bendNext(second, 2)
    expect((await floor.readRun(first)).progress).toMatchObject({ queued: 2, bent: 0 })
  })
})
