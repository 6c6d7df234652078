import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { AUDIT_LOG } from '#server/db/tables/audit-log'
import { inTransaction } from '#server/db/transaction'
import { audit } from '#server/features/audit/audit'
import { listAudit } from '#shared/audit/audit.contract'
import { createCompany, deactivatePerson, invitePerson } from '#shared/people/accounts.contract'
import type { ApiAgent } from '../../support/api-agent'
import { startApi, type Api } from '../../support/api-app'
import type { TestPerson } from '../../support/factories'

let api: Api
let juno: TestPerson
let manager: ApiAgent
beforeAll(async () => {
  api = await startApi()
  juno = await api.make.person('manager')
  manager = await api.signInAs(juno)
})
afterAll(() => api.close())

const invite = (agent = manager) =>
  agent.call(invitePerson, {
    body: {
      name: 'Basil Thornbury',
      email: `${randomUUID()}@example.com`,
      role: 'bender',
      language: 'es',
    },
  })

describe('the log of changes', () => {
  it('says who did what to whom, and how it was before', async () => {
    const person = await invite()
    await manager.call(deactivatePerson, { params: { personId: person.id } })
    const { items } = await manager.call(listAudit, { query: { person: person.id } })
    const by = { id: juno.id, name: juno.name }
    const subject = { kind: 'person', id: person.id, name: person.name }
    expect(items).toMatchObject([
      { by, subject, action: 'deactivated', before: { active: true }, after: { active: false } },
      { by, subject, action: 'invited', before: null, after: { role: 'bender', language: 'es' } },
    ])
  })

  it('is read page by page, newest first', async () => {
    for (let count = 0; count < 3; count += 1) {
      await manager.call(createCompany, { body: { name: `Quarry Gap ${randomUUID()}` } })
    }
    const query = { kind: 'company', limit: 2 } as const
    const first = await manager.call(listAudit, { query })
    const second = await manager.call(listAudit, { query: { ...query, after: first.next ?? '' } })
    const ids = [...first.items, ...second.items].map(({ id }) => id)
    expect(first.items).toHaveLength(2)
    expect(ids).toEqual([...new Set(ids)].sort((a, b) => b - a))
  })

  it('shows what one person did and what was done to them', async () => {
    const other = await api.make.person('manager')
    const invited = await invite(await api.signInAs(other))
    const of = async (id: string) =>
      (await manager.call(listAudit, { query: { person: id } })).items.map(
        ({ subject }) => subject.id,
      )
    expect(await of(other.id)).toEqual([invited.id])
    expect(await of(invited.id)).toEqual([invited.id])
  })

  it('holds prices as well, and nothing of a change that was rolled back', async () => {
    const id = randomUUID()
    const write = inTransaction(api.db, async (db) => {
      await audit(db, {
        by: juno,
        at: new Date(),
        subject: { kind: 'price', id, name: 'Bend' },
        action: 'changed',
        before: { cents: 125 },
        after: { cents: 140 },
      })
      throw new Error('Changed my mind.')
    })
    await expect(write).rejects.toThrow('Changed my mind.')
    expect(await api.db(AUDIT_LOG).where({ subject_id: id }).select('id')).toEqual([])
  })

  it.each([
    ['changed', () => api.db.raw("update audit_log set action = 'created'")],
    ['removed', () => api.db(AUDIT_LOG).delete()],
    ['emptied', () => api.db.raw('truncate audit_log')],
  ])('cannot be %s, not even in the database', async (_what, attempt) => {
    await invite()
    await expect(attempt()).rejects.toMatchObject({ code: 'FY004' })
  })
})
