import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { createBundle } from '#shared/bundles/bundles.contract'
import { handOff } from '#shared/hand-off/hand-off.contract'
import { createJob } from '#shared/jobs/jobs.contract'
import { getOrder, listOrders, releaseOrder, submitOrder } from '#shared/orders/orders.contract'
import { orderSchema } from '#shared/orders/order.schema'
import { bendPiece, getPiece } from '#shared/pieces/pieces.contract'
import { bendCount, claimRun } from '#shared/runs/runs.contract'
import { ApiAgent } from '../../support/api-agent'
import { startApi, type Api } from '../../support/api-app'
import { startBalancer, type Balancer } from '../../support/balancer'
import { PASSWORD } from '../../support/factories'
import { LiveStream } from '../../support/live-stream'
import { at, codesOf, SIGNATURE } from '../../support/making-factories'
import { createBrakes, createStock, lineInput, orderInput } from '../../support/shop-factories'
import type { Role } from '#shared/access/permissions'

let first: Api
let second: Api
let balancer: Balancer
beforeAll(async () => {
  first = await startApi()
  second = await startApi({ sharing: first })
  balancer = await startBalancer([first.url, second.url])
})
afterAll(async () => {
  await balancer.close()
  await second.close()
  await first.close()
})

/** Somebody whose every request goes to the process that the one before did not go to. */
const signIn = async (role: Role, name: string): Promise<ApiAgent> => {
  const { email } = await first.make.person(role, { name })
  const agent = new ApiAgent(balancer.url)
  const { status } = await agent.signIn(email, PASSWORD)
  expect(status).toBe(200)
  return agent
}

it('carries an order from the roof to the truck, each request at the other process', async () => {
  const stockId = await createStock(first.db)
  await createBrakes(first.db)
  const lead = await signIn('crewLead', 'Ada Ridge')
  const counter = await signIn('counter', 'Cy Counter')
  const bender = await signIn('bender', 'Wren Bender')

  const job = await lead.call(createJob, { body: { name: 'Barn', address: '', pitchRise: 6 } })
  const wanted = { ...orderInput([lineInput(stockId, { quantity: 4 })]), jobId: job.id }
  const idempotencyKey = randomUUID()
  const answers = [
    await lead.post(submitOrder.path, wanted, { idempotencyKey }),
    await lead.post(submitOrder.path, wanted, { idempotencyKey }),
    await lead.post(submitOrder.path, wanted, { idempotencyKey }),
  ]
  expect(answers.map(({ status }) => status)).toEqual([201, 201, 201])
  expect(answers.map(({ headers }) => headers.get('idempotency-replayed'))).toEqual([
    null,
    'true',
    'true',
  ])
  const [order, again, third] = answers.map(({ body }) => orderSchema.parse(body))
  expect([again, third]).toEqual([order, order])
  expect((await lead.call(listOrders)).items).toHaveLength(1)
  if (!order) throw new Error('Nothing was ordered.')

  const params = { orderId: order.id }
  const released = await counter.call(releaseOrder, { params, body: { version: order.version } })
  const codes = codesOf(released)
  const { runId } = await bender.call(getPiece, { params: { code: at(codes, 0) } })
  await bender.call(claimRun, { params: { runId }, body: {} })
  await bender.call(bendPiece, { params: { code: at(codes, 0) }, body: { runId } })
  await bender.call(bendPiece, { params: { code: at(codes, 1) }, body: { runId } })
  await bender.call(bendCount, { params: { runId }, body: { count: 2 } })
  const bundle = await bender.call(createBundle, {
    body: { orderId: order.id, pieceCodes: codes, rackPlace: 'R2' },
  })
  await counter.call(handOff, {
    params,
    body: { bundleCodes: [bundle.code], receivedBy: 'Ada Ridge', signature: SIGNATURE },
  })

  const done = await lead.call(getOrder, { params })
  expect(done.state).toBe('pickedUp')
  const { events } = await lead.call(getPiece, { params: { code: at(codes, 3) } })
  expect(events.map(({ to, by, station }) => [to, by, station])).toEqual([
    ['queued', 'Cy Counter', 'counter'],
    ['bent', 'Wren Bender', 'brake'],
    ['bundled', 'Wren Bender', 'rack'],
    ['pickedUp', 'Cy Counter', 'counter'],
  ])
  for (const count of balancer.counts()) expect(count).toBeGreaterThan(8)
})

it('tells those who look on at either process of what happened at the other', async () => {
  const lead = await signIn('crewLead', 'Bo Valley')
  const streams = [await LiveStream.open(lead), await LiveStream.open(lead)]
  try {
    for (const stream of streams) expect(await stream.next()).toMatchObject({ name: 'ready' })
    const jobs = [
      await lead.call(createJob, { body: { name: 'One', address: '', pitchRise: 6 } }),
      await lead.call(createJob, { body: { name: 'Two', address: '', pitchRise: 6 } }),
    ]
    for (const stream of streams) {
      const told = [await stream.nextChange(), await stream.nextChange()]
      expect(told).toEqual(jobs.map(({ id }) => ({ topic: 'jobs', entityId: id })))
    }
  } finally {
    for (const stream of streams) stream.close()
  }
})

it('knows at one process that a session was ended at the other', async () => {
  const person = await first.make.person('counter')
  const [here, there] = [await first.signInAs(person), await second.signInAs(person)]
  expect((await there.get('/jobs')).status).toBe(200)
  await here.del('/sessions')
  const answer = await there.get('/jobs')
  expect(answer.status).toBe(401)
  expect(answer.problem().code).toBe('not-signed-in')
})
