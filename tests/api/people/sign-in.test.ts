import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { PEOPLE } from '#server/db/tables/people'
import { SESSIONS } from '#server/db/tables/sessions'
import { sessionSchema } from '#shared/people/people.contract'
import { startApi, type Api } from '../../support/api-app'
import { PASSWORD } from '../../support/factories'

let api: Api
beforeAll(async () => {
  api = await startApi()
})
afterAll(() => api.close())

describe('signing in', () => {
  it('tells who is signed in, with the company of a crew lead, and gives a new CSRF token', async () => {
    const lead = await api.make.person('crewLead')
    const agent = api.newAgent()
    const before = sessionSchema.parse((await agent.get('/session')).body)
    const answer = await agent.signIn(lead.email, PASSWORD)
    expect(answer.status).toBe(200)
    const session = sessionSchema.parse(answer.body)
    expect(session.person).toMatchObject({ id: lead.id, role: 'crewLead', email: lead.email })
    expect(session.person?.company?.id).toBe(lead.companyId)
    expect(session.csrfToken).not.toBe(before.csrfToken)
    expect(await agent.loadSession()).toMatchObject({ id: lead.id })
  })

  it('takes the mail address in any letters and with blanks around it', async () => {
    const { id, email } = await api.make.person('bender')
    const agent = api.newAgent()
    await agent.signIn(`  ${email.toUpperCase()} `, PASSWORD)
    expect(await agent.loadSession()).toMatchObject({ id })
  })

  it('notes when a person signed in last', async () => {
    const { id, email } = await api.make.person('counter')
    await api.newAgent().signIn(email, PASSWORD)
    const row = await api.db(PEOPLE).where({ id }).first()
    expect(row?.last_sign_in_at).toBeInstanceOf(Date)
  })

  it('begins a new session, so that one planted before is worth nothing', async () => {
    const { email } = await api.make.person('counter')
    const agent = api.newAgent()
    const planted = (await agent.fetch('/session')).headers.getSetCookie()[0]?.split(';')[0] ?? ''
    expect(planted).toContain('foldyard.session=')
    await agent.signIn(email, PASSWORD)
    const response = await fetch(`${api.url}/api/session`, { headers: { cookie: planted } })
    expect(sessionSchema.parse(await response.json()).person).toBeNull()
  })

  it('answers a wrong password and an unknown address alike', async () => {
    const { email } = await api.make.person('counter')
    const wrong = await api.newAgent().signIn(email, 'not the password')
    const unknown = await api.newAgent().signIn('nobody@example.com', PASSWORD)
    expect(wrong.status).toBe(401)
    expect(wrong.problem().code).toBe('wrong-credentials')
    const told = (answer: typeof wrong) => ({ ...answer.problem(), requestId: undefined })
    expect(told(unknown)).toEqual(told(wrong))
  })

  it('refuses an account that is switched off', async () => {
    const { email } = await api.make.person('counter', { active: false })
    expect((await api.newAgent().signIn(email, PASSWORD)).status).toBe(401)
  })

  it('names the fields that are missing, with the cure', async () => {
    const agent = api.newAgent()
    await agent.loadSession()
    const problem = (await agent.post('/session', { email: 'no address' })).problem()
    expect(problem.status).toBe(400)
    expect(problem.errors).toEqual([
      { path: 'email', message: 'Type a mail address such as name@example.com.' },
      { path: 'password', message: 'Missing. Send text.' },
    ])
  })

  it('needs the CSRF token of the session it was shown in', async () => {
    const { email } = await api.make.person('counter')
    const answer = await api.newAgent().post('/session', { email, password: PASSWORD })
    expect(answer.status).toBe(403)
    expect(answer.problem().code).toBe('csrf-token-wrong')
  })

  it('sets a cookie that no script reads and no other site sends, for 14 days', async () => {
    const { email } = await api.make.person('counter')
    const { headers } = await api.newAgent().signIn(email, PASSWORD)
    const cookie = headers.getSetCookie()[0] ?? ''
    expect(cookie).toContain('HttpOnly')
    expect(cookie).toContain('SameSite=Lax')
    const days = (Date.parse(/Expires=([^;]+)/.exec(cookie)?.[1] ?? '') - Date.now()) / 86_400_000
    expect(days).toBeCloseTo(14, 1)
  })
})

describe('a session', () => {
  it('is over when it has expired', async () => {
    const agent = await api.signInAs('counter')
    const person = await agent.loadSession()
    await api
      .db(SESSIONS)
      .whereRaw("sess -> 'passport' ->> 'user' = ?", [person?.id ?? ''])
      .update({ expire: new Date(Date.now() - 1000) })
    const answer = await agent.patch('/me', { theme: 'dark' })
    expect(answer.status).toBe(401)
    expect(answer.problem().code).toBe('not-signed-in')
  })

  it('is over at once when the account is switched off', async () => {
    const person = await api.make.person('counter')
    const agent = await api.signInAs(person)
    await api.db(PEOPLE).where({ id: person.id }).update({ active: false })
    expect((await agent.get('/companies')).status).toBe(401)
    await api.db(PEOPLE).where({ id: person.id }).update({ active: true })
    expect((await agent.get('/companies')).status).toBe(401)
  })

  it('ends on one device with a sign-out, and on that one only', async () => {
    const person = await api.make.person('counter')
    const [here, there] = [await api.signInAs(person), await api.signInAs(person)]
    expect((await here.del('/session')).status).toBe(204)
    expect(await here.loadSession()).toBeNull()
    expect(await there.loadSession()).toMatchObject({ id: person.id })
  })

  it('ends everywhere with a sign-out everywhere, and for that person only', async () => {
    const person = await api.make.person('counter')
    const [here, there] = [await api.signInAs(person), await api.signInAs(person)]
    const other = await api.signInAs('counter')
    expect((await here.del('/sessions')).status).toBe(204)
    expect(await here.loadSession()).toBeNull()
    expect(await there.loadSession()).toBeNull()
    expect(await other.loadSession()).not.toBeNull()
  })

  it('can be begun again after signing out', async () => {
    const person = await api.make.person('counter')
    const agent = await api.signInAs(person)
    await agent.del('/session')
    expect((await agent.signIn(person.email, PASSWORD)).status).toBe(200)
  })

  it('keeps the wrong CSRF token from changing anything', async () => {
    const agent = await api.signInAs('counter')
    const options = { headers: { 'x-csrf-token': 'a'.repeat(64) } }
    const answer = await agent.patch('/me', { theme: 'dark' }, options)
    expect(answer.status).toBe(403)
    expect(answer.problem().code).toBe('csrf-token-wrong')
    expect(await agent.loadSession()).toMatchObject({ theme: 'system' })
  })
})
