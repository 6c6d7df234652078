import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createJob, getJob, jobSchema, listJobs, updateJob } from '#shared/jobs/jobs.contract'
import { createJob as insertJob } from '../../support/shop-factories'
import { openShop, type Shop } from '../../support/shop-scene'

let shop: Shop
beforeAll(async () => {
  shop = await openShop()
})
afterAll(() => shop.close())

const fields = { name: 'Hay barn', address: '4 Lane End', pitchRise: 4.5 }

describe('Opening a job', () => {
  it('gives a crew lead a job of the own company', async () => {
    const job = await shop.crew.agent.call(createJob, { body: fields })
    expect(job).toMatchObject({
      ...fields,
      company: { id: shop.crew.companyId },
      version: 1,
      orderCount: 0,
    })
    expect(await shop.crew.agent.call(getJob, { params: { jobId: job.id } })).toEqual(job)
  })

  it('lets a crew lead name the own company, and no other', async () => {
    const own = await shop.crew.agent.post('/jobs', { ...fields, companyId: shop.crew.companyId })
    expect(own.status).toBe(201)
    const foreign = { ...fields, companyId: shop.otherCrew.companyId }
    expect((await shop.crew.agent.post('/jobs', foreign)).status).toBe(404)
    const unknown = { ...fields, companyId: randomUUID() }
    expect((await shop.crew.agent.post('/jobs', unknown)).status).toBe(404)
  })

  it('needs a company from the shop’s people', async () => {
    const without = await shop.counter.post('/jobs', fields)
    expect(without.status).toBe(400)
    expect(without.problem().errors).toMatchObject([{ path: 'companyId' }])
    const unknown = await shop.counter.post('/jobs', { ...fields, companyId: randomUUID() })
    expect(unknown.problem().errors).toMatchObject([{ path: 'companyId' }])
    const job = await shop.counter.call(createJob, {
      body: { ...fields, companyId: shop.crew.companyId },
    })
    expect(job.company.id).toBe(shop.crew.companyId)
  })

  it('is done once under retries with the same key', async () => {
    const idempotencyKey = randomUUID()
    const body = { ...fields, name: `Once ${idempotencyKey}` }
    const answers = await Promise.all(
      [1, 2, 3].map(() => shop.crew.agent.post('/jobs', body, { idempotencyKey })),
    )
    expect(new Set(answers.map((answer) => jobSchema.parse(answer.body).id)).size).toBe(1)
    const found = await shop.crew.agent.call(listJobs, { query: { search: body.name } })
    expect(found.items).toHaveLength(1)
  })

  it.each([
    ['an empty name', { name: ' ' }, 'name'],
    ['a pitch that is a wall', { pitchRise: 25 }, 'pitchRise'],
    ['a pitch that falls', { pitchRise: -1 }, 'pitchRise'],
  ])('refuses %s, naming the field', async (_what, wrong, path) => {
    const answer = await shop.crew.agent.post('/jobs', { ...fields, ...wrong })
    expect(answer.status).toBe(400)
    expect(answer.problem().errors).toMatchObject([{ path }])
  })
})

describe('Changing a job', () => {
  it('leaves alone what is not named', async () => {
    const job = await shop.crew.agent.call(createJob, { body: fields })
    const changed = await shop.crew.agent.call(updateJob, {
      params: { jobId: job.id },
      body: { version: 1, pitchRise: 8 },
    })
    expect(changed).toEqual({ ...job, pitchRise: 8, version: 2 })
  })

  it('refuses an old version and shows the job as it is now', async () => {
    const job = await shop.crew.agent.call(createJob, { body: fields })
    const first = await shop.crew.agent.patch(`/jobs/${job.id}`, { version: 1, name: 'First' })
    const late = await shop.counter.patch(`/jobs/${job.id}`, { version: 1, name: 'Second' })
    expect(late.status).toBe(409)
    expect(late.problem().code).toBe('changed-meanwhile')
    expect(late.problem().current).toEqual(first.body)
  })
})

describe('A job of another company', () => {
  it('is not there for a crew lead, to read or to change', async () => {
    const { jobId } = shop.otherCrew
    const read = await shop.crew.agent.get(`/jobs/${jobId}`)
    const changed = await shop.crew.agent.patch(`/jobs/${jobId}`, { version: 1, name: 'Mine' })
    expect([read.status, changed.status]).toEqual([404, 404])
    const missing = await shop.crew.agent.get(`/jobs/${randomUUID()}`)
    expect(read.problem().detail).toBe(missing.problem().detail)
    const job = await shop.otherCrew.agent.call(getJob, { params: { jobId } })
    expect(job.version).toBe(1)
  })
})

describe('The list of jobs', () => {
  it('gives each job once over its pages, the newest first, also those of one instant', async () => {
    const { lead, companyId, agent } = shop.otherCrew
    const row = { company_id: companyId, created_by: lead.id }
    const instant = new Date('2026-01-05T10:00:00.123Z')
    const before = await agent.call(listJobs)
    const made: string[] = []
    for (let n = 0; n < 5; n += 1) {
      made.push(await insertJob(shop.db, { ...row, created_at: instant }))
    }
    const oldest = await insertJob(shop.db, {
      ...row,
      created_at: new Date('2025-01-01T00:00:00Z'),
    })
    const seen: string[] = []
    let after: string | undefined
    do {
      const page = await agent.call(listJobs, { query: { limit: 2, after } })
      seen.push(...page.items.map(({ id }) => id))
      after = page.next ?? undefined
    } while (after !== undefined)
    expect(seen).toEqual([
      ...before.items.map(({ id }) => id),
      ...made.toSorted().toReversed(),
      oldest,
    ])
  })

  it('refuses a cursor that was tampered with, naming `after`', async () => {
    for (const after of ['x', 'WyJhIiwiYiJd', 'bnVsbA']) {
      const answer = await shop.crew.agent.get(`/jobs?after=${after}`)
      expect(answer.status).toBe(400)
      expect(answer.problem().errors).toMatchObject([{ path: 'after' }])
    }
  })

  it('is searched by name and address, wildcards taken as plain characters', async () => {
    const make = (name: string, address: string) =>
      shop.crew.agent.call(createJob, { body: { ...fields, name, address } })
    const percent = await make('Silo 40% open', 'Mill Road 1')
    const plain = await make('Silo 400 open', 'Mill_Road 2')
    const find = async (search: string) =>
      (await shop.crew.agent.call(listJobs, { query: { search } })).items.map(({ id }) => id)
    expect(await find('silo')).toEqual([plain.id, percent.id])
    expect(await find('40%')).toEqual([percent.id])
    expect(await find('mill_road')).toEqual([plain.id])
  })

  it('counts the orders of each job', async () => {
    const job = await shop.crew.agent.call(createJob, { body: fields })
    const crew = { ...shop.crew, jobId: job.id }
    await shop.submit(undefined, {}, crew)
    await shop.submit(undefined, {}, crew)
    const { orderCount } = await shop.crew.agent.call(getJob, { params: { jobId: job.id } })
    expect(orderCount).toBe(2)
  })
})
