import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { frozenLineSchema } from '#server/features/orders/frozen-line'
import { listBrakes } from '#shared/brakes/brakes.contract'
import type { Order } from '#shared/orders/order.schema'
import { planDrawing } from '#shared/plans/plans.contract'
import { getStarter } from '#shared/profile/starters'
import { sheetOn } from '#shared/stock/sheet-on'
import { listStocks } from '#shared/stock/stock.contract'
import type { Stock } from '#shared/stock/stock.schema'
import { flatStrip } from '#shared/strip/flat-strip'
import { pieceWeight } from '#shared/strip/weight'
import { at, openFloor, type Floor } from '../../support/making-factories'
import { calibrate, createStock, zProfile } from '../../support/shop-factories'

const WORN = { kFactor: 0.5, insideRadius: 0.06 }

let floor: Floor
let brakeIds: Map<string, string>
beforeAll(async () => {
  floor = await openFloor()
  const { items } = await floor.manager.call(listBrakes)
  brakeIds = new Map(items.map(({ id, brake }) => [brake.name, id]))
})
afterAll(() => floor.close())

const idOf = (name: string): string => {
  const id = brakeIds.get(name)
  if (id === undefined) throw new Error(`The shop has no ${name}.`)
  return id
}

const readStock = async (id: string): Promise<Stock> => {
  const { items } = await floor.counter.call(listStocks)
  const stock = items.find((each) => each.id === id)
  if (!stock) throw new Error('The stock is not sold.')
  return stock
}

/** A stock that was measured on these brakes. */
async function stockMeasuredOn(...brakes: string[]): Promise<Stock> {
  const id = await createStock(floor.db)
  for (const name of brakes) {
    await calibrate(floor.db, { stockId: id, brakeId: idOf(name), personId: floor.clerk.id }, WORN)
  }
  return readStock(id)
}

const runOf = async (order: Order) => floor.readRun(at(await floor.runIds(order), 0))
const line = (stock: Stock, given: object = {}) => floor.line({ stockId: stock.id, ...given })

describe('A stock that was measured on a brake', () => {
  it('is planned on each brake by what was measured there', async () => {
    const { profile } = getStarter('eaveDrip')
    const [own, measured] = [await stockMeasuredOn(), await stockMeasuredOn('Two-way folder')]
    const plansOf = async (stock: Stock) => {
      const body = { profile, stockId: stock.id, pieceLength: 120 }
      const { brakes } = await floor.counter.call(planDrawing, { body })
      return new Map(brakes.map(({ brakeName, plan }) => [brakeName, plan.section.legs]))
    }
    const [before, after] = [await plansOf(own), await plansOf(measured)]
    const changed = [...before].filter(
      ([name, legs]) => JSON.stringify(legs) !== JSON.stringify(after.get(name)),
    )
    expect(changed.map(([name]) => name)).toEqual(['Two-way folder'])
  })

  it('shows the stock’s own strip until it is released, the brake’s from then on', async () => {
    const stock = await stockMeasuredOn(...brakeIds.keys())
    const open = await floor.submit([line(stock)])
    const own = flatStrip(zProfile(), stock.sheet)
    expect(at(open.lines, 0).strip).toEqual(own)

    const order = await floor.release(open)
    const run = await runOf(order)
    const worn = flatStrip(zProfile(), sheetOn(stock, run.brakeId))
    expect(worn.stripWidth).not.toBeCloseTo(own.stripWidth, 3)
    expect(run.strip).toEqual(worn)
    expect(at(order.lines, 0).strip).toEqual(worn)
    expect(at(order.lines, 0).pieceWeight).toBe(pieceWeight(worn, stock.sheet, 120))
  })

  it('freezes where its K comes from: the calibration of that brake and no other', async () => {
    const stock = await stockMeasuredOn(...brakeIds.keys())
    const order = await floor.release(await floor.submit([line(stock)]))
    const run = await runOf(order)
    const ofBrake = stock.calibrations.filter(({ brakeId }) => brakeId === run.brakeId)
    expect(ofBrake).toHaveLength(1)
    expect(run.stock).toEqual({
      ...stock,
      sheet: sheetOn(stock, run.brakeId),
      calibrations: ofBrake,
    })
    const [row] = await floor.db('order_lines').where({ order_id: order.id })
    expect(frozenLineSchema.parse(row?.frozen).stock).toEqual(run.stock)

    await calibrate(
      floor.db,
      { stockId: stock.id, brakeId: run.brakeId, personId: floor.clerk.id },
      { kFactor: 0.3, insideRadius: 0.01 },
    )
    expect(await floor.readRun(run.id)).toEqual(run)
    expect(await floor.readOrder(order.id)).toEqual(order)
  })

  it('says that the K is the stock’s own where the brake was not measured', async () => {
    const order = await floor.release(await floor.submit([line(await stockMeasuredOn())]))
    const run = await runOf(order)
    expect(run.stock).toMatchObject({ kSource: 'handbookHard', calibrations: [] })
  })
})

describe('A leg that only the measured radius uses up', () => {
  const shortLegs = () => zProfile([1.25, 0.13, 1.25])

  it('bends on the brakes that fold sharper, and is not planned on the others', async () => {
    const stock = await stockMeasuredOn('Ten-six folder', 'Two-way folder')
    const asked = await floor.counter.call(planDrawing, {
      body: { profile: shortLegs(), stockId: stock.id, pieceLength: 120 },
    })
    expect(asked.brakes.map(({ brakeName }) => brakeName)).toEqual(['Site brake'])
  })

  it('cannot be released where every brake folds too round, and the leg is named', async () => {
    const stock = await stockMeasuredOn(...brakeIds.keys())
    const order = await floor.submit([line(stock, { profile: shortLegs() })])
    const path = `/orders/${order.id}/release`
    const answer = await floor.counter.post(path, { version: order.version })
    expect(answer.problem()).toMatchObject({
      code: 'profile-problem',
      errors: [{ path: 'lines.0.profile.legs.1', code: 'legEatenByBends' }],
    })
    const override = {
      lineId: at(order.lines, 0).id,
      brakeId: idOf('Site brake'),
      reason: 'Will do.',
    }
    const forced = await floor.counter.post(path, {
      version: order.version,
      overrides: [override],
    })
    expect(forced.problem().code).toBe('profile-problem')
    expect(await floor.readOrder(order.id)).toEqual(order)
  })
})
