import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { frozenLineSchema } from '#server/features/orders/frozen-line'
import { getRack } from '#shared/bundles/bundles.contract'
import { getHandOffSheet } from '#shared/hand-off/hand-off.contract'
import type { Order } from '#shared/orders/order.schema'
import { gableEnds } from '../../support/end-factories'
import { at, codesOf, openFloor, piecesOf, type Floor } from '../../support/making-factories'

let floor: Floor
beforeAll(async () => {
  floor = await openFloor()
})
afterAll(() => floor.close())

/** Two left pieces as drawn, their low end left, and one right piece, its mirror image. */
const pair = () =>
  floor.line({
    mark: 'G',
    quantity: 3,
    ends: gableEnds(),
    hands: { drawn: 'left', left: 2, right: 1 },
  })
const plain = () => floor.line({ mark: 'Z', quantity: 1 })

const runOf = async (order: Order) => floor.readRun(at(await floor.runIds(order), 0))

describe('A pair of hands', () => {
  it('gives its first pieces the left hand and the others the right', async () => {
    const order = await floor.queue([pair(), plain()])
    expect(order.lines.map(({ pieces }) => pieces.map(({ hand }) => hand))).toEqual([
      ['left', 'left', 'right'],
      [null],
    ])
    const pieces = await Promise.all(codesOf(order).map(floor.readPiece))
    expect(pieces.map(({ hand, lowEnd }) => [hand, lowEnd])).toEqual([
      ['left', 'left'],
      ['left', 'left'],
      ['right', 'right'],
      [null, null],
    ])
  })

  it('stands at the brake with each piece and with the line its ends are drawn for', async () => {
    const order = await floor.queue([pair(), plain()])
    const run = await runOf(order)
    expect(run.lines).toEqual(
      order.lines.map(({ id, mark, name, length, quantity, ends, hands }) => {
        return { id, mark, name, length, quantity, ends, hands }
      }),
    )
    const [gable, closure] = order.lines.map(({ id }) => id)
    expect(run.pieces.map(({ lineId, hand, lowEnd }) => [lineId, hand, lowEnd])).toEqual([
      [gable, 'left', 'left'],
      [gable, 'left', 'left'],
      [gable, 'right', 'right'],
      [closure, null, null],
    ])
  })

  it('is named on the rack, in the bundle and at the counter', async () => {
    const order = await floor.queue([pair()])
    const codes = await floor.bendAll(order)
    const { work } = await floor.wren.call(getRack)
    const loose = work.find(({ orderId }) => orderId === order.id)?.loose
    const inHand = ['left', 'left', 'right']
    expect(loose?.map(({ hand }) => hand)).toEqual(inHand)
    const bundle = await floor.bundle(order, codes)
    expect(bundle.pieces.map(({ hand }) => hand)).toEqual(inHand)
    const sheet = await floor.counter.call(getHandOffSheet, { params: { orderId: order.id } })
    expect(at(sheet.bundles, 0).pieces.map(({ hand }) => hand)).toEqual(inHand)
  })

  it('is kept by the remake of a spoiled piece', async () => {
    const order = await floor.queue([pair()])
    const [, , right] = await floor.bendAll(order)
    const { remake } = await floor.scrap(right ?? '')
    expect(remake).toMatchObject({ sequence: 3, hand: 'right', lowEnd: 'right' })
    const pieces = piecesOf(await floor.readOrder(order.id))
    expect(pieces.find(({ code }) => code === remake.code)?.hand).toBe('right')
  })

  it('is frozen with its ends when the order is released', async () => {
    const order = await floor.queue([pair()])
    const row = () => floor.db('order_lines').where({ order_id: order.id })
    const { ends, hands } = frozenLineSchema.parse((await row().first())?.frozen)
    expect({ ends, hands }).toEqual({
      ends: gableEnds(),
      hands: { drawn: 'left', left: 2, right: 1 },
    })
    await expect(row().update({ hands: null })).rejects.toMatchObject({ code: 'FY005' })
    await expect(row().update({ ends: null })).rejects.toMatchObject({ code: 'FY005' })
  })
})

describe('What was released before ends and the source of K were known', () => {
  it('is read as square pieces without hands, of a stock with the shop’s own K', async () => {
    const order = await floor.queue([plain()])
    const unknown = ['kSource', 'paintTBend', 'alloy', 'calibrations']
    await floor.db.raw('alter table order_lines disable trigger order_lines_frozen')
    await floor.db.raw(
      `update order_lines set frozen = jsonb_set(
         frozen - array['ends', 'hands'], '{stock}', (frozen -> 'stock') - cast(:unknown as text[]))
       where order_id = :id`,
      { id: order.id, unknown },
    )
    await floor.db.raw('alter table order_lines enable trigger order_lines_frozen')
    await floor.db.raw('update runs set stock = stock - cast(:unknown as text[])', { unknown })
    const older = { kSource: 'shop', paintTBend: null, alloy: null, calibrations: [] }
    const line = at((await floor.readOrder(order.id)).lines, 0)
    expect(line).toEqual({
      ...at(order.lines, 0),
      stock: { ...at(order.lines, 0).stock, ...older },
    })
    const run = await runOf(order)
    expect(run.stock).toMatchObject(older)
    expect(run.pieces.map(({ hand, lowEnd }) => [hand, lowEnd])).toEqual([[null, null]])
  })
})
