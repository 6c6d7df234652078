import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { listCompanies, listPeople, updateSelf } from '#shared/people/people.contract'
import { startApi, type Api } from '../../support/api-app'

let api: Api
beforeAll(async () => {
  api = await startApi()
})
afterAll(() => api.close())

describe('a person', () => {
  it('changes the own language, units and theme, and finds them again elsewhere', async () => {
    const person = await api.make.person('bender')
    const [here, there] = [await api.signInAs(person), await api.signInAs(person)]
    const wish = { language: 'es', units: 'mm', theme: 'dark' } as const
    expect(await here.call(updateSelf, { body: wish })).toMatchObject(wish)
    expect(await there.loadSession()).toMatchObject({ ...wish, name: person.name })
  })

  it('keeps what the change leaves out', async () => {
    const agent = await api.signInAs('bender')
    await agent.call(updateSelf, { body: { name: 'Ona Ridgeway' } })
    await agent.call(updateSelf, { body: { units: 'decimal' } })
    await agent.call(updateSelf, { body: {} })
    expect(await agent.loadSession()).toMatchObject({
      name: 'Ona Ridgeway',
      units: 'decimal',
      language: 'en',
      theme: 'system',
    })
  })

  it.each([
    ['role', 'manager'],
    ['email', 'other@example.com'],
    ['companyId', null],
    ['active', true],
  ])('cannot change the own %s this way', async (field, value) => {
    const agent = await api.signInAs('bender')
    const answer = await agent.patch('/me', { [field]: value })
    expect(answer.status).toBe(400)
    expect(answer.problem().errors?.map(({ path }) => path)).toEqual([field])
  })

  it('chooses among the languages there are', async () => {
    const agent = await api.signInAs('bender')
    const answer = await agent.patch('/me', { language: 'la' })
    expect(answer.problem().errors).toEqual([
      { path: 'language', message: 'Must be "en" or "es".' },
    ])
  })
})

describe('the lists of the office', () => {
  beforeAll(async () => {
    // Names of this group alone.
    await api.close()
    api = await startApi()
  })

  it('show everyone with an account, by name, with company and whether it is on', async () => {
    const lead = await api.make.person('crewLead', { name: 'Aaron First' })
    await api.make.person('bender', { name: 'aaron Second', active: false })
    const { items } = await (await api.signInAs('manager')).call(listPeople)
    const [manager, first, second] = items
    expect(manager).toMatchObject({ name: 'A manager', company: null, active: true })
    expect(manager?.lastSignInAt).not.toBeNull()
    expect(first).toMatchObject({ id: lead.id, company: { id: lead.companyId }, active: true })
    expect(first?.lastSignInAt).toBeNull()
    expect(second).toMatchObject({ name: 'aaron Second', company: null, active: false })
    expect(JSON.stringify(items)).not.toContain('argon2')
  })

  it('show every company, by name', async () => {
    await api.make.company('Aardvark Roofing Crew')
    const { items } = await (await api.signInAs('counter')).call(listCompanies)
    expect(items[0]?.name).toBe('Aardvark Roofing Crew')
    expect(items.map(({ name }) => name)).toEqual([...items.map(({ name }) => name)].sort())
  })
})
