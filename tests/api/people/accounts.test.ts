import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { PASSWORD_LINKS } from '#server/db/tables/password-links'
import { PEOPLE } from '#server/db/tables/people'
import { SESSIONS } from '#server/db/tables/sessions'
import type { Role } from '#shared/access/permissions'
import {
  changePassword,
  createCompany,
  deactivatePerson,
  inviteAgain,
  invitePerson,
  listCrew,
  reactivatePerson,
  readPasswordLink,
  setPassword,
} from '#shared/people/accounts.contract'
import { listPeople } from '#shared/people/people.contract'
import type { ApiAgent } from '../../support/api-agent'
import { startApi, type Api } from '../../support/api-app'
import { PASSWORD } from '../../support/factories'
import { FakeClock } from '../../support/fake-clock'
import { lastMailTo, tokenIn } from '../../support/mail-factories'

const clock = new FakeClock(new Date('2026-05-04T15:00:00Z'))
let api: Api
let manager: ApiAgent
beforeAll(async () => {
  api = await startApi({ clock })
  manager = await api.signInAs('manager')
})
afterAll(() => api.close())

const NEW_PASSWORD = 'ridge cap before noon'
const DAY = 86_400_000

const newcomer = (role: Role, email = `${randomUUID()}@example.com`) => ({
  name: 'Ottoline Fernhill',
  email,
  role,
  language: 'en' as const,
})

async function invite(role: Role = 'bender') {
  const person = await manager.call(invitePerson, { body: newcomer(role) })
  return { person, token: tokenIn(await lastMailTo(api.db, person.email)) }
}

/** Somebody at the door, with the page's CSRF token. */
async function atTheDoor(): Promise<ApiAgent> {
  const agent = api.newAgent()
  await agent.loadSession()
  return agent
}

const refusedFields = async (agent: ApiAgent, body: unknown) =>
  (await agent.post('/people', body)).problem().errors?.map(({ path }) => path)

describe('an invitation', () => {
  it('lets the invited set a password by the link in the mail, and sign in', async () => {
    const { person, token } = await invite()
    expect(person).toMatchObject({ invited: true, active: true, lastSignInAt: null })
    const door = await atTheDoor()
    expect(await door.call(readPasswordLink, { body: { token } })).toEqual({
      kind: 'invitation',
      name: person.name,
      email: person.email,
      language: 'en',
    })
    await door.call(setPassword, { body: { token, password: NEW_PASSWORD } })
    expect((await door.signIn(person.email, NEW_PASSWORD)).status).toBe(200)
    const { items } = await manager.call(listPeople)
    expect(items.find(({ id }) => id === person.id)).toMatchObject({ invited: false })
  })

  it('works once', async () => {
    const { token } = await invite()
    const door = await atTheDoor()
    await door.call(setPassword, { body: { token, password: NEW_PASSWORD } })
    const again = await door.post('/passwords', { token, password: `${NEW_PASSWORD} again` })
    expect(again.problem().code).toBe('not-found')
  })

  it('is kept as a hash only', async () => {
    const { person, token } = await invite()
    const [link] = await api.db(PASSWORD_LINKS).where({ person_id: person.id }).select('*')
    expect(link?.token_hash).toHaveLength(32)
    expect(JSON.stringify(link)).not.toContain(token)
  })

  it('holds for seven days', async () => {
    const { token } = await invite()
    const door = await atTheDoor()
    const ask = () => door.post('/password-links', { token })
    clock.moveBy(7 * DAY - 1000)
    expect((await ask()).status).toBe(200)
    clock.moveBy(1000)
    expect((await ask()).problem().code).toBe('not-found')
  })

  it('ends when another one is sent', async () => {
    const { person, token } = await invite()
    await manager.call(inviteAgain, { params: { personId: person.id } })
    const newer = tokenIn(await lastMailTo(api.db, person.email))
    const door = await atTheDoor()
    expect((await door.post('/password-links', { token })).status).toBe(404)
    expect((await door.post('/password-links', { token: newer })).status).toBe(200)
  })

  it('is not sent to who has a password already', async () => {
    const { id } = await api.make.person('bender')
    const answer = await manager.post(`/people/${id}/invitation`)
    expect(answer.problem().code).toBe('wrong-state')
  })

  it('cannot be used to sign in before a password is set', async () => {
    const { person } = await invite()
    expect((await api.newAgent().signIn(person.email, PASSWORD)).problem().code).toBe(
      'wrong-credentials',
    )
  })

  it('is refused for an address that has an account', async () => {
    const { email } = await api.make.person('bender')
    expect(await refusedFields(manager, newcomer('bender', email.toUpperCase()))).toEqual(['email'])
  })

  it('asks for the company of a crew lead, and for none of the others', async () => {
    const company = await api.make.company()
    expect(await refusedFields(manager, newcomer('crewLead'))).toEqual(['companyId'])
    expect(await refusedFields(manager, { ...newcomer('counter'), companyId: company.id })).toEqual(
      ['companyId'],
    )
  })
})

describe('a crew lead', () => {
  it('invites into the own crew and sees it, and nobody else', async () => {
    const lead = await api.make.person('crewLead')
    const agent = await api.signInAs(lead)
    const invited = await agent.call(invitePerson, { body: newcomer('crewLead') })
    expect(invited.company?.id).toBe(lead.companyId)
    await api.make.person('crewLead')
    const { items } = await agent.call(listCrew)
    expect(items.map(({ id }) => id).sort()).toEqual([lead.id, invited.id].sort())
  })

  it('invites crew leads only', async () => {
    const agent = await api.signInAs('crewLead')
    expect(await refusedFields(agent, newcomer('manager'))).toEqual(['role'])
  })
})

describe('a password', () => {
  const tryPassword = async (password: string) => {
    const { token } = await invite()
    const answer = await (await atTheDoor()).post('/passwords', { token, password })
    return answer.status === 204 ? 'taken' : answer.problem().errors?.map(({ code }) => code)
  }

  it.each([
    ['seven c', ['short']],
    ['🔨🔨🔩🔧🪛🪚🧰', ['short']],
    ['a'.repeat(201), ['long']],
    ['Password123!', ['common']],
    ['ottoline-77', ['personal']],
    ['🔨🔩🔧🪛🪚🧰🪜🧲', 'taken'],
    ['verde que te quiero', 'taken'],
  ])('%s: %j', async (password, outcome) => {
    expect(await tryPassword(password)).toEqual(outcome)
  })

  it('that is refused leaves the link as it was', async () => {
    const { token } = await invite()
    const door = await atTheDoor()
    expect((await door.post('/passwords', { token, password: 'short' })).status).toBe(400)
    await door.call(setPassword, { body: { token, password: NEW_PASSWORD } })
  })

  it('is changed with the present one, and ends the other sessions', async () => {
    const person = await api.make.person('counter')
    const [here, there] = [await api.signInAs(person), await api.signInAs(person)]
    await here.call(changePassword, { body: { current: PASSWORD, password: NEW_PASSWORD } })
    expect(await here.loadSession()).toMatchObject({ id: person.id })
    expect(await there.loadSession()).toBeNull()
    expect((await api.newAgent().signIn(person.email, PASSWORD)).status).toBe(401)
    expect((await api.newAgent().signIn(person.email, NEW_PASSWORD)).status).toBe(200)
  })

  it('is not changed without the present one', async () => {
    const agent = await api.signInAs('counter')
    const answer = await agent.put('/me/password', { current: 'guess', password: NEW_PASSWORD })
    expect(answer.problem().errors).toEqual([
      { path: 'current', message: 'This is not your password. Type it again.', code: 'wrong' },
    ])
  })

  it('is the same however a keyboard composes its accents', async () => {
    const { person, token } = await invite()
    const door = await atTheDoor()
    await door.call(setPassword, {
      body: { token, password: 'canal\u00f3n de cobre'.normalize('NFD') },
    })
    expect((await door.signIn(person.email, 'canalón de cobre'.normalize('NFC'))).status).toBe(200)
  })
})

describe('a closed account', () => {
  it('is signed out everywhere at once, and its links end', async () => {
    const person = await api.make.person('bender')
    const agent = await api.signInAs(person)
    const params = { personId: person.id }
    expect(await manager.call(deactivatePerson, { params })).toMatchObject({ active: false })
    expect((await agent.get('/runs')).problem().code).toBe('not-signed-in')
    const left = await api
      .db(SESSIONS)
      .whereRaw("sess -> 'passport' ->> 'user' = ?", [person.id])
      .select('sid')
    expect(left).toEqual([])
    expect((await api.newAgent().signIn(person.email, PASSWORD)).status).toBe(401)
  })

  it('is opened again', async () => {
    const person = await api.make.person('bender')
    const params = { personId: person.id }
    await manager.call(deactivatePerson, { params })
    expect(await manager.call(reactivatePerson, { params })).toMatchObject({ active: true })
    expect((await api.newAgent().signIn(person.email, PASSWORD)).status).toBe(200)
  })

  it('takes an open invitation with it', async () => {
    const { person, token } = await invite()
    await manager.call(deactivatePerson, { params: { personId: person.id } })
    expect((await (await atTheDoor()).post('/password-links', { token })).status).toBe(404)
  })

  it('is never that of the last manager who can sign in', async () => {
    const managers = await api.db(PEOPLE).where({ role: 'manager' }).pluck('id')
    const keeper = await api.make.person('manager')
    const agent = await api.signInAs(keeper)
    await invite('manager')
    await api.db(PEOPLE).whereIn('id', managers).update({ active: false })
    const answer = await agent.post(`/people/${keeper.id}/deactivation`)
    expect(answer.problem()).toMatchObject({ code: 'wrong-state' })
    await api.db(PEOPLE).whereIn('id', managers).update({ active: true })
  })

  it('leaves one manager when two close each other at once', async () => {
    const before = await api.db(PEOPLE).where({ role: 'manager', active: true }).pluck('id')
    const [one, two] = [await api.make.person('manager'), await api.make.person('manager')]
    const [first, second] = [await api.signInAs(one), await api.signInAs(two)]
    await api.db(PEOPLE).whereIn('id', before).update({ active: false })
    await Promise.all([
      first.post(`/people/${two.id}/deactivation`),
      second.post(`/people/${one.id}/deactivation`),
    ])
    const left = await api.db(PEOPLE).whereIn('id', [one.id, two.id]).where({ active: true })
    expect(left).toHaveLength(1)
    await api.db(PEOPLE).whereIn('id', before).update({ active: true })
  })
})

describe('a company', () => {
  it('is added once under its name', async () => {
    const name = `Ternhill ${randomUUID()}`
    const made = await manager.call(createCompany, { body: { name } })
    expect(made.name).toBe(name)
    const again = await manager.post('/companies', { name })
    expect(again.problem().errors?.map(({ path }) => path)).toEqual(['name'])
  })
})
