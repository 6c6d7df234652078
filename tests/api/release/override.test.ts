import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { listBrakes } from '#shared/brakes/brakes.contract'
import { releaseOrder } from '#shared/orders/orders.contract'
import { planDrawing } from '#shared/plans/plans.contract'
import { getRun, listRuns } from '#shared/runs/runs.contract'
import { FakeClock } from '../../support/fake-clock'
import { unbendableProfile, zProfile } from '../../support/shop-factories'
import { openShop, type Shop } from '../../support/shop-scene'

const REASON = 'Old Tam bends it in two stages.'
const NOW = new Date('2026-03-02T15:00:00.000Z')

let shop: Shop
let brakeIds: Record<string, string>
beforeAll(async () => {
  shop = await openShop({ clock: new FakeClock(NOW) })
  const { items } = await shop.counter.call(listBrakes)
  brakeIds = Object.fromEntries(items.map(({ id, brake }) => [brake.name, id]))
})
afterAll(() => shop.close())

const idOf = (brakeName: string): string => {
  const id = brakeIds[brakeName]
  if (id === undefined) throw new Error(`The shop has no ${brakeName}.`)
  return id
}

type Overrides = { lineId: string; brakeId: string; reason: string }[]
const tryRelease = (order: { id: string; version: number }, overrides: Overrides) =>
  shop.counter.post(`/orders/${order.id}/release`, { version: order.version, overrides })

/** An order of a line that bends and one that bends nowhere. */
async function submitTwo() {
  const order = await shop.submit([
    shop.line({ mark: 'A' }),
    shop.line({ mark: 'B', profile: unbendableProfile() }),
  ])
  const [bends, stuck] = order.lines
  if (!bends || !stuck) throw new Error('The order has two lines.')
  return { order, bends, stuck }
}

describe('A line that no brake bends', () => {
  it('is released all the same on the brake that somebody names, with name, time and reason', async () => {
    const { order, stuck } = await submitTwo()
    const released = await shop.counter.call(releaseOrder, {
      params: { orderId: order.id },
      body: {
        version: order.version,
        overrides: [{ lineId: stuck.id, brakeId: idOf('Site brake'), reason: ` ${REASON} ` }],
      },
    })
    const override = { by: 'Cy Counter', at: NOW.toISOString(), reason: REASON }
    expect(released.state).toBe('released')
    expect(released.lines.map((line) => line.override)).toEqual([null, override])
    expect(released.lines[1]?.bendsOn).toEqual(['Site brake'])
    expect(released.lines[1]?.pieces).toHaveLength(3)
    expect(released.events.at(-1)).toMatchObject({
      kind: 'released',
      by: 'Cy Counter',
      text: `B → Site brake: ${REASON}`,
    })
    expect(await shop.readOrder(order.id)).toEqual(released)
  })

  it('has a run that says so, frozen with the plan that has no steps', async () => {
    const { order, stuck } = await submitTwo()
    const brakeId = idOf('Two-way folder')
    const asked = await shop.counter.call(planDrawing, {
      body: { profile: stuck.profile, stockId: shop.stockId, pieceLength: stuck.length },
    })
    const expected = asked.brakes.find((each) => each.brakeId === brakeId)?.plan
    await tryRelease(order, [{ lineId: stuck.id, brakeId, reason: REASON }])

    const bender = await shop.api.signInAs('bender')
    const { items } = await bender.call(listRuns)
    const ofOrder = items.filter(({ orderNumber }) => orderNumber === order.number)
    expect(ofOrder.map(({ override }) => override?.reason ?? null).toSorted()).toEqual(
      [null, REASON].toSorted(),
    )
    const overridden = ofOrder.find(({ override }) => override !== null)
    const run = await bender.call(getRun, { params: { runId: overridden?.id ?? '' } })
    expect(run).toMatchObject({ brakeId, override: { by: 'Cy Counter', reason: REASON } })
    expect(run.plan).toEqual(expected)
    expect(run.plan).toMatchObject({ feasible: false, steps: [] })
    expect(run.pieces).toHaveLength(3)
  })

  it('is not put into one run with another reason, nor with pieces that do bend', async () => {
    // Too long for every brake, and short enough for each.
    const long = zProfile([1.5, 2, 1.5])
    await shop.db('stocks').where({ id: shop.stockId }).update({ longest_piece: 200 })
    const order = await shop.submit([
      shop.line({ mark: 'A', profile: long, length: 100 }),
      shop.line({ mark: 'B', profile: long, length: 150 }),
      shop.line({ mark: 'C', profile: long, length: 160 }),
      shop.line({ mark: 'D', profile: long, length: 170 }),
    ])
    const brakeId = idOf('Ten-six folder')
    const reasons = ['', REASON, 'Two benders hold the end.', REASON]
    const overrides = order.lines.flatMap(({ id }, index) =>
      index === 0 ? [] : [{ lineId: id, brakeId, reason: reasons[index] ?? '' }],
    )
    expect((await tryRelease(order, overrides)).status).toBe(200)
    const { lines } = await shop.readOrder(order.id)
    const [a, b, c, d] = lines.map(({ pieces }) => pieces[0]?.runNumber)
    expect(new Set([a, b, c]).size).toBe(3)
    expect(d).toBe(b)
  })

  it('still needs its override when another line has one', async () => {
    const order = await shop.submit([
      shop.line({ mark: 'A', profile: unbendableProfile() }),
      shop.line({ mark: 'B', profile: zProfile([0.3, 3, 0.3]) }),
    ])
    const [first] = order.lines
    const refused = await tryRelease(order, [
      { lineId: first?.id ?? '', brakeId: idOf('Site brake'), reason: REASON },
    ])
    expect(refused.status).toBe(422)
    expect(refused.problem().code).toBe('cannot-bend')
    expect(refused.problem().detail).toContain('line B ')
    expect(new Set(refused.problem().errors?.map(({ path }) => path))).toEqual(new Set(['lines.1']))
    expect(await shop.readOrder(order.id)).toEqual(order)
  })
})

describe('An override is refused', () => {
  const refusal = async (
    overridesOf: (lines: { bends: string; stuck: string }) => Overrides,
  ): Promise<[string, string][]> => {
    const { order, bends, stuck } = await submitTwo()
    const refused = await tryRelease(order, overridesOf({ bends: bends.id, stuck: stuck.id }))
    expect(refused.status).toBe(400)
    expect(refused.problem().code).toBe('invalid-input')
    expect(await shop.readOrder(order.id)).toEqual(order)
    expect(await shop.db('runs').where({ order_id: order.id })).toEqual([])
    return refused.problem().errors?.map(({ path, message }) => [path, message]) ?? []
  }
  const on = (lineId: string, brake = 'Site brake', reason = REASON) => ({
    lineId,
    brakeId: idOf(brake),
    reason,
  })

  it('for a line that does bend, which it names', async () => {
    const errors = await refusal(({ bends, stuck }) => [on(stuck), on(bends)])
    expect(errors).toEqual([
      ['overrides.1.lineId', expect.stringMatching(/^Line A bends on .*without an override\.$/)],
    ])
  })

  it('for a line of another order, and for one named twice', async () => {
    const errors = await refusal(({ stuck }) => [on(stuck), on(randomUUID()), on(stuck)])
    expect(errors.map(([path]) => path)).toEqual(['overrides.1.lineId', 'overrides.2.lineId'])
  })

  it('for a brake that the shop does not have', async () => {
    const errors = await refusal(({ stuck }) => [{ ...on(stuck), brakeId: randomUUID() }])
    expect(errors.map(([path]) => path)).toEqual(['overrides.0.brakeId'])
  })

  it('without a reason', async () => {
    const errors = await refusal(({ stuck }) => [on(stuck, 'Site brake', '  ')])
    expect(errors.map(([path]) => path)).toEqual(['overrides.0.reason'])
  })
})
