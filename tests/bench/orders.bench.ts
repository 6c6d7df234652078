import type { Knex } from 'knex'
import { z } from 'zod'
import { listOrders } from '#shared/orders/orders.contract'
import type { BenchRow } from './bench-row'
import { sampleAsync } from './bench-row'
import type { BenchShop } from './bench-shop'

/** About a year of a busy shop: common practice, no source. */
const ORDERS = 3000
const PAGE = 20
const TIMES = 50

const countSchema = z.object({ rows: z.array(z.object({ id: z.uuid() })).min(1) })

/**
 * Orders of all jobs, made by plain SQL after an order of the demo shop: every tenth is new, the
 * others are released; of those some pieces are bent already.
 */
export async function seedOrders(db: Knex): Promise<void> {
  const template = countSchema.parse(
    await db.raw(`
      select o.id from orders o join runs r on r.order_id = o.id
      where o.released_at is not null group by o.id order by count(*), o.number limit 1`),
  ).rows[0]?.id
  if (template === undefined) throw new Error('The demo shop has no released order.')
  await db.transaction(async (trx) => {
    await trx.raw(
      `create temporary table made on commit drop as
       select gen_random_uuid() as id, n from generate_series(1, ?::integer) n`,
      [ORDERS],
    )
    await trx.raw(
      `
      insert into orders (id, company_id, job_id, ordered_by, po_number, needed_by, pitch_rise, submitted_at)
      select m.id, j.company_id, j.id, j.created_by, 'PO-' || m.n, current_date + m.n % 20, j.pitch_rise,
        now() - (? - m.n) * interval '10 minutes'
      from made m
      join (select *, row_number() over (order by id) as place, count(*) over () as total from jobs) j
        on j.place = 1 + m.n % j.total`,
      [ORDERS],
    )
    await trx.raw(
      `insert into order_lines (order_id, position, mark, name, profile, stock_id, quantity, length, frozen)
       select m.id, l.position, l.mark, l.name, l.profile, l.stock_id, 3, l.length,
         case when m.n % 10 > 0 then l.frozen end
       from made m join order_lines l on l.order_id = ?`,
      [template],
    )
    await trx.raw(`
      insert into order_events (order_id, kind, person_id)
      select o.id, 'submitted', o.ordered_by from orders o join made m on m.id = o.id
      union all
      select o.id, 'released', o.ordered_by from orders o join made m on m.id = o.id where m.n % 10 > 0`)
    await trx.raw(`
      update orders o set released_at = o.submitted_at from made m where m.id = o.id and m.n % 10 > 0`)
    await trx.raw(
      `insert into runs (order_id, code, brake_id, name, profile, stock, strip, brake, plan)
       select m.id, 'bench run ' || m.n, r.brake_id, r.name, r.profile, r.stock, r.strip, r.brake, r.plan
       from made m
       cross join (select * from runs where order_id = ? order by number limit 1) r
       where m.n % 10 > 0`,
      [template],
    )
    await trx.raw(`
      insert into pieces (code, order_id, line_id, run_id, sequence)
      select 'bench ' || m.n || '-' || l.position || '-' || s, m.id, l.id, r.id, s
      from made m
      join runs r on r.order_id = m.id
      join order_lines l on l.order_id = m.id
      cross join generate_series(1, 3) s`)
    await trx.raw(`
      insert into piece_events (piece_id, to_state, person_id, station)
      select p.id, 'queued', o.ordered_by, 'counter'
      from pieces p join made m on m.id = p.order_id join orders o on o.id = m.id`)
    await trx.raw(`
      insert into piece_events (piece_id, from_state, to_state, person_id, station)
      select p.id, 'queued', 'bent', o.ordered_by, 'brake'
      from pieces p join made m on m.id = p.order_id join orders o on o.id = m.id
      where p.sequence <= m.n % 3`)
    await trx.raw(`
      update pieces p set state = 'bent' from made m where m.id = p.order_id and p.sequence <= m.n % 3`)
  })
  await db.raw('analyze')
}

/** One page of orders over HTTP, as the counter and a crew read them. */
export async function benchOrders({ db, signIn }: BenchShop): Promise<BenchRow[]> {
  await seedOrders(db)
  const counter = await signIn('counter')
  const lead = await signIn('crewLead')
  const page = (agent: typeof counter, query: Record<string, string>) => async () => {
    await agent.call(listOrders, { query: { limit: PAGE, ...query } })
  }
  const middle = await startOfMiddlePage(counter)
  const rows: [string, () => Promise<void>][] = [
    ['newest orders, all companies', page(counter, {})],
    ['a page in the middle', page(counter, { after: middle })],
    ['new orders only (incoming)', page(counter, { states: 'submitted,question' })],
    ['orders in work', page(counter, { states: 'inWork' })],
    ['search by purchase order', page(counter, { search: 'PO-17' })],
    ['newest orders of one company', page(lead, {})],
  ]
  const measured: BenchRow[] = []
  for (const [name, read] of rows) {
    measured.push({ name, unit: 'ms', ...(await sampleAsync(read, TIMES)) })
  }
  return measured
}

export const ordersTitle = `Orders list over HTTP: pages of ${PAGE} among ${ORDERS} orders`

async function startOfMiddlePage(agent: Awaited<ReturnType<BenchShop['signIn']>>) {
  let after: string | undefined
  for (let read = 0; read < ORDERS / 2; read += 100) {
    const { next } = await agent.call(listOrders, { query: { limit: 100, after } })
    if (next === null) throw new Error('There are fewer orders than were made.')
    after = next
  }
  if (after === undefined) throw new Error('There are no orders.')
  return after
}
