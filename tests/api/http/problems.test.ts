import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { problemSchema } from '#shared/http/problem'
import type { ApiAgent } from '../../support/api-agent'
import { startApi, type Api } from '../../support/api-app'

let api: Api
let lead: ApiAgent
beforeAll(async () => {
  api = await startApi()
  lead = await api.signInAs('crewLead')
})
afterAll(() => api.close())

describe('a problem', () => {
  it('is RFC 9457 problem details under a stable type, with the id of the request', async () => {
    const answer = await lead.get('/no-such-thing')
    expect(answer.status).toBe(404)
    expect(answer.headers.get('content-type')).toBe('application/problem+json; charset=utf-8')
    const problem = answer.problem()
    expect(problem).toMatchObject({
      type: '/problems/not-found',
      title: 'Not found',
      status: 404,
      code: 'not-found',
      detail: 'There is no such path as GET /api/no-such-thing, or it is not yours to see.',
    })
    expect(problem.requestId).toBe(answer.headers.get('x-request-id'))
    expect(problem.requestId).toMatch(/^[0-9a-f-]{36}$/)
  })

  it('names every bad field by path, in body and query alike', async () => {
    const body = { name: '', address: 'a', pitchRise: 30, color: 'red' }
    const { errors } = (await lead.post('/jobs', body)).problem()
    expect(errors?.map(({ path }) => path)).toEqual(['name', 'pitchRise', 'color'])
    expect(errors?.map(({ message }) => message)).toEqual([
      'Cannot be empty.',
      'A pitch above 24 in 12 is a wall; type 24 or less.',
      'This field is not known here. Leave it out.',
    ])
    const query = (await lead.get('/jobs?limit=1000&nonsense=1')).problem()
    expect(query.errors).toEqual([
      { path: 'limit', message: 'Too large. Send at most 100.' },
      { path: 'nonsense', message: 'This field is not known here. Leave it out.' },
    ])
  })

  it('says what an id looks like', async () => {
    const problem = (await lead.get('/jobs/17')).problem()
    expect(problem.code).toBe('invalid-input')
    expect(problem.errors).toEqual([
      { path: 'jobId', message: 'Must be an id (a UUID), as given by this API.' },
    ])
  })

  const post = async (body: string) => {
    const response = await lead.fetch('/jobs', {
      method: 'POST',
      body,
      headers: { 'content-type': 'application/json' },
    })
    return problemSchema.parse(await response.json())
  }

  it('is the answer to a body that is not JSON', async () => {
    const problem = await post('{"name": ')
    expect(problem).toMatchObject({ status: 400, code: 'invalid-input' })
    expect(problem.detail).toBe('The body is not JSON. Send valid JSON.')
  })

  it('is the answer to a body that is too large', async () => {
    const problem = await post(JSON.stringify({ name: 'x'.repeat(1_100_000) }))
    expect(problem).toMatchObject({ status: 400, code: 'invalid-input' })
    expect(problem.detail).toBe('The body is too large. Send at most 1 MB.')
  })

  it('is the answer to an address that cannot be decoded', async () => {
    const problem = (await lead.get('/jobs/%E0%A4%A')).problem()
    expect(problem).toMatchObject({ status: 400, code: 'invalid-input' })
  })
})

describe('every answer', () => {
  it('carries a strict content security policy without inline scripts', async () => {
    const policy = (await lead.get('/session')).headers.get('content-security-policy') ?? ''
    const directives = new Map(
      policy.split(';').map((part) => {
        const [name = '', ...sources] = part.trim().split(' ')
        return [name, sources]
      }),
    )
    expect(directives.get('default-src')).toEqual(["'self'"])
    expect(directives.get('script-src')).toEqual(["'self'"])
    expect(directives.get('object-src')).toEqual(["'none'"])
    expect(directives.get('frame-ancestors')).toEqual(["'none'"])
    expect(directives.get('style-src')).not.toContain("'unsafe-inline'")
  })

  it('insists on TLS only where it is served over TLS', async () => {
    expect((await lead.get('/session')).headers.get('strict-transport-security')).toBeNull()
  })

  it('does not say what made it and is not kept by a cache', async () => {
    const { headers } = await lead.get('/session')
    expect(headers.get('x-powered-by')).toBeNull()
    expect(headers.get('cache-control')).toBe('no-store')
    expect(headers.get('x-content-type-options')).toBe('nosniff')
  })
})
