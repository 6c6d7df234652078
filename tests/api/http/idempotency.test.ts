import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { IDEMPOTENCY_KEYS } from '#server/db/tables/idempotency-keys'
import { JOBS } from '#server/db/tables/jobs'
import type { ApiAgent } from '../../support/api-agent'
import { startApi, type Api } from '../../support/api-app'

let api: Api
let second: Api
let lead: ApiAgent
beforeAll(async () => {
  api = await startApi()
  second = await startApi({ sharing: api })
  lead = await api.signInAs('crewLead')
})
afterAll(async () => {
  await second.close()
  await api.close()
})

const job = (name: string) => ({ name, address: '', pitchRise: 6 })
const jobsNamed = (name: string) => api.db(JOBS).where({ name })
const open = (name: string, idempotencyKey: string, agent = lead) =>
  agent.post('/jobs', job(name), { idempotencyKey })

describe('a request that makes something', () => {
  it.each(['', 'short', 'with a blank in it', 'x'.repeat(201)])(
    'is refused with %j for a key',
    async (idempotencyKey) => {
      const answer = await open('No key', idempotencyKey)
      expect(answer.status).toBe(400)
      expect(answer.problem().code).toBe('idempotency-key-missing')
      expect(await jobsNamed('No key')).toEqual([])
    },
  )

  it('gets the first answer again under the same key, and is done once', async () => {
    const key = randomUUID()
    const first = await open('Mill barn', key)
    const again = await open('Mill barn', key)
    expect(first.status).toBe(201)
    expect(first.headers.get('idempotency-replayed')).toBeNull()
    expect(again.status).toBe(201)
    expect(again.headers.get('idempotency-replayed')).toBe('true')
    expect(again.body).toEqual(first.body)
    expect(await jobsNamed('Mill barn')).toHaveLength(1)
  })

  it('is refused when the key was used for another request', async () => {
    const key = randomUUID()
    await open('Dock shed', key)
    const answer = await open('Another shed', key)
    expect(answer.status).toBe(422)
    expect(answer.problem().code).toBe('idempotency-key-reused')
    expect(await jobsNamed('Another shed')).toEqual([])
  })

  it('may use a key that another person used', async () => {
    const key = randomUUID()
    await open('Same key', key)
    const other = await api.signInAs('crewLead')
    expect((await open('Same key', key, other)).headers.get('idempotency-replayed')).toBeNull()
    expect(await jobsNamed('Same key')).toHaveLength(2)
  })

  it('leaves nothing under its key when it fails, so that the cure may use it', async () => {
    const counter = await api.signInAs('counter')
    const { id: companyId } = await api.make.company()
    const key = randomUUID()
    const failed = await open('Needs a company', key, counter)
    expect(failed.status).toBe(400)
    expect(await api.db(IDEMPOTENCY_KEYS).where({ key })).toEqual([])
    const cured = { ...job('Needs a company'), companyId }
    const answer = await counter.post('/jobs', cured, { idempotencyKey: key })
    expect(answer.status).toBe(201)
  })

  it('happens once when twins arrive together, at two processes', async () => {
    const person = await api.make.person('crewLead')
    const here = await api.signInAs(person)
    const there = await second.signInAs(person)
    const key = randomUUID()
    const twins = [here, there, here, there, here, there]
    const answers = await Promise.all(twins.map((agent) => open('Twin gables', key, agent)))
    expect(answers.map(({ status }) => status)).toEqual(twins.map(() => 201))
    expect(new Set(answers.map(({ body }) => JSON.stringify(body, sortedKeys(body)))).size).toBe(1)
    const firsts = answers.filter(({ headers }) => headers.get('idempotency-replayed') === null)
    expect(firsts).toHaveLength(1)
    expect(await jobsNamed('Twin gables')).toHaveLength(1)
  })
})

/** The database keeps an answer's keys in an order of its own. */
function sortedKeys(body: unknown): string[] {
  const keys = new Set<string>()
  JSON.stringify(body, (key, value: unknown) => {
    keys.add(key)
    return value
  })
  return [...keys].sort()
}
