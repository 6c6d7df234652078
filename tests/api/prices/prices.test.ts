import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { OrderLineInput } from '#shared/orders/order.schema'
import { amendOrder } from '#shared/orders/orders.contract'
import type { PriceBook } from '#shared/pricing/price-book.schema'
import { getPriceBook } from '#shared/pricing/pricing.contract'
import { at } from '../../support/making-factories'
import { createStock, orderInput, zProfile } from '../../support/shop-factories'
import { openShop, type Shop } from '../../support/shop-scene'

let shop: Shop
let managerId: string
beforeAll(async () => {
  shop = await openShop()
  managerId = (await shop.api.make.person('manager', { name: 'Mo Manager' })).id
})
afterAll(() => shop.close())

/** A book for the shop's stock, girths to 12 in. */
const bookAt = (centsPerFoot: number): PriceBook => ({
  currency: 'USD',
  stocks: [{ stockId: shop.stockId, rates: [{ upTo: 12, centsPerFoot }] }],
  perBend: 25,
  perHem: 50,
  perDressedEnd: 400,
  setUp: 1000,
  minimum: 2000,
})

const writeBook = (book: PriceBook) =>
  shop.db('price_books').insert({ definition: JSON.stringify(book), person_id: managerId })

const line = (given: Partial<OrderLineInput> = {}) =>
  shop.line({ profile: zProfile([1, 2, 1]), quantity: 4, length: 120, ...given })

describe('The price book', () => {
  it('is none before somebody wrote one; an order then has no price and says why', async () => {
    expect(await shop.crew.agent.call(getPriceBook)).toEqual({ current: null })
    const order = await shop.submit([line()])
    expect(order.priceCents).toBeNull()
    expect(at(order.lines, 0)).toMatchObject({ price: null, noPrice: { code: 'noBook' } })
  })

  it('is the newest version, read by crew leads and counter but not by benders', async () => {
    await writeBook(bookAt(500))
    await writeBook(bookAt(300))
    for (const agent of [shop.crew.agent, shop.counter]) {
      const { current } = await agent.call(getPriceBook)
      expect(current).toMatchObject({ by: 'Mo Manager', book: bookAt(300) })
    }
    const bender = await shop.api.signInAs('bender')
    const answer = await bender.get(getPriceBook.path)
    expect(answer.status).toBe(403)
    expect(answer.problem().code).toBe('not-allowed')
  })

  it('keeps every version as it was written', async () => {
    const versions = () => shop.db('price_books')
    await expect(shop.db.raw(`update price_books set at = at`)).rejects.toMatchObject({
      code: 'FY004',
    })
    await expect(versions().delete()).rejects.toMatchObject({ code: 'FY004' })
    await expect(shop.db.raw('truncate price_books')).rejects.toMatchObject({ code: 'FY004' })
  })
})

describe('The price of an order', () => {
  it('is that of its lines by the newest book, each with what it is made of', async () => {
    await writeBook(bookAt(300))
    const order = await shop.submit([line(), line({ mark: 'B', quantity: 1, length: 24 })])
    const [many, few] = order.lines
    // Girth 4 in.: 10 ft at $3, two bends at 25 c, four times, and the set-up.
    expect(many?.price).toMatchObject({
      metal: { girth: 4, upTo: 12, feet: 10, centsPerFoot: 300, cents: 3000 },
      bends: { count: 2, cents: 50 },
      pieceCents: 3050,
      piecesCents: 12_200,
      setUpCents: 1000,
      cents: 13_200,
    })
    expect(few?.price).toMatchObject({ pieceCents: 650, toMinimumCents: 350, cents: 2000 })
    expect(order.priceCents).toBe(15_200)
  })

  it('follows the book, and an amendment, until the order is released', async () => {
    await writeBook(bookAt(300))
    const order = await shop.submit([line()])
    await writeBook(bookAt(400))
    expect((await shop.readOrder(order.id)).priceCents).toBe(17_200)
    const amended = await shop.crew.agent.call(amendOrder, {
      params: { orderId: order.id },
      body: { ...orderInput([line({ quantity: 8 })]), version: order.version },
    })
    expect(amended.priceCents).toBe(33_400)
  })

  it('is frozen at release: a newer book does not reach it', async () => {
    await writeBook(bookAt(300))
    const released = await shop.release(await shop.submit([line()]))
    expect(released.priceCents).toBe(13_200)
    await writeBook(bookAt(900))
    const later = await shop.readOrder(released.id)
    expect(later.priceCents).toBe(13_200)
    expect(later.lines).toEqual(released.lines)
  })

  it('is not known as soon as one line has none, which says why, after release too', async () => {
    await writeBook(bookAt(300))
    const other = await createStock(shop.db)
    const order = await shop.submit([
      line(),
      line({ mark: 'B', profile: zProfile([4, 6, 4]) }),
      line({ mark: 'C', stockId: other }),
    ])
    const reasons = [
      null,
      { code: 'girthNotPriced', widest: 12 },
      { code: 'stockNotPriced', widest: null },
    ]
    expect(order.lines.map(({ noPrice }) => noPrice)).toEqual(reasons)
    expect(order.priceCents).toBeNull()
    const released = await shop.release(order)
    await writeBook({
      ...bookAt(300),
      stocks: [
        { stockId: shop.stockId, rates: [{ upTo: 24, centsPerFoot: 300 }] },
        { stockId: other, rates: [{ upTo: 24, centsPerFoot: 300 }] },
      ],
    })
    const later = await shop.readOrder(released.id)
    expect(later.lines.map(({ noPrice }) => noPrice)).toEqual(reasons)
    expect(later.priceCents).toBeNull()
  })

  it('of an order released before prices were kept is not known', async () => {
    const order = await shop.release(await shop.submit([line()]))
    await shop.db.transaction(async (trx) => {
      // As an older release left it: the rule that freezes lines stands aside for this alone.
      await trx.raw('alter table order_lines disable trigger order_lines_frozen')
      await trx.raw(
        `update order_lines set frozen = frozen - 'price' - 'noPrice' where order_id = ?`,
        [order.id],
      )
      await trx.raw('alter table order_lines enable trigger order_lines_frozen')
    })
    const older = await shop.readOrder(order.id)
    expect(older.priceCents).toBeNull()
    expect(at(older.lines, 0)).toMatchObject({ price: null, noPrice: { code: 'notKept' } })
  })
})
