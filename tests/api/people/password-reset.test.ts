import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { RESETS_PER_ACCOUNT } from '#server/features/people/password-limits'
import { readPasswordLink, setPassword } from '#shared/people/accounts.contract'
import type { ApiAgent } from '../../support/api-agent'
import { startApi, type Api } from '../../support/api-app'
import { PASSWORD } from '../../support/factories'
import { FakeClock } from '../../support/fake-clock'
import { countMailsTo, lastMailTo, tokenIn } from '../../support/mail-factories'

const clock = new FakeClock(new Date('2026-05-04T15:00:00Z'))
let api: Api
let door: ApiAgent
beforeAll(async () => {
  api = await startApi({ clock })
  door = api.newAgent()
  await door.loadSession()
})
afterAll(() => api.close())

const ask = (email: string) => door.post('/password-resets', { email })

async function linkFor(email: string): Promise<string> {
  expect((await ask(email)).status).toBe(204)
  await api.runJobs()
  return tokenIn(await lastMailTo(api.db, email))
}

const MINUTE = 60_000
const NEW_PASSWORD = 'snips hang by the door'

describe('a lost password', () => {
  it('is replaced by the link in the mail, and every session ends', async () => {
    const person = await api.make.person('bender')
    const signedIn = await api.signInAs(person)
    const token = await linkFor(person.email)
    const link = await door.call(readPasswordLink, { body: { token } })
    expect(link).toMatchObject({ kind: 'reset', email: person.email })
    await door.call(setPassword, { body: { token, password: NEW_PASSWORD } })
    expect(await signedIn.loadSession()).toBeNull()
    expect((await api.newAgent().signIn(person.email, PASSWORD)).status).toBe(401)
    expect((await api.newAgent().signIn(person.email, NEW_PASSWORD)).status).toBe(200)
  })

  it('is asked for with the same answer whoever has the address', async () => {
    const person = await api.make.person('bender')
    const known = await ask(person.email)
    const unknown = await ask('nobody@example.com')
    expect([known.status, known.body]).toEqual([unknown.status, unknown.body])
    await api.runJobs()
    expect(await countMailsTo(api.db, 'nobody@example.com')).toBe(0)
    expect(await countMailsTo(api.db, person.email)).toBe(1)
  })

  it('has a link that holds for an hour', async () => {
    const { email } = await api.make.person('bender')
    const token = await linkFor(email)
    clock.moveBy(60 * MINUTE - 1000)
    expect((await door.post('/password-links', { token })).status).toBe(200)
    clock.moveBy(1000)
    expect((await door.post('/password-links', { token })).status).toBe(404)
  })

  it('brings nothing to a closed account', async () => {
    const { email } = await api.make.person('bender', { active: false })
    await ask(email)
    await api.runJobs()
    expect(await countMailsTo(api.db, email)).toBe(0)
  })

  it('can be asked for so often and no more, whoever has the address', async () => {
    const { email } = await api.make.person('bender')
    for (const address of [email, 'nobody.either@example.com']) {
      for (let tries = 0; tries < RESETS_PER_ACCOUNT; tries += 1) {
        expect((await ask(address)).status).toBe(204)
      }
      expect((await ask(address)).problem().code).toBe('too-many-requests')
    }
    clock.moveBy(61 * MINUTE)
    expect((await ask(email)).status).toBe(204)
  })
})
