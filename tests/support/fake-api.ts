import { vi } from 'vitest'
import type { Role } from '#shared/access/permissions'
import type { ProblemCode } from '#shared/http/problem'
import { PROBLEMS } from '#shared/http/problem'
import type { Self } from '#shared/people/people.contract'

export interface SeenRequest {
  readonly route: string
  readonly url: string
  readonly headers: Headers
  readonly body: unknown
}

type Answer = (request: SeenRequest) => Response | Promise<Response>

export const json = (body: unknown, status = 200): Response =>
  new Response(status === 204 ? null : JSON.stringify(body), {
    status,
    headers: { 'content-type': 'application/json' },
  })

export const problem = (code: ProblemCode, more: object = {}): Response =>
  new Response(
    JSON.stringify({
      type: `/problems/${code}`,
      title: code,
      status: PROBLEMS[code],
      detail: `The request was answered with ${code}.`,
      code,
      requestId: 'req-0001',
      ...more,
    }),
    { status: PROBLEMS[code], headers: { 'content-type': 'application/problem+json' } },
  )

/** What `fetch` does when no answer comes. */
export const noAnswer = (): never => {
  throw new TypeError('Failed to fetch')
}

/**
 * The server at the edge of the client: `fetch` itself is replaced, all above it is real. Answers
 * are named by method and path; the last one given for a route stays in force, and what the test
 * does not name is not found.
 *
 *     const api = fakeApi({ 'GET /api/session': () => json({ person: null, csrfToken: 'a' }) })
 *     api.on('POST /api/session', () => problem('wrong-credentials'))
 *     expect(api.seen('POST /api/session')).toHaveLength(1)
 */
export function fakeApi(answers: Record<string, Answer> = {}) {
  const routes = new Map(Object.entries(answers))
  const requests: SeenRequest[] = []

  vi.stubGlobal('fetch', async (url: string, init: RequestInit) => {
    const route = `${init.method ?? 'GET'} ${url.replace(/\?.*$/, '')}`
    const request: SeenRequest = {
      route,
      url,
      headers: new Headers(init.headers),
      body: typeof init.body === 'string' ? (JSON.parse(init.body) as unknown) : undefined,
    }
    requests.push(request)
    const answer = routes.get(route) ?? (() => problem('not-found'))
    return Promise.resolve().then(() => answer(request))
  })

  return {
    on: (route: string, answer: Answer) => void routes.set(route, answer),
    seen: (route: string) => requests.filter((request) => request.route === route),
  }
}

/** An invented person of a role. */
export const personOf = (role: Role, more: Partial<Self> = {}): Self => ({
  id: '0d9b3a5e-6f0e-4c8e-9a43-2f2a3b1c4d5e',
  name: 'Ines Calder',
  email: 'ines@example.com',
  role,
  company:
    role === 'crewLead'
      ? { id: '7c1f9a52-0b6d-4f7e-8f9e-1a2b3c4d5e6f', name: 'Tamsin & Reed Roofing' }
      : null,
  language: 'en',
  units: 'fraction',
  theme: 'light',
  ...more,
})
