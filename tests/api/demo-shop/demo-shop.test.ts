import { spawn } from 'node:child_process'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { DEMO_ACCOUNTS, seedDemo } from '#seeds/demo'
import { DEMO_COMPANIES, DEMO_PASSWORD, DEMO_PEOPLE } from '#seeds/demo/people'
import { ROLES } from '#shared/access/permissions'
import { signatureSchema } from '#shared/hand-off/hand-off.contract'
import { ORDER_STATES } from '#shared/orders/order.schema'
import { getOrder, listOrders } from '#shared/orders/orders.contract'
import { parseCode } from '#shared/pieces/codes'
import { PIECE_MOVES } from '#shared/pieces/piece-state'
import { getPriceBook } from '#shared/pricing/pricing.contract'
import { STARTERS } from '#shared/profile/starters'
import { getRun } from '#shared/runs/runs.contract'
import { listStockItems, STOCK_ITEM_KINDS } from '#shared/stock/stock-items.contract'
import { listStocks, listTestBends } from '#shared/stock/stock.contract'
import { stockSchema } from '#shared/stock/stock.schema'
import { startApi, type Api } from '../../support/api-app'

let api: Api
beforeAll(async () => {
  api = await startApi()
  await seedDemo(api.db)
})
afterAll(() => api.close())

const sizeOf = async (table: string) => (await api.db.select('*').from(table)).length

/** Runs a verb of the database command on the demo database. */
function runCommand(verb: string): Promise<{ code: number | null; output: string }> {
  return new Promise((resolve, reject) => {
    const child = spawn(process.execPath, ['--import', 'tsx', 'server/db/cli.ts', verb], {
      env: { ...process.env, DATABASE_URL: api.databaseUrl },
    })
    let output = ''
    const keep = (chunk: Buffer) => {
      output += chunk.toString()
    }
    child.stdout.on('data', keep)
    child.stderr.on('data', keep)
    child.on('error', reject)
    child.on('close', (code) => resolve({ code, output }))
  })
}

describe('The demo shop', () => {
  it('is a whole shop', async () => {
    const sizes = Object.fromEntries(
      await Promise.all(
        ['companies', 'people', 'stocks', 'brakes', 'jobs', 'orders', 'shelf_profiles'].map(
          async (table) => [table, await sizeOf(table)] as const,
        ),
      ),
    )
    expect(sizes).toEqual({
      companies: 5,
      // One of them was invited and did not come yet.
      people: 12,
      stocks: 10,
      brakes: 3,
      jobs: 11,
      orders: 40,
      // The starters, and three that crews saved.
      shelf_profiles: STARTERS.length + 3,
    })
  })

  it('keeps the version that a saved profile had before', async () => {
    const rows = await api
      .db('shelf_versions')
      .where({ name: 'Barn rake, tall' })
      .orderBy('version')
    expect(rows.map(({ version }) => version)).toEqual([1, 2])
    const times = rows.map(({ saved_at: at }) => at.getTime())
    expect(times).toEqual(times.toSorted((first, second) => first - second))
  })

  it('has a price for every line that was ordered', async () => {
    const agent = api.newAgent()
    await agent.signIn(DEMO_PEOPLE.juno.email, DEMO_PASSWORD)
    const { current } = await agent.call(getPriceBook)
    const { items: stocks } = await agent.call(listStocks)
    const priced = current?.book.stocks.map(({ stockId }) => stockId) ?? []
    expect([...priced].sort()).toEqual(stocks.map(({ id }) => id).sort())
    const { items } = await agent.call(listOrders, { query: { limit: 100 } })
    for (const { id, number } of items) {
      const { priceCents } = await agent.call(getOrder, { params: { orderId: id } })
      expect(priceCents, `F-${number}`).toBeGreaterThan(0)
    }
  })

  it('has coils, sheets and drops on hand', async () => {
    const agent = api.newAgent()
    await agent.signIn(DEMO_PEOPLE.juno.email, DEMO_PASSWORD)
    const { items: stocks } = await agent.call(listStocks)
    const lying = await Promise.all(
      stocks.map(({ id }) => agent.call(listStockItems, { params: { stockId: id } })),
    )
    const kinds = lying.flatMap(({ items }) => items.map(({ kind }) => kind))
    expect(new Set(kinds)).toEqual(new Set(STOCK_ITEM_KINDS))
  })

  it('has orders in every state', async () => {
    const states = await api.db('order_states').pluck<string[]>('state')
    const counts = ORDER_STATES.map((state) => [
      state,
      states.filter((one) => one === state).length,
    ])
    expect(Object.fromEntries(counts)).toEqual({
      submitted: 5,
      question: 2,
      released: 6,
      inWork: 7,
      ready: 4,
      partPickedUp: 3,
      pickedUp: 10,
      withdrawn: 3,
    })
  })

  it('has work of every company, for roofs of many pitches', async () => {
    const agent = api.newAgent()
    await agent.signIn(DEMO_PEOPLE.juno.email, DEMO_PASSWORD)
    const { items } = await agent.call(listOrders, { query: { limit: 100 } })
    expect(new Set(items.map(({ company }) => company.name))).toEqual(
      new Set(Object.values(DEMO_COMPANIES).map(({ name }) => name)),
    )
    expect(new Set(items.map(({ job }) => job.pitchRise))).toEqual(new Set([3, 4, 5, 6, 8, 10, 12]))
  })

  it('has every hand-off signed, and bundles that came back', async () => {
    const handOffs = await api.db('hand_offs')
    expect(handOffs.length).toBeGreaterThan(10)
    for (const { signature } of handOffs) {
      expect(signatureSchema.safeParse(signature).success).toBe(true)
    }
    const back = await api.db('piece_events').where({ from_state: 'pickedUp', to_state: 'bundled' })
    expect(new Set(back.map(({ reason }) => reason)).size).toBe(3)
  })

  it('has a piece in every state but withdrawn, and remakes done and queued', async () => {
    const states = new Set(await api.db('pieces').pluck('state'))
    expect([...states].sort()).toEqual(['bent', 'bundled', 'pickedUp', 'queued', 'scrapped'])
    const remakes = await api.db('pieces').whereNotNull('remake_of').pluck('state')
    expect(remakes.sort()).toEqual(['bent', 'bundled', 'pickedUp', 'queued'])
  })

  it('has pieces of both hands at the brake and on the rack', async () => {
    const agent = api.newAgent()
    await agent.signIn(DEMO_PEOPLE.wren.email, DEMO_PASSWORD)
    const [run] = await api
      .db('runs as r')
      .join('orders as o', 'o.id', 'r.order_id')
      .where('o.po_number', '7744')
      .orderBy('r.number')
      .pluck<string[]>('r.id')
    const { pieces } = await agent.call(getRun, { params: { runId: run ?? '' } })
    expect(pieces.map(({ hand, lowEnd, state }) => [hand, lowEnd, state])).toEqual([
      ['left', 'left', 'bundled'],
      ['left', 'left', 'bundled'],
      ['right', 'right', 'bundled'],
      ['right', 'right', 'queued'],
    ])
  })

  it('cuts by what was measured where a test bend is in use', async () => {
    const agent = api.newAgent()
    await agent.signIn(DEMO_PEOPLE.juno.email, DEMO_PASSWORD)
    const { items } = await agent.call(listStocks)
    const measured = items.filter(({ calibrations }) => calibrations.length > 0)
    expect(measured.map(({ colorName }) => colorName)).toEqual(['Harbor 7'])
    const [stock] = measured
    if (!stock) throw new Error('Nothing was measured.')
    const { bends, fits } = await agent.call(listTestBends, { params: { stockId: stock.id } })
    expect(bends).toHaveLength(2)
    expect(fits).toMatchObject([{ kFactor: stock.calibrations[0]?.kFactor, bends: 2 }])
    const runs = await api.db('runs').orderBy('number')
    const byMeasure = runs
      .map((row) => stockSchema.safeParse(row.stock).data)
      .filter((made) => made !== undefined && made.calibrations.length > 0)
    expect(byMeasure.map((made) => made?.sheet.kFactor)).toEqual(
      Array(2).fill(stock.calibrations[0]?.kFactor),
    )
  })

  it('has an account for every role, and all of them can sign in', async () => {
    expect(new Set(DEMO_ACCOUNTS.map((account) => account.role))).toEqual(new Set(ROLES))
    for (const { email, password, name, role } of DEMO_ACCOUNTS) {
      expect(email).toMatch(/@example\.com$/)
      const agent = api.newAgent()
      expect((await agent.signIn(email, password)).status).toBe(200)
      expect(await agent.loadSession()).toMatchObject({ name, role, email })
    }
  })

  it('answers every list and every order as the contract says', async () => {
    const agent = api.newAgent()
    await agent.signIn(DEMO_PEOPLE.juno.email, DEMO_PASSWORD)
    for (const path of ['/orders', '/jobs', '/profiles', '/runs', '/runs?state=done', '/rack']) {
      expect((await agent.get(path)).status, path).toBe(200)
    }
    for (const id of await api.db('orders').pluck('id')) {
      expect((await agent.get(`/orders/${id}`)).status).toBe(200)
      expect((await agent.get(`/orders/${id}/hand-off`)).status).toBe(200)
    }
  })

  it('has, for every piece, a chain of legal events that ends in its state', async () => {
    const pieces = await api.db('pieces')
    const events = await api.db('piece_events').orderBy('id')
    expect(pieces.length).toBeGreaterThan(100)
    for (const piece of pieces) {
      const chain = events.filter((event) => event.piece_id === piece.id)
      expect(chain[0]).toMatchObject({ from_state: null, to_state: 'queued' })
      for (const [index, event] of chain.entries()) {
        const before = chain[index - 1]
        if (!before) continue
        expect(event.from_state).toBe(before.to_state)
        expect(event.at.getTime()).toBeGreaterThanOrEqual(before.at.getTime())
        const move = PIECE_MOVES.find(
          ({ from, to }) => from === event.from_state && to === event.to_state,
        )
        expect(move).toBeDefined()
        if (move?.needsReason) expect(event.reason).toBeTruthy()
      }
      expect(chain.at(-1)?.to_state).toBe(piece.state)
    }
  })

  it('happened before it was seeded, within three weeks, and no code repeats', async () => {
    const moments = [
      ...(await api.db('piece_events').pluck('at')),
      ...(await api.db('order_events').pluck('at')),
      ...(await api.db('hand_offs').pluck('at')),
    ].map((moment) => moment.getTime())
    expect(Math.max(...moments)).toBeLessThan(Date.now())
    expect(Math.min(...moments)).toBeGreaterThan(Date.now() - 21 * 86_400_000)
    const codes: string[] = [
      ...(await api.db('pieces').pluck('code')),
      ...(await api.db('bundles').pluck('code')),
      ...(await api.db('runs').pluck('code')),
    ]
    expect(new Set(codes).size).toBe(codes.length)
    for (const code of codes) expect(parseCode(code)).toMatchObject({ ok: true, code })
  })

  it('is late with one order that is still in work', async () => {
    const late = await api
      .db('orders as o')
      .join('order_states as s', 's.order_id', 'o.id')
      .where('o.needed_by', '<', new Date().toISOString().slice(0, 10))
      .whereIn('s.state', ['released', 'inWork', 'ready', 'partPickedUp'])
      .pluck('s.state')
    expect(late).toEqual(['inWork'])
  })

  it('has one order that is due on the day of seeding, and ready', async () => {
    const due = await api
      .db('orders as o')
      .join('order_states as s', 's.order_id', 'o.id')
      .where('o.needed_by', new Date().toISOString().slice(0, 10))
      .pluck('s.state')
    expect(due).toEqual(['ready'])
  })

  it('goes in once: the database command refuses a second time', async () => {
    const before = await sizeOf('people')
    const again = await runCommand('seed')
    expect(again).toMatchObject({ code: 1 })
    expect(again.output).toContain('has people already')
    const ifEmpty = await runCommand('seed-if-empty')
    expect(ifEmpty.code).toBe(0)
    expect(ifEmpty.output).toContain('nothing added')
    expect(await sizeOf('people')).toBe(before)
  })

  it('leaves nothing behind when it fails', async () => {
    const empty = await startApi()
    try {
      // Late in the history an order gets its third bundle.
      await empty.db.raw('alter table bundles add constraint few check (number < 3)')
      await expect(seedDemo(empty.db)).rejects.toThrow('"few"')
      for (const table of ['people', 'stocks', 'orders', 'piece_events', 'live_events']) {
        expect(await empty.db.select('*').from(table)).toEqual([])
      }
    } finally {
      await empty.close()
    }
  })

  it('has the same codes in every database', async () => {
    const other = await startApi()
    try {
      await seedDemo(other.db)
      const codes = (db: Api['db']) => db('pieces').orderBy('code').pluck('code')
      expect(await codes(other.db)).toEqual(await codes(api.db))
    } finally {
      await other.close()
    }
  })
})
