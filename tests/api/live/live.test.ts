import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { LIVE_EVENTS } from '#server/db/tables/live-events'
import { PEOPLE } from '#server/db/tables/people'
import { announce, type Announcement } from '#server/live/announce'
import type { ApiAgent } from '../../support/api-agent'
import { startApi, type Api } from '../../support/api-app'
import { LiveStream } from '../../support/live-stream'

let api: Api
beforeAll(async () => {
  api = await startApi()
})
afterAll(() => api.close())

const streams: LiveStream[] = []
const follow = async (agent: ApiAgent, lastEventId?: string): Promise<LiveStream> => {
  const stream = await LiveStream.open(agent, lastEventId)
  streams.push(stream)
  return stream
}
/** Follows from now on: the first event of a new stream only says where it begins. */
const followFromNow = async (agent: ApiAgent): Promise<LiveStream> => {
  const stream = await follow(agent)
  expect(await stream.next()).toMatchObject({ name: 'ready' })
  return stream
}
afterEach(() => {
  for (const stream of streams.splice(0)) stream.close()
})

const order = (entityId: string, companyId: string | null = null): Announcement => ({
  topic: 'orders',
  entityId,
  companyId,
  audience: companyId === null ? 'shop' : 'company',
})
const tell = (announcement: Announcement) => announce(api.db, announcement)

describe('a stream', () => {
  it('is an event stream that nothing in between compresses or keeps', async () => {
    const stream = await follow(await api.signInAs('bender'))
    expect(stream.headers.get('content-type')).toContain('text/event-stream')
    expect(stream.headers.get('content-encoding')).toBeNull()
    expect(stream.headers.get('cache-control')).toContain('no-cache')
  })

  it('brings a change when its transaction commits, and never one that was rolled back', async () => {
    const stream = await followFromNow(await api.signInAs('bender'))
    const failing = api.db.transaction(async (transaction) => {
      await announce(transaction, order('rolled back'))
      throw new Error('changed my mind')
    })
    await expect(failing).rejects.toThrow('changed my mind')
    await api.db.transaction((transaction) => announce(transaction, order('committed')))
    expect(await stream.nextChange()).toEqual({ topic: 'orders', entityId: 'committed' })
  })

  it('brings what a request to another process changed', async () => {
    const second = await startApi({ sharing: api })
    try {
      const lead = await api.make.person('crewLead')
      const stream = await followFromNow(await second.signInAs(lead))
      const agent = await api.signInAs(lead)
      await agent.post('/jobs', { name: 'Silo', address: '', pitchRise: 3 })
      expect(await stream.nextChange()).toMatchObject({ topic: 'jobs' })
    } finally {
      await second.close()
    }
  })

  it('brings a crew lead the own company and what concerns all, and nothing else', async () => {
    const lead = await api.make.person('crewLead')
    const other = await api.make.company()
    const stream = await followFromNow(await api.signInAs(lead))
    await tell(order('for the shop'))
    await tell(order('for the others', other.id))
    await tell(order('for us', lead.companyId))
    await tell({ topic: 'stocks', entityId: null, companyId: null, audience: 'all' })
    expect(await stream.nextChange()).toEqual({ topic: 'orders', entityId: 'for us' })
    expect(await stream.nextChange()).toEqual({ topic: 'stocks', entityId: null })
  })

  it("brings the shop's people everything", async () => {
    const { id } = await api.make.company()
    const stream = await followFromNow(await api.signInAs('bender'))
    await tell(order('for the shop'))
    await tell(order('for a company', id))
    expect(await stream.nextChange()).toMatchObject({ entityId: 'for the shop' })
    expect(await stream.nextChange()).toMatchObject({ entityId: 'for a company' })
  })
})

describe('coming back', () => {
  /** Times that were: everything told so far happened a minute ago. */
  const letAMinutePass = async () => {
    await api.db.raw("update live_events set at = at - interval '1 minute'")
  }
  beforeEach(letAMinutePass)

  it('brings what was missed, in order, from the last event seen', async () => {
    const agent = await api.signInAs('bender')
    const first = await followFromNow(agent)
    await tell(order('seen'))
    const seen = await first.next()
    first.close()
    await letAMinutePass()
    await tell(order('missed 1'))
    await tell(order('missed 2'))
    const again = await follow(agent, String(seen?.id))
    expect(await again.nextChange()).toMatchObject({ entityId: 'missed 1' })
    expect(await again.nextChange()).toMatchObject({ entityId: 'missed 2' })
    await tell(order('now'))
    expect(await again.nextChange()).toMatchObject({ entityId: 'now' })
  })

  it('works from the first event of a stream, before anything happened', async () => {
    const agent = await api.signInAs('bender')
    await tell(order('before'))
    await letAMinutePass()
    const ready = await (await follow(agent)).next()
    await tell(order('missed'))
    const again = await follow(agent, String(ready?.id))
    expect(await again.nextChange()).toMatchObject({ entityId: 'missed' })
  })

  it('brings also what committed late with a lower number', async () => {
    const agent = await api.signInAs('bender')
    const slow = await api.db.transaction()
    await announce(slow, order('slow'))
    const stream = await followFromNow(agent)
    await tell(order('fast'))
    const fast = await stream.next()
    stream.close()
    await slow.commit()
    const again = await follow(agent, String(fast?.id))
    expect(await again.nextChange()).toMatchObject({ entityId: 'slow' })
  })

  it('leaves out what was missed but belongs to another company', async () => {
    const lead = await api.make.person('crewLead')
    const other = await api.make.company()
    const agent = await api.signInAs(lead)
    const ready = await (await follow(agent)).next()
    await tell(order('for the others', other.id))
    await tell(order('for us', lead.companyId))
    const again = await follow(agent, String(ready?.id))
    expect(await again.nextChange()).toMatchObject({ entityId: 'for us' })
  })

  it.each(['1', 'nonsense'])('begins anew when the last event %s is not kept', async (lastSeen) => {
    const agent = await api.signInAs('bender')
    await tell(order('kept'))
    await api.db(LIVE_EVENTS).where('id', '<=', 1).delete()
    const stream = await follow(agent, lastSeen)
    const reset = await stream.next()
    expect(reset?.name).toBe('reset')
    const latest = await api.db(LIVE_EVENTS).max({ id: 'id' }).first()
    expect(reset?.id).toBe(latest?.id)
  })

  it('is done by the process itself when its connection to the database breaks', async () => {
    const stream = await followFromNow(await api.signInAs('bender'))
    await tell(order('before the break'))
    expect(await stream.nextChange()).toMatchObject({ entityId: 'before the break' })
    await letAMinutePass()
    await api.db.raw(
      "select pg_terminate_backend(pid) from pg_stat_activity where application_name = 'foldyard live' and datname = current_database()",
    )
    await tell(order('during the break'))
    expect(await stream.nextChange()).toMatchObject({ entityId: 'during the break' })
  })
})

describe('the end of a session', () => {
  it('ends its streams, and nobody else’s', async () => {
    const person = await api.make.person('bender')
    const [here, there] = [await api.signInAs(person), await api.signInAs(person)]
    const stream = await followFromNow(there)
    const other = await followFromNow(await api.signInAs('bender'))
    await here.del('/sessions')
    await api.server.hub.checkSessions()
    expect(await stream.next()).toBeNull()
    await tell(order('still there'))
    expect(await other.nextChange()).toMatchObject({ entityId: 'still there' })
  })

  it('comes for a person whose account is switched off', async () => {
    const person = await api.make.person('bender')
    const stream = await followFromNow(await api.signInAs(person))
    await api.db(PEOPLE).where({ id: person.id }).update({ active: false })
    await tell({ topic: 'people', entityId: person.id, companyId: null, audience: 'shop' })
    expect(await stream.nextChange()).toMatchObject({ topic: 'people' })
    expect(await stream.next()).toBeNull()
  })

  it('comes for everyone when the server stops', async () => {
    const second = await startApi({ sharing: api })
    const stream = await followFromNow(await second.signInAs('bender'))
    await second.close()
    expect(await stream.next()).toBeNull()
  })
})
