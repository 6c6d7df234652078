import type { OrderInput } from '#shared/orders/order.schema'
import { releaseOrder, submitOrder } from '#shared/orders/orders.contract'
import { createJob } from '#shared/jobs/jobs.contract'
import { bendPiece } from '#shared/pieces/pieces.contract'
import { listStocks } from '#shared/stock/stock.contract'
import type { ApiAgent } from '../support/api-agent'
import { codesOf } from '../support/making-factories'
import { lineInput, orderInput } from '../support/shop-factories'
import type { BenchRow } from './bench-row'
import { percentiles } from './bench-row'
import type { BenchShop } from './bench-shop'

const PIECES = 300
const WARM_UP = 50

export const movesTitle = `Pieces marked bent by their codes over HTTP: runs of ${PIECES}`

/** How long a scan takes to be answered, and how many a second come through. */
export async function benchMoves(shop: BenchShop): Promise<BenchRow[]> {
  const measured: BenchRow[] = []
  for (const concurrency of [1, 8]) {
    const codes = await queuePieces(shop)
    const benders = await Promise.all(
      Array.from({ length: concurrency }, () => shop.signIn('bender')),
    )
    await bendAll(codes.slice(0, WARM_UP), benders)
    const counted = codes.slice(WARM_UP)
    const start = performance.now()
    const took = await bendAll(counted, benders)
    const seconds = (performance.now() - start) / 1000
    measured.push({
      name: concurrency === 1 ? '1 scanner' : `${concurrency} scanners at once, one run`,
      unit: 'ms',
      ...percentiles(took),
      note: `${Math.round(counted.length / seconds)} moves/s`,
    })
  }
  return measured
}

/** Codes of the pieces of a new released order of one line. */
async function queuePieces({ signIn }: BenchShop): Promise<string[]> {
  const lead = await signIn('crewLead')
  const counter = await signIn('counter')
  const { items } = await lead.call(listStocks)
  const [stock] = items
  if (!stock) throw new Error('The demo shop has no stock.')
  const job = await lead.call(createJob, { body: { name: 'Long roof', address: '', pitchRise: 6 } })
  const wanted: OrderInput = orderInput([lineInput(stock.id, { quantity: PIECES })])
  const order = await lead.call(submitOrder, { body: { ...wanted, jobId: job.id } })
  const released = await counter.call(releaseOrder, {
    params: { orderId: order.id },
    body: { version: order.version },
  })
  return codesOf(released)
}

/** Each bender takes the next code as soon as the one before is answered. Milliseconds of each. */
async function bendAll(codes: readonly string[], benders: readonly ApiAgent[]): Promise<number[]> {
  const took: number[] = []
  const left = [...codes]
  await Promise.all(
    benders.map(async (bender) => {
      for (let code = left.shift(); code !== undefined; code = left.shift()) {
        const start = performance.now()
        await bender.call(bendPiece, { params: { code }, body: {} })
        took.push(performance.now() - start)
      }
    }),
  )
  return took
}
