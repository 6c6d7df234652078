import { beforeEach, describe, expect, expectTypeOf, it, vi } from 'vitest'
import { createJob, getJob, listJobs, type Job } from '#shared/jobs/jobs.contract'
import { getSession, signOut, updateSelf } from '#shared/people/people.contract'
import { ApiProblem, OfflineError, UnreadableAnswer } from '@/lib/api/api-errors'
import { call } from '@/lib/api/call'
import { holdCsrfToken } from '@/lib/api/csrf-token'
import { onSessionEnd } from '@/lib/api/session-end'
import { fakeApi, json, noAnswer, personOf, problem } from '../../support/fake-api'

const JOB_ID = '5b0c7f0e-8f3a-4f0e-9d55-0a7f6f3a9b10'
const job: Job = {
  id: JOB_ID,
  company: { id: '7c1f9a52-0b6d-4f7e-8f9e-1a2b3c4d5e6f', name: 'Tamsin & Reed Roofing' },
  name: 'Larkspur barn',
  address: '',
  pitchRise: 6,
  version: 1,
  orderCount: 0,
  createdAt: '2026-03-02T15:00:00Z',
}

beforeEach(() => holdCsrfToken('first'))

describe('what is sent', () => {
  it('fills parameters into the path and leaves absent query values out', async () => {
    const api = fakeApi({
      [`GET /api/jobs/${JOB_ID}`]: () => json(job),
      'GET /api/jobs': () => json({ items: [job], next: null }),
    })
    await call(getJob, { params: { jobId: JOB_ID } })
    await call(listJobs, { query: { search: 'bar & n', after: undefined, limit: 5 } })
    expect(api.seen('GET /api/jobs')[0]?.url).toBe('/api/jobs?search=bar+%26+n&limit=5')
  })

  it('sends the CSRF token with changes and not with reads', async () => {
    const api = fakeApi({
      'PATCH /api/me': () => json(personOf('bender')),
      [`GET /api/jobs/${JOB_ID}`]: () => json(job),
    })
    await call(updateSelf, { body: { units: 'mm' } })
    await call(getJob, { params: { jobId: JOB_ID } })
    const [change] = api.seen('PATCH /api/me')
    expect(change?.headers.get('x-csrf-token')).toBe('first')
    expect(change?.body).toEqual({ units: 'mm' })
    expect(api.seen(`GET /api/jobs/${JOB_ID}`)[0]?.headers.has('x-csrf-token')).toBe(false)
  })

  it('sends the idempotency key, and refuses to make something without one', async () => {
    const api = fakeApi({ 'POST /api/jobs': () => json(job, 201) })
    const body = { name: 'Larkspur barn', address: '', pitchRise: 6 }
    await call(createJob, { body, idempotencyKey: 'key-1' })
    expect(api.seen('POST /api/jobs')[0]?.headers.get('idempotency-key')).toBe('key-1')
    await expect(call(createJob, { body })).rejects.toThrow('needs an idempotency key')
    expect(api.seen('POST /api/jobs')).toHaveLength(1)
  })
})

describe('what comes back', () => {
  it('gives the answer in the type of the contract', async () => {
    fakeApi({ [`GET /api/jobs/${JOB_ID}`]: () => json(job) })
    const answer = await call(getJob, { params: { jobId: JOB_ID } })
    expectTypeOf(answer).toEqualTypeOf<Job>()
    expect(answer).toEqual(job)
  })

  it('takes an answer without content', async () => {
    fakeApi({ 'DELETE /api/session': () => json(undefined, 204) })
    expect(await call(signOut)).toBeUndefined()
  })

  it('throws the problem that the server names', async () => {
    const errors = [{ path: 'name', message: 'Cannot be empty.' }]
    fakeApi({ 'POST /api/jobs': () => problem('invalid-input', { errors }) })
    const failed = await call(createJob, {
      body: { name: '', address: '', pitchRise: 6 },
      idempotencyKey: 'key-1',
    }).catch((error: unknown) => error)
    expect(failed).toBeInstanceOf(ApiProblem)
    expect(failed).toMatchObject({ status: 400, refused: true, problem: { errors } })
  })

  it('does not trust an answer of another shape', async () => {
    fakeApi({ [`GET /api/jobs/${JOB_ID}`]: () => json({ ...job, pitchRise: 'six' }) })
    await expect(call(getJob, { params: { jobId: JOB_ID } })).rejects.toThrow(UnreadableAnswer)
  })

  it('tells a page of a proxy from a problem of the server', async () => {
    fakeApi({
      [`GET /api/jobs/${JOB_ID}`]: () => new Response('<h1>Bad gateway</h1>', { status: 502 }),
    })
    await expect(call(getJob, { params: { jobId: JOB_ID } })).rejects.toMatchObject({
      name: 'UnreadableAnswer',
      status: 502,
    })
  })

  it('says when no answer came', async () => {
    fakeApi({ [`GET /api/jobs/${JOB_ID}`]: noAnswer })
    await expect(call(getJob, { params: { jobId: JOB_ID } })).rejects.toThrow(OfflineError)
  })
})

describe('the CSRF token', () => {
  it('is renewed when it is wrong, and the change is sent once more', async () => {
    const api = fakeApi({
      'GET /api/session': () => json({ person: personOf('bender'), csrfToken: 'second' }),
    })
    api.on('PATCH /api/me', ({ headers }) =>
      headers.get('x-csrf-token') === 'second'
        ? json(personOf('bender'))
        : problem('csrf-token-wrong'),
    )
    await call(updateSelf, { body: { theme: 'dark' } })
    expect(api.seen('PATCH /api/me').map(({ headers }) => headers.get('x-csrf-token'))).toEqual([
      'first',
      'second',
    ])
  })

  it('is asked for when none is held', async () => {
    holdCsrfToken(null)
    const api = fakeApi({
      'GET /api/session': () => json({ person: personOf('bender'), csrfToken: 'asked' }),
      'PATCH /api/me': () => json(personOf('bender')),
    })
    await call(updateSelf, { body: { theme: 'dark' } })
    expect(api.seen('PATCH /api/me')[0]?.headers.get('x-csrf-token')).toBe('asked')
  })

  it('that stays wrong ends in the problem, not in a circle', async () => {
    const api = fakeApi({
      'GET /api/session': () => json({ person: null, csrfToken: 'second' }),
      'PATCH /api/me': () => problem('csrf-token-wrong'),
    })
    await expect(call(updateSelf, { body: { theme: 'dark' } })).rejects.toThrow(ApiProblem)
    expect(api.seen('PATCH /api/me')).toHaveLength(2)
  })
})

describe('the end of a session', () => {
  it('is announced when a request is answered so', async () => {
    const ended = vi.fn()
    const stop = onSessionEnd(ended)
    fakeApi({ 'PATCH /api/me': () => problem('not-signed-in') })
    await expect(call(updateSelf, { body: { theme: 'dark' } })).rejects.toThrow(ApiProblem)
    stop()
    expect(ended).toHaveBeenCalledOnce()
  })

  it('is not announced by other refusals', async () => {
    const ended = vi.fn()
    const stop = onSessionEnd(ended)
    fakeApi({ 'GET /api/session': () => problem('internal') })
    await expect(call(getSession)).rejects.toThrow(ApiProblem)
    stop()
    expect(ended).not.toHaveBeenCalled()
  })
})
