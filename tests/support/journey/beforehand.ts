import { inject } from 'vitest'
import { DEMO_PASSWORD, DEMO_PEOPLE, type DemoPerson } from '#seeds/demo/people'
import { createJob, type Job } from '#shared/jobs/jobs.contract'
import { orderNumber, type Order } from '#shared/orders/order.schema'
import { releaseOrder, submitOrder } from '#shared/orders/orders.contract'
import { bendPiece } from '#shared/pieces/pieces.contract'
import { createBundle } from '#shared/bundles/bundles.contract'
import { listStocks } from '#shared/stock/stock.contract'
import { ApiAgent } from '../api-agent'
import { at, codesOf } from '../making-factories'
import { lineInput, orderInput } from '../shop-factories'

/** A demo person without a browser, for what happened before a test begins. */
export async function agentOf(person: DemoPerson): Promise<ApiAgent> {
  const agent = new ApiAgent(inject('productUrl'))
  const { status } = await agent.signIn(DEMO_PEOPLE[person].email, DEMO_PASSWORD)
  if (status !== 200) throw new Error(`${person} could not sign in: ${status}.`)
  return agent
}

export interface Beforehand {
  readonly job: Job
  readonly order: Order
  /** As on screen: `F-2047`. */
  readonly number: string
  /** Empty before release. */
  readonly codes: readonly string[]
}

type Stage = 'submitted' | 'released' | 'bent' | 'bundled'

/** An order of Maren's for pieces of this name, brought to a stage. */
export async function orderBeforehand(
  name: string,
  stage: Stage,
  quantity = 2,
): Promise<Beforehand> {
  const lead = await agentOf('maren')
  const job = await lead.call(createJob, { body: { name, address: '', pitchRise: 6 } })
  const { items } = await lead.call(listStocks)
  const line = lineInput(at(items, 0).id, { name, quantity })
  const order = await lead.call(submitOrder, { body: { ...orderInput([line]), jobId: job.id } })
  const number = orderNumber(order.number)
  if (stage === 'submitted') return { job, order, number, codes: [] }

  const counter = await agentOf('ines')
  const released = await counter.call(releaseOrder, {
    params: { orderId: order.id },
    body: { version: order.version },
  })
  const codes = codesOf(released)
  const bender = await agentOf('wren')
  if (stage !== 'released') {
    for (const code of codes) await bender.call(bendPiece, { params: { code }, body: {} })
  }
  if (stage === 'bundled') {
    await bender.call(createBundle, {
      body: { orderId: order.id, pieceCodes: [...codes], rackPlace: 'R8' },
    })
  }
  return { job, order: released, number, codes }
}
