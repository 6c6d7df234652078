import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { listBrakes } from '#shared/brakes/brakes.contract'
import {
  calibrateStock,
  listStocks,
  listTestBends,
  recordTestBend,
  withdrawTestBend,
} from '#shared/stock/stock.contract'
import type { Sheet } from '#shared/stock/stock.schema'
import { flatStrip } from '#shared/strip/flat-strip'
import { at, openFloor, type Floor } from '../../support/making-factories'
import { createStock, testBendInput, zProfile } from '../../support/shop-factories'

let floor: Floor
let brakeIds: string[]
beforeAll(async () => {
  floor = await openFloor()
  const { items } = await floor.manager.call(listBrakes)
  brakeIds = items.map(({ id }) => id)
})
afterAll(() => floor.close())

/** What a brake with a worn nose makes of the stock. */
const WORN = { kFactor: 0.44, insideRadius: 0.045 }

/** The strip of 3 and 2 in. bent by `turn` that was cut on a brake with this K and radius. */
const bendOn = (brakeId: string, turn: number, truth: Pick<Sheet, 'kFactor' | 'insideRadius'>) => {
  const profile = { ...zProfile(), legs: [3, 2], bends: [{ turn }] }
  const { stripWidth } = flatStrip(profile, { thickness: 0.0239, ...truth })
  return testBendInput(brakeId, { turn, stripWidth })
}

const newStock = () => createStock(floor.db)
const brake = (place: number) => at(brakeIds, place)
const read = (stockId: string) => floor.manager.call(listTestBends, { params: { stockId } })

/** A stock with two bends on the first brake, which give K and radius. */
async function measuredStock() {
  const stockId = await newStock()
  for (const turn of [90, 135]) {
    const body = bendOn(brake(0), turn, WORN)
    await floor.wren.call(recordTestBend, { params: { stockId }, body })
  }
  const { fits, bends } = await read(stockId)
  return { stockId, fit: at(fits, 0), bends }
}

const calibrate = (stockId: string, fit: { kFactor: number; insideRadius: number } | null) =>
  floor.manager.post(`/stocks/${stockId}/calibrations`, {
    brakeId: brake(0),
    fit: fit && { kFactor: fit.kFactor, insideRadius: fit.insideRadius },
  })

describe('Recording a test bend', () => {
  it('keeps what was measured, by whom and when, and gives nothing to cut by yet', async () => {
    const stockId = await newStock()
    const body = testBendInput(brake(1), { note: 'Near the left end.' })
    const answer = await floor.wren.call(recordTestBend, { params: { stockId }, body })
    expect(answer.bends).toMatchObject([{ ...body, by: 'Wren Bender', withdrawn: null }])
    expect(answer.stock.calibrations).toEqual([])
    expect(await read(stockId)).toEqual(answer)
  })

  it('fits K and radius a brake, from bends at two angles', async () => {
    const { stockId, fit } = await measuredStock()
    expect(fit).toMatchObject({ brakeId: brake(0), bends: 2 })
    expect(fit.kFactor).toBeCloseTo(WORN.kFactor, 6)
    expect(fit.insideRadius).toBeCloseTo(WORN.insideRadius, 6)
    // Another brake makes other bends.
    await floor.wren.call(recordTestBend, {
      params: { stockId },
      body: { ...bendOn(brake(2), 90, { kFactor: 0.4, insideRadius: 0.02 }), insideRadius: 0.02 },
    })
    const { fits, bends } = await read(stockId)
    expect(fits.map(({ brakeId }) => brakeId)).toEqual([brake(0), brake(2)])
    expect(bends.map(({ turn }) => turn)).toEqual([90, 135, 90])
    expect(bends.map(({ brakeId }) => brakeId)).toEqual([brake(2), brake(0), brake(0)])
  })

  it('gives no fit where a radius is missing or the bends contradict each other', async () => {
    const stockId = await newStock()
    const record = (change: object) =>
      floor.wren.call(recordTestBend, {
        params: { stockId },
        body: { ...bendOn(brake(0), 90, WORN), ...change },
      })
    expect((await record({})).fits).toEqual([])
    expect((await record({ insideRadius: WORN.insideRadius })).fits).toHaveLength(1)
    expect((await record({ legA: 3.06 })).fits).toEqual([])
  })

  it('is done once under a retry with the same key', async () => {
    const stockId = await newStock()
    const idempotencyKey = randomUUID()
    const path = `/stocks/${stockId}/test-bends`
    const send = () => floor.wren.post(path, testBendInput(brake(0)), { idempotencyKey })
    const answers = await Promise.all([send(), send()])
    expect(answers.map(({ status }) => status)).toEqual([201, 201])
    expect((await read(stockId)).bends).toHaveLength(1)
  })

  it.each([
    ['no strip', { stripWidth: 0 }, 'stripWidth'],
    ['a bend that is none', { turn: 0 }, 'turn'],
    ['a bend back on itself', { turn: 180 }, 'turn'],
    ['a thickness of plate', { thickness: 0.6 }, 'thickness'],
    ['a brake that is not there', { brakeId: randomUUID() }, 'brakeId'],
    ['measures that put K outside the sheet', { stripWidth: 4.7, insideRadius: 0 }, 'stripWidth'],
  ])('refuses %s, naming the field', async (_what, wrong, path) => {
    const stockId = await newStock()
    const body = { ...testBendInput(brake(0)), ...wrong }
    const answer = await floor.wren.post(`/stocks/${stockId}/test-bends`, body)
    expect(answer.status).toBe(400)
    expect(answer.problem().errors).toMatchObject([{ path }])
    expect((await read(stockId)).bends).toEqual([])
  })

  it('finds no stock that is not there', async () => {
    const path = `/stocks/${randomUUID()}`
    const answers = [
      await floor.manager.get(`${path}/test-bends`),
      await floor.manager.post(`${path}/test-bends`, testBendInput(brake(0))),
      await floor.manager.post(`${path}/calibrations`, { brakeId: brake(0), fit: null }),
    ]
    expect(answers.map(({ status }) => status)).toEqual([404, 404, 404])
  })
})

describe('Withdrawing a test bend', () => {
  it('leaves it in the list with who and why, and out of the fit', async () => {
    const { stockId, bends } = await measuredStock()
    const bendId = at(bends, 0).id
    const answer = await floor.oak.call(withdrawTestBend, {
      params: { stockId, bendId },
      body: { reason: 'The strip was measured over its burr.' },
    })
    expect(answer.fits).toEqual([])
    expect(answer.bends.map(({ withdrawn }) => withdrawn?.by)).toEqual(['Oak Bender', undefined])
    expect(at(answer.bends, 0).withdrawn?.reason).toBe('The strip was measured over its burr.')
  })

  it('happens once: the second of two is told who was first', async () => {
    const { stockId, bends } = await measuredStock()
    const path = `/stocks/${stockId}/test-bends/${at(bends, 0).id}/withdrawal`
    const answers = await Promise.all([
      floor.wren.post(path, { reason: 'Mine.' }),
      floor.oak.post(path, { reason: 'Mine.' }),
    ])
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409])
    const late = answers.find(({ status }) => status === 409)?.problem()
    const [withdrawn] = (await read(stockId)).bends.flatMap((bend) => bend.withdrawn ?? [])
    expect(late).toMatchObject({ code: 'wrong-state', current: withdrawn })
  })

  it('finds no bend of another stock', async () => {
    const { bends } = await measuredStock()
    const path = `/stocks/${await newStock()}/test-bends/${at(bends, 0).id}/withdrawal`
    expect((await floor.wren.post(path, { reason: 'Wrong door.' })).status).toBe(404)
  })

  it('is the one change that the database takes', async () => {
    const { bends } = await measuredStock()
    const row = () => floor.db('test_bends').where({ id: at(bends, 0).id })
    await expect(floor.db.raw('update test_bends set leg_a = 4')).rejects.toThrow('withdrawn')
    await expect(row().delete()).rejects.toThrow('append-only')
    await expect(floor.db.raw('truncate test_bends')).rejects.toThrow('append-only')
    const withdrawal = { withdrawn_by: floor.wrenPerson.id, withdrawn_at: new Date() }
    await row().update({ ...withdrawal, withdrawn_reason: 'Slipped.' })
    await expect(row().update({ ...withdrawal, withdrawn_reason: 'No.' })).rejects.toThrow('once')
  })
})

describe('Taking a fit into use', () => {
  it('is shown with the stock everywhere, with who and when', async () => {
    const { stockId, fit } = await measuredStock()
    expect((await calibrate(stockId, fit)).status).toBe(200)
    const { items } = await floor.crew.agent.call(listStocks)
    const [calibration] = items.find(({ id }) => id === stockId)?.calibrations ?? []
    expect(calibration).toMatchObject({ brakeId: brake(0), bends: 2, by: 'Mo Manager' })
    expect(calibration?.kFactor).toBeCloseTo(WORN.kFactor, 6)
    // The stock's own stays what it was.
    expect((await read(stockId)).stock.sheet).toMatchObject({ kFactor: 0.4, insideRadius: 0.03 })
  })

  it('can be taken back, and the history stays', async () => {
    const { stockId, fit } = await measuredStock()
    await calibrate(stockId, fit)
    await calibrate(stockId, null)
    expect((await read(stockId)).stock.calibrations).toEqual([])
    await calibrate(stockId, fit)
    expect((await read(stockId)).stock.calibrations).toHaveLength(1)
    const rows = await floor.db('calibrations').where({ stock_id: stockId }).orderBy('id')
    expect(rows.map((row) => row.bends)).toEqual([2, null, 2])
    await expect(floor.db('calibrations').delete()).rejects.toThrow('append-only')
    await expect(floor.db.raw('update calibrations set bends = 3')).rejects.toThrow('append-only')
  })

  it('is written once, however often it is asked for', async () => {
    const { stockId, fit } = await measuredStock()
    const answers = await Promise.all([calibrate(stockId, fit), calibrate(stockId, fit)])
    expect(answers.map(({ status }) => status)).toEqual([200, 200])
    expect(await floor.db('calibrations').where({ stock_id: stockId })).toHaveLength(1)
    const none = await newStock()
    expect((await calibrate(none, null)).status).toBe(200)
    expect(await floor.db('calibrations').where({ stock_id: none })).toEqual([])
  })

  it('shows the fit as it is by now to who saw another', async () => {
    const { stockId, fit, bends } = await measuredStock()
    await floor.wren.call(recordTestBend, {
      params: { stockId },
      body: bendOn(brake(0), 45, { ...WORN, kFactor: 0.5 }),
    })
    const late = await calibrate(stockId, fit)
    expect(late.status).toBe(409)
    expect(late.problem()).toMatchObject({
      code: 'changed-meanwhile',
      current: { fits: [{ brakeId: brake(0), bends: 3 }] },
    })
    const withdrawn = { reason: 'Not counted.' }
    await floor.wren.post(`/stocks/${stockId}/test-bends/${at(bends, 0).id}/withdrawal`, withdrawn)
    expect((await calibrate(stockId, fit)).status).toBe(409)
    expect((await read(stockId)).stock.calibrations).toEqual([])
  })

  it('needs a brake of the shop', async () => {
    const { stockId, fit } = await measuredStock()
    const { kFactor, insideRadius } = fit
    const body = { brakeId: randomUUID(), fit: { kFactor, insideRadius } }
    const answer = await floor.manager.post(`/stocks/${stockId}/calibrations`, body)
    expect(answer.problem().errors).toMatchObject([{ path: 'brakeId' }])
  })

  it('is the manager’s: a bender measures, the counter reads', async () => {
    const { stockId, fit } = await measuredStock()
    const { kFactor, insideRadius } = fit
    const body = { brakeId: brake(0), fit: { kFactor, insideRadius } }
    const path = `/stocks/${stockId}`
    expect((await floor.wren.post(`${path}/calibrations`, body)).status).toBe(403)
    expect((await floor.counter.post(`${path}/test-bends`, {})).status).toBe(403)
    const read = await floor.counter.call(listTestBends, { params: { stockId } })
    expect(read.bends).toHaveLength(2)
  })

  it('is told to every screen, a test bend to those of the shop', async () => {
    const { stockId, fit } = await measuredStock()
    const last = await floor.db('live_events').max<{ id: number | null }[]>('id as id').first()
    await floor.wren.call(recordTestBend, { params: { stockId }, body: testBendInput(brake(1)) })
    await floor.manager.call(calibrateStock, {
      params: { stockId },
      body: {
        brakeId: brake(0),
        fit: { kFactor: fit.kFactor, insideRadius: fit.insideRadius },
      },
    })
    const told = await floor
      .db('live_events')
      .where('id', '>', last?.id ?? 0)
      .orderBy('id')
      .select('topic', 'entity_id', 'audience')
    expect(told).toEqual([
      { topic: 'stocks', entity_id: stockId, audience: 'shop' },
      { topic: 'stocks', entity_id: stockId, audience: 'all' },
    ])
  })
})
