import { randomUUID } from 'node:crypto'
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest'
import { MAILS } from '#server/db/tables/mails'
import { startJobs } from '#server/jobs/start-jobs'
import { getMail, listMails, sendMailAgain } from '#shared/mail/mail.contract'
import { invitePerson } from '#shared/people/accounts.contract'
import type { ApiAgent } from '../../support/api-agent'
import { startApi, type Api } from '../../support/api-app'
import { lastMailTo, tokenIn } from '../../support/mail-factories'
import { startSmtpCatcher, type SmtpCatcher } from '../../support/smtp-catcher'

let smtp: SmtpCatcher
let api: Api
let manager: ApiAgent
beforeAll(async () => {
  smtp = await startSmtpCatcher()
  api = await startApi({
    environment: {
      SMTP_URL: smtp.url,
      MAIL_FROM: 'Shop <shop@example.com>',
      PUBLIC_URL: 'https://trim.example.com',
    },
  })
  manager = await api.signInAs('manager')
})
afterAll(async () => {
  await api.close()
  await smtp.close()
})
afterEach(() => {
  smtp.refuseWith = null
})

async function invite() {
  const { email } = await manager.call(invitePerson, {
    body: {
      name: 'Íñigo Pizarra',
      email: `${randomUUID()}@example.com`,
      role: 'bender',
      language: 'es',
    },
  })
  return lastMailTo(api.db, email)
}

/** Lets the wait of every job be over. */
const passTime = () =>
  api.db.raw("update graphile_worker._private_jobs set run_at = now() - interval '1 hour'")

const stateOf = async (id: string) => api.db(MAILS).where({ id }).first('*')

describe('a mail that leaves', () => {
  it('arrives with its sender, its names and its link', async () => {
    const mail = await invite()
    await api.runJobs()
    const message = smtp.messages.at(-1) ?? ''
    expect(message).toContain('From: Shop <shop@example.com>')
    expect(message).toContain(`Message-ID: <${mail.id}@example.com>`)
    expect(message).toContain('Content-Language: es')
    expect(await stateOf(mail.id)).toMatchObject({ state: 'sent', attempts: 1 })
  })

  it('is kept without the link that opens the account, and shown without it before', async () => {
    const mail = await invite()
    const token = tokenIn(mail)
    const shown = await manager.call(getMail, { params: { mailId: mail.id } })
    expect(shown.secretHidden).toBe(true)
    expect(JSON.stringify(shown)).not.toContain(token)
    await api.runJobs()
    expect(smtp.messages.at(-1)?.replaceAll('=\r\n', '')).toContain(token)
    expect(JSON.stringify(await stateOf(mail.id))).not.toContain(token)
  })
})

describe('a mail that the server does not take', () => {
  it('waits longer from try to try, and is given up after the last', async () => {
    const mail = await invite()
    smtp.refuseWith = { code: 451, text: 'Come back later' }
    const waits: number[] = []
    for (let tries = 1; tries <= 12; tries += 1) {
      await api.runJobs()
      const { rows } = await api.db.raw<{ rows: { wait: number }[] }>(
        'select extract(epoch from run_at - now())::float as wait from graphile_worker._private_jobs where key = ?',
        [`mail ${mail.id}`],
      )
      waits.push(...rows.map(({ wait }) => wait))
      expect(await stateOf(mail.id)).toMatchObject({
        attempts: tries,
        state: tries < 12 ? 'queued' : 'failed',
      })
      await passTime()
    }
    expect(waits).toHaveLength(11)
    // The tenth wait is the longest; the last is as long, less the moment that went by since.
    const growing = waits.slice(0, 10)
    expect(growing).toEqual([...new Set(growing)].sort((a, b) => a - b))
    expect(waits[10]).toBeGreaterThan((waits[8] ?? NaN) * 2)
    const { items } = await manager.call(listMails, { query: { state: 'failed' } })
    expect(items.find(({ id }) => id === mail.id)?.lastError).toContain('Come back later')
  })

  it('is given up at once when there is no such mailbox', async () => {
    const mail = await invite()
    smtp.refuseWith = { code: 550, text: 'No such user' }
    await api.runJobs()
    expect(await stateOf(mail.id)).toMatchObject({ state: 'failed', attempts: 1 })
  })

  it('is sent again when a manager says so, and only then', async () => {
    const mail = await invite()
    const params = { mailId: mail.id }
    const early = await manager.post(`/mails/${mail.id}/sending`)
    expect(early.problem().code).toBe('wrong-state')
    smtp.refuseWith = { code: 550, text: 'No such user' }
    await api.runJobs()
    smtp.refuseWith = null
    expect(await manager.call(sendMailAgain, { params })).toMatchObject({ state: 'queued' })
    await api.runJobs()
    expect(await stateOf(mail.id)).toMatchObject({ state: 'sent', attempts: 2, last_error: null })
  })
})

describe('the list of mails', () => {
  it('is read page by page, newest first', async () => {
    const written = [await invite(), await invite(), await invite()].map(({ id }) => id)
    const first = await manager.call(listMails, { query: { limit: 2 } })
    const second = await manager.call(listMails, { query: { limit: 1, after: first.next ?? '' } })
    expect([...first.items, ...second.items].map(({ id }) => id)).toEqual(written.toReversed())
    expect(first.leaves).toBe(true)
  })
})

describe('the worker within the server', () => {
  it('sends what is written while it runs, and ends with the server', async () => {
    const running = await startApi({ sharing: api, jobs: startJobs })
    const mail = await invite()
    await expect.poll(async () => (await stateOf(mail.id))?.state, { timeout: 20_000 }).toBe('sent')
    await running.close()
  })
})
