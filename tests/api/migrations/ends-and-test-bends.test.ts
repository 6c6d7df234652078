import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { migrateToLatest } from '#server/db/migrate'
import { migrationSource } from '#server/db/migrations'
import { updateJob } from '#shared/jobs/jobs.contract'
import { listStocks } from '#shared/stock/stock.contract'
import { getStarter } from '#shared/profile/starters'
import { openShop, type Shop } from '../../support/shop-scene'

let shop: Shop
beforeAll(async () => {
  shop = await openShop()
})
afterAll(() => shop.close())

const FIRST = '0011_ends_and_goods'

/** This migration and all that came after it, the latest first. */
async function namesSince(): Promise<string[]> {
  const all = (await migrationSource.getMigrations([])).map(({ name }) => name)
  return all.slice(all.indexOf(FIRST)).toReversed()
}

const columnsOf = (table: string): Promise<string[]> =>
  shop.db('information_schema.columns').where({ table_name: table }).pluck('column_name')

describe('Ends, goods and test bends', () => {
  it('are taken back without harm to what was there, and come again as nothing said', async () => {
    const open = await shop.submit([shop.line({ profile: getStarter('ridge').profile })])
    const released = await shop.release(await shop.submit())
    await shop.crew.agent.call(updateJob, {
      params: { jobId: shop.crew.jobId },
      body: { version: 1, pitchRise: 8 },
    })
    const before = await shop.readOrder(open.id)
    expect(before.events.map(({ kind }) => kind)).toEqual(['submitted', 'redrawn'])

    const names = await namesSince()
    for (const name of names) await shop.db.migrate.down({ migrationSource, name })
    expect(await columnsOf('order_lines')).not.toContain('ends')
    expect(await columnsOf('orders')).not.toContain('goods')
    expect(await columnsOf('stocks')).not.toContain('k_source')
    expect(await columnsOf('test_bends')).toEqual([])
    expect(await columnsOf('calibrations')).toEqual([])

    expect(await migrateToLatest(shop.db)).toEqual(names.toReversed())
    const { items } = await shop.counter.call(listStocks)
    expect(items).toMatchObject([{ kSource: 'shop', paintTBend: null, alloy: null }])
    const ofLine = { stock: { kSource: 'shop' }, ends: null, hands: null, statedGirth: null }
    expect(await shop.readOrder(open.id)).toMatchObject({
      goods: [],
      version: before.version,
      lines: [ofLine],
      // That its drawing followed the roof is not known there; that it changed is.
      events: [{ kind: 'submitted' }, { kind: 'amended', text: '6/12 → 8/12: A' }],
    })
    expect(await shop.readOrder(released.id)).toEqual(released)
    await expect(
      shop.db('order_events').where({ order_id: open.id }).update({ text: '' }),
    ).rejects.toMatchObject({ code: 'FY004' })
  })
})
