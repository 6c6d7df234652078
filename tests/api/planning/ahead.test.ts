import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { readRows } from '#server/db/read-rows'
import { createLocalPlanner } from '#server/planning/local-planner'
import type { PlanningDeps } from '#server/planning/start-planning'
import { orderSchema } from '#shared/orders/order.schema'
import { planDrawing } from '#shared/plans/plans.contract'
import { openShop, type Shop } from '../../support/shop-scene'
import { zProfile } from '../../support/shop-factories'

/** What happens while a plan is being made; nothing unless a test says so. */
let meanwhile: () => Promise<void>
/** How many transactions were open in the database while a plan was made, one number a plan. */
let openTransactions: number[]

async function countTransactions(db: Db): Promise<number> {
  const [row] = await readRows(
    db,
    z.object({ count: z.int() }),
    `select count(*) as count from pg_stat_activity
     where datname = current_database() and xact_start is not null and pid <> pg_backend_pid()`,
  )
  if (!row) throw new Error('A count has a row.')
  return row.count
}

const watched = ({ db }: PlanningDeps) => {
  const planner = createLocalPlanner()
  return {
    planner: {
      planOnAll: async (...asked: Parameters<typeof planner.planOnAll>) => {
        openTransactions.push(await countTransactions(db))
        await meanwhile()
        return planner.planOnAll(...asked)
      },
    },
    close: () => Promise.resolve(),
  }
}

let shop: Shop
beforeAll(async () => {
  shop = await openShop({ planning: watched })
})
afterAll(() => shop.close())
beforeEach(() => {
  meanwhile = () => Promise.resolve()
  openTransactions = []
})

/** Does it once, during the next plan. */
const duringNextPlan = (act: () => Promise<unknown>) => {
  meanwhile = async () => {
    meanwhile = () => Promise.resolve()
    await act()
  }
}

const amendment = (version: number, given: Record<string, unknown> = {}) => ({
  poNumber: '',
  neededBy: '2099-12-31',
  notes: '',
  lines: [shop.line()],
  version,
  ...given,
})

describe('Planning', () => {
  it('happens in no transaction, whatever is done with an order', async () => {
    const order = await shop.submit([shop.line({ profile: zProfile([1, 2.25, 1]) })])
    const { id } = order
    await shop.readOrder(id)
    await shop.crew.agent.put(`/orders/${id}`, amendment(1))
    await shop.counter.post(`/orders/${id}/questions`, { version: 2, text: 'Which color?' })
    await shop.crew.agent.post(`/orders/${id}/answers`, { version: 3, text: 'The red one.' })
    await shop.crew.agent.post(`/orders/${id}/withdrawal`, { version: 99, reason: 'Too late' })
    await shop.release({ id, version: 4 })
    await shop.crew.agent.post('/plans', {
      profile: zProfile(),
      stockId: shop.stockId,
      pieceLength: 120,
    })
    expect(openTransactions.length).toBeGreaterThanOrEqual(7)
    expect(new Set(openTransactions)).toEqual(new Set([0]))
  })

  it('is done again where the order was changed meanwhile; the answer shows the new one', async () => {
    const order = await shop.submit()
    duringNextPlan(() =>
      shop.crew.agent.put(
        `/orders/${order.id}`,
        amendment(1, { lines: [shop.line({ profile: zProfile([1, 3, 1]), quantity: 7 })] }),
      ),
    )
    const late = await shop.counter.post(`/orders/${order.id}/release`, { version: 1 })
    expect(late.status).toBe(409)
    expect(late.problem().code).toBe('changed-meanwhile')
    const now = await shop.readOrder(order.id)
    expect(now).toMatchObject({ version: 2, state: 'submitted', pieceCount: 7 })
    expect(now.lines[0]?.bendsOn).toHaveLength(3)
    expect(orderSchema.parse(late.problem().current)).toEqual(now)
  })

  it('is done again where the stock was changed meanwhile, and the release follows the new one', async () => {
    const order = await shop.submit()
    duringNextPlan(() =>
      shop.db('stocks').where({ id: shop.stockId }).update({ springback_per_90: 3 }),
    )
    const released = await shop.release(order)
    expect(released.lines[0]?.stock.sheet.springbackPer90).toBe(3)
    const [run] = await shop.db('runs').where({ order_id: order.id })
    const { brakes } = await shop.counter.call(planDrawing, {
      body: { profile: zProfile(), stockId: shop.stockId, pieceLength: 120 },
    })
    expect(brakes.find(({ brakeId }) => brakeId === run?.brake_id)?.plan).toEqual(run?.plan)
  })

  it('is given up, and the change with it, where the stock never stands still', async () => {
    const order = await shop.submit()
    let thickness = 0.02
    meanwhile = async () => {
      thickness += 0.0001
      await shop.db('stocks').where({ id: shop.stockId }).update({ thickness })
    }
    const refused = await shop.counter.post(`/orders/${order.id}/release`, { version: 1 })
    expect(refused.status).toBe(409)
    expect(refused.problem().code).toBe('changed-meanwhile')
    meanwhile = () => Promise.resolve()
    expect(await shop.readOrder(order.id)).toMatchObject({ version: 1, state: 'submitted' })
  })
})
