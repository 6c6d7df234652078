import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createJob, getJob, updateJob, type Job } from '#shared/jobs/jobs.contract'
import { readRedrawn } from '#shared/orders/redrawn'
import type { Order, OrderLineInput } from '#shared/orders/order.schema'
import { submitOrder } from '#shared/orders/orders.contract'
import { resolveFollows } from '#shared/profile/follows'
import type { Profile } from '#shared/profile/profile.schema'
import { getStarter } from '#shared/profile/starters'
import { gableEnds } from '../../support/end-factories'
import { at } from '../../support/making-factories'
import { orderInput, zProfile } from '../../support/shop-factories'
import { openShop, type Crew, type Shop } from '../../support/shop-scene'

let shop: Shop
beforeAll(async () => {
  shop = await openShop()
})
afterAll(() => shop.close())

/** A ridge whose bend follows the job's pitch. */
const RIDGE = getStarter('ridge').profile

const openJob = (pitchRise = 6, by: Crew = shop.crew): Promise<Job> =>
  by.agent.call(createJob, { body: { name: 'Long barn', address: '', pitchRise } })

const submitFor = (job: Job, lines: OrderLineInput[], by: Crew = shop.crew): Promise<Order> =>
  by.agent.call(submitOrder, { body: { ...orderInput(lines), jobId: job.id } })

const ridgeLine = (given: Partial<OrderLineInput> = {}) =>
  shop.line({ mark: 'R', name: 'Ridge', profile: RIDGE, ...given })

const setPitch = (job: Job, pitchRise: number, version = 1) =>
  shop.crew.agent.patch(`/jobs/${job.id}`, { version, pitchRise })

const turnsOf = ({ bends }: Profile) => bends.map(({ turn }) => turn)
const drawingOf = (order: Order, place = 0) => at(order.lines, place).profile

describe('When the pitch of a job changes', () => {
  it('what follows the roof is drawn anew, and the order says so', async () => {
    const job = await openJob(6)
    const order = await submitFor(job, [ridgeLine(), shop.line({ mark: 'Z' })])
    expect((await setPitch(job, 8)).status).toBe(200)

    const now = await shop.readOrder(order.id)
    expect(now).toMatchObject({ version: 2, state: 'submitted', job: { pitchRise: 8 } })
    expect(turnsOf(drawingOf(now))).toEqual(turnsOf(resolveFollows(RIDGE, 8)))
    expect(turnsOf(drawingOf(now))).not.toEqual(turnsOf(drawingOf(order)))
    expect(at(now.lines, 1)).toEqual(at(order.lines, 1))
    expect(now.lines.map(({ id }) => id)).toEqual(order.lines.map(({ id }) => id))
    expect(now.events.at(-1)).toMatchObject({
      kind: 'redrawn',
      by: 'Ada Ridge',
      text: '6/12 → 8/12: R',
    })
  })

  it('mitered ends stay as they are and are named, for the crew to look at', async () => {
    const job = await openJob(6)
    const gable = shop.line({ mark: 'G', ends: gableEnds() })
    const order = await submitFor(job, [ridgeLine(), gable, shop.line({ mark: 'Z' })])
    await setPitch(job, 7)
    const now = await shop.readOrder(order.id)
    expect(at(now.lines, 1)).toEqual(at(order.lines, 1))
    expect(readRedrawn(at(now.events, 1).text)).toEqual({
      from: 6,
      to: 7,
      drawn: 'R',
      mitered: 'G',
    })
  })

  it('an order in which nothing hangs on it keeps its version and its history', async () => {
    const job = await openJob(6)
    const order = await submitFor(job, [shop.line()])
    await setPitch(job, 9)
    const now = await shop.readOrder(order.id)
    expect(now).toEqual({ ...order, job: { ...order.job, pitchRise: 9 } })
  })

  it('an open question stays open', async () => {
    const job = await openJob(6)
    const order = await submitFor(job, [ridgeLine()])
    await shop.counter.post(`/orders/${order.id}/questions`, { version: 1, text: 'Sure?' })
    await setPitch(job, 8)
    expect((await shop.readOrder(order.id)).state).toBe('question')
  })

  it('released and withdrawn orders stay as they are', async () => {
    const job = await openJob(6)
    const released = await shop.release(await submitFor(job, [ridgeLine()]))
    const dropped = await submitFor(job, [ridgeLine()])
    await shop.crew.agent.post(`/orders/${dropped.id}/withdrawal`, { version: 1, reason: 'Twice.' })
    const withdrawn = await shop.readOrder(dropped.id)
    await setPitch(job, 8)
    expect(await shop.readOrder(released.id)).toEqual(released)
    expect(await shop.readOrder(dropped.id)).toEqual(withdrawn)
  })

  it('orders of other jobs stay as they are, those of another company too', async () => {
    const [job, next] = [await openJob(6), await openJob(6)]
    const theirs = await openJob(6, shop.otherCrew)
    const beside = await submitFor(next, [ridgeLine()])
    const foreign = await submitFor(theirs, [ridgeLine()], shop.otherCrew)
    await setPitch(job, 8)
    expect((await setPitch(theirs, 8)).status).toBe(404)
    expect(await shop.readOrder(beside.id)).toEqual(beside)
    expect(await shop.readOrder(foreign.id)).toEqual(foreign)
    expect(await shop.otherCrew.agent.call(getJob, { params: { jobId: theirs.id } })).toEqual({
      ...theirs,
      orderCount: 1,
    })
  })

  it('nothing is drawn anew where only the name changes or the change comes too late', async () => {
    const job = await openJob(6)
    const order = await submitFor(job, [ridgeLine()])
    await shop.crew.agent.call(updateJob, {
      params: { jobId: job.id },
      body: { version: 1, name: 'Short barn' },
    })
    const late = await setPitch(job, 8)
    expect(late.problem().code).toBe('changed-meanwhile')
    const now = await shop.readOrder(order.id)
    expect(now).toEqual({ ...order, job: { ...order.job, name: 'Short barn' } })
  })

  it('every screen that shows one of its orders is told', async () => {
    const job = await openJob(6)
    const order = await submitFor(job, [ridgeLine()])
    const last = await shop.db('live_events').max<{ id: number | null }[]>('id as id').first()
    await setPitch(job, 8)
    const told = await shop
      .db('live_events')
      .where('id', '>', last?.id ?? 0)
      .orderBy('id')
      .select('topic', 'entity_id', 'company_id', 'audience')
    const toCrew = { company_id: shop.crew.companyId, audience: 'company' }
    expect(told).toEqual([
      { topic: 'jobs', entity_id: job.id, ...toCrew },
      { topic: 'orders', entity_id: order.id, ...toCrew },
    ])
  })
})

describe('A drawing that the roof leaves no room for', () => {
  const flatten = async () => {
    const job = await openJob(6)
    const order = await submitFor(job, [ridgeLine()])
    await setPitch(job, 0)
    return { job, order: await shop.readOrder(order.id) }
  }

  it('is kept as the roof has it and cannot be released until it is amended', async () => {
    const { order } = await flatten()
    expect(order.version).toBe(2)
    const refused = await shop.counter.post(`/orders/${order.id}/release`, { version: 2 })
    expect(refused.problem()).toMatchObject({
      code: 'profile-problem',
      errors: [{ path: 'lines.0.profile.bends.1', code: 'turnOutOfRange' }],
    })
    expect((await shop.readOrder(order.id)).state).toBe('submitted')

    const amended = await shop.crew.agent.put(`/orders/${order.id}`, {
      ...orderInput([shop.line({ profile: zProfile() })]),
      version: 2,
    })
    expect(amended.status).toBe(200)
    expect((await shop.release({ id: order.id, version: 3 })).state).toBe('released')
  })

  it('comes up on the side it was drawn to when the pitch is put right', async () => {
    const { job, order } = await flatten()
    await setPitch(job, 6, 2)
    const now = await shop.readOrder(order.id)
    expect(turnsOf(drawingOf(now))).toEqual(turnsOf(resolveFollows(RIDGE, 6)))
    expect(now.version).toBe(3)
  })
})

describe('Two at once', () => {
  it('whoever changes an order while the pitch changes, it is drawn for the new pitch', async () => {
    for (let round = 0; round < 6; round += 1) {
      const job = await openJob(6)
      const order = await submitFor(job, [ridgeLine()])
      const [pitch, amended] = await Promise.all([
        setPitch(job, 8),
        shop.counter.put(`/orders/${order.id}`, {
          ...orderInput([ridgeLine({ quantity: 7 })]),
          version: 1,
        }),
      ])
      expect(pitch.status).toBe(200)
      const now = await shop.readOrder(order.id)
      // Too late, and shown what there is by now; or first, and drawn anew with the rest.
      if (amended.status === 409) expect(amended.problem().code).toBe('changed-meanwhile')
      else expect(amended.status).toBe(200)
      expect(at(now.lines, 0).quantity).toBe(amended.status === 409 ? 3 : 7)
      expect(turnsOf(drawingOf(now))).toEqual(turnsOf(resolveFollows(RIDGE, 8)))
      expect(now.job.pitchRise).toBe(8)
    }
  })

  it('an order that comes in while the pitch changes is drawn for the new pitch', async () => {
    for (let round = 0; round < 6; round += 1) {
      const job = await openJob(6)
      const [, order] = await Promise.all([setPitch(job, 8), submitFor(job, [ridgeLine()])])
      const now = await shop.readOrder(order.id)
      expect(turnsOf(drawingOf(now))).toEqual(turnsOf(resolveFollows(RIDGE, 8)))
    }
  })

  it('an order is released at one pitch or drawn for the other, never both', async () => {
    for (let round = 0; round < 4; round += 1) {
      const job = await openJob(6)
      const order = await submitFor(job, [ridgeLine()])
      const [, released] = await Promise.all([
        setPitch(job, 8),
        shop.counter.post(`/orders/${order.id}/release`, { version: 1 }),
      ])
      const now = await shop.readOrder(order.id)
      const rise = released.status === 200 ? 6 : 8
      expect(now.state).toBe(released.status === 200 ? 'released' : 'submitted')
      expect(now.job.pitchRise).toBe(rise)
      expect(turnsOf(drawingOf(now))).toEqual(turnsOf(resolveFollows(RIDGE, rise)))
    }
  })

  it('one of two who change the pitch is told of the other', async () => {
    const job = await openJob(6)
    const order = await submitFor(job, [ridgeLine()])
    const answers = await Promise.all([setPitch(job, 8), setPitch(job, 10)])
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409])
    const rise = answers[0]?.status === 200 ? 8 : 10
    const now = await shop.readOrder(order.id)
    expect(now.events.map(({ kind }) => kind)).toEqual(['submitted', 'redrawn'])
    expect(turnsOf(drawingOf(now))).toEqual(turnsOf(resolveFollows(RIDGE, rise)))
  })
})
