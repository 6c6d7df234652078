import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { openShop, type Shop } from '../../support/shop-scene'

let shop: Shop
beforeAll(async () => {
  shop = await openShop()
})
afterAll(() => shop.close())

/** The statements that the server sends while `act` runs. */
async function countStatements(act: () => Promise<unknown>): Promise<number> {
  let count = 0
  const heard = () => {
    count += 1
  }
  shop.db.on('query', heard)
  await act()
  shop.db.removeListener('query', heard)
  return count
}

const marks = (many: number) => Array.from({ length: many }, (_, index) => `M${index + 1}`)
const submitLines = (many: number) =>
  shop.submit(marks(many).map((mark) => shop.line({ mark, quantity: 2 })))

describe('The order page', () => {
  it('takes as many statements for thirty lines as for one, before release and after', async () => {
    const small = await submitLines(1)
    const large = await submitLines(30)
    const read = (id: string) => countStatements(() => shop.readOrder(id))
    const before = await read(small.id)
    expect(before).toBeLessThan(10)
    expect(await read(large.id)).toBe(before)

    const releaseSmall = await countStatements(() => shop.release(small))
    expect(await countStatements(() => shop.release(large))).toBe(releaseSmall)
    const after = await read(small.id)
    expect(after).toBeLessThan(10)
    expect(await read(large.id)).toBe(after)
  })
})

describe('The list of orders', () => {
  it('takes as many statements for a long page as for a short one', async () => {
    for (const many of [1, 2, 3]) await submitLines(many)
    const list = (limit: number) =>
      countStatements(() => shop.counter.get(`/orders?limit=${limit}`))
    expect(await list(5)).toBe(await list(1))
  })
})
