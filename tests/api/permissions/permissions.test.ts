import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { may, ROLES, type Role } from '#shared/access/permissions'
import { ENDPOINTS } from '#shared/http/contracts'
import type { Endpoint } from '#shared/http/endpoint'
import { signOut, signOutEverywhere } from '#shared/people/people.contract'
import { fillPath, type ApiAgent, type ApiAnswer } from '../../support/api-agent'
import { startApi, type Api } from '../../support/api-app'

const nameOf = (endpoint: Endpoint): string => `${endpoint.method} ${endpoint.path}`

/** Well-formed ids of nothing, so that a request that gets past the door finds nobody at home. */
const NOWHERE = '00000000-0000-4000-8000-000000000000'
const somewhere = (endpoint: Endpoint): string =>
  fillPath(
    endpoint.path,
    Object.fromEntries(
      [...endpoint.path.matchAll(/:(\w+)/g)].map(([, name = '']) => [name, NOWHERE]),
    ),
  )

const knock = (agent: ApiAgent, endpoint: Endpoint): Promise<ApiAnswer> =>
  agent.send(
    endpoint.method,
    somewhere(endpoint),
    endpoint.body.safeParse(undefined).success ? undefined : {},
  )

/** These end the session that asks, so each gets one of its own. */
const ENDING: readonly Endpoint[] = [signOut, signOutEverywhere]

let api: Api
const agents = new Map<Role, ApiAgent>()
beforeAll(async () => {
  api = await startApi()
  for (const role of ROLES) agents.set(role, await api.signInAs(role))
})
afterAll(() => api.close())

const agentFor = async (role: Role, endpoint: Endpoint): Promise<ApiAgent> => {
  const shared = agents.get(role)
  return shared && !ENDING.includes(endpoint) ? shared : api.signInAs(role)
}

describe('the list of endpoints', () => {
  it('names each of them once', () => {
    const names = ENDPOINTS.map(nameOf)
    expect(new Set(names).size).toBe(names.length)
    expect(names.length).toBeGreaterThan(30)
  })

  it('lets only the door be opened without signing in', () => {
    const open = ENDPOINTS.filter(({ permission }) => permission === 'public').map(nameOf)
    expect(open.sort()).toEqual([
      'GET /session',
      'POST /password-links',
      'POST /password-resets',
      'POST /passwords',
      'POST /session',
    ])
  })
})

describe.each(ENDPOINTS.map((endpoint) => [nameOf(endpoint), endpoint] as const))(
  '%s',
  (_name, endpoint) => {
    it('turns away who is not signed in, unless it is public', async () => {
      const answer = await knock(api.newAgent(), endpoint)
      if (endpoint.permission !== 'public') {
        expect(answer.status).toBe(401)
        expect(answer.problem().code).toBe('not-signed-in')
      } else {
        // Signing in and setting a password are changes and so need the CSRF token of the page.
        expect(answer.status).toBe(endpoint.method === 'GET' ? 200 : 403)
      }
    })

    it.each(ROLES)('follows the table for a %s', async (role) => {
      const answer = await knock(await agentFor(role, endpoint), endpoint)
      const allowed = endpoint.permission === 'public' || may(role, endpoint.permission)
      if (!allowed) {
        expect(answer.status).toBe(403)
        expect(answer.problem().code).toBe('not-allowed')
      } else {
        // Whatever else is wrong with the request, it got past the door to a handler.
        expect([401, 403, 500, 503]).not.toContain(answer.status)
        if (answer.status === 404) expect(answer.problem().detail).not.toContain('/api/')
      }
    })
  },
)

describe('the event stream', () => {
  it('turns away who is not signed in', async () => {
    const answer = await api.newAgent().get('/live')
    expect(answer.status).toBe(401)
    expect(answer.problem().code).toBe('not-signed-in')
  })
})
