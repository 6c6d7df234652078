import { randomUUID } from 'node:crypto'
import supertest, { type Response as SupertestResponse } from 'supertest'
import { z } from 'zod'
import type { AnswerOf, BodyInputOf, Endpoint, Method, QueryInputOf } from '#shared/http/endpoint'
import { problemSchema, type Problem } from '#shared/http/problem'
import { sessionSchema } from '#shared/people/people.contract'

export interface ApiAnswer {
  readonly status: number
  readonly headers: Headers
  readonly body: unknown
  /** The body as a problem; throws when it is none. */
  readonly problem: () => Problem
}

export interface SendOptions {
  /** Taken in place of a new one. */
  readonly idempotencyKey?: string
  readonly headers?: Record<string, string>
}

interface CallInput<E extends Endpoint> extends SendOptions {
  readonly params?: Record<string, string>
  readonly query?: QueryInputOf<E>
  readonly body?: BodyInputOf<E>
}

/**
 * One browser: keeps its cookie, sends the CSRF token with every change and a new Idempotency-Key
 * with each. Paths are relative to /api.
 */
export class ApiAgent {
  private readonly browser: ReturnType<typeof supertest.agent>
  private cookie = ''
  private csrfToken = ''

  constructor(private readonly origin: string) {
    this.browser = supertest.agent(origin)
  }

  get = (path: string, options?: SendOptions) => this.send('GET', path, undefined, options)
  post = (path: string, body?: unknown, options?: SendOptions) =>
    this.send('POST', path, body, options)
  put = (path: string, body?: unknown, options?: SendOptions) =>
    this.send('PUT', path, body, options)
  patch = (path: string, body?: unknown, options?: SendOptions) =>
    this.send('PATCH', path, body, options)
  del = (path: string, options?: SendOptions) => this.send('DELETE', path, undefined, options)

  /** Calls an endpoint of the contract and parses its answer; a problem is thrown. */
  async call<E extends Endpoint>(endpoint: E, input: CallInput<E> = {}): Promise<AnswerOf<E>> {
    const query = searchOf(input.query)
    const path = fillPath(endpoint.path, input.params ?? {}) + query
    const answer = await this.send(endpoint.method, path, input.body, input)
    if (answer.status !== endpoint.success) {
      throw new Error(
        `${endpoint.method} ${path} answered ${answer.status}: ${JSON.stringify(answer.body)}`,
      )
    }
    return z.parse<E['answer']>(endpoint.answer, answer.body)
  }

  /** Reads a file of the API as its link opens it. */
  async file(endpoint: Endpoint, input: Pick<CallInput<Endpoint>, 'params' | 'query'>) {
    const path = fillPath(endpoint.path, input.params ?? {}) + searchOf(input.query)
    const answer = await this.fetch(path)
    if (answer.status !== 200) {
      throw new Error(`GET ${path} answered ${answer.status}: ${await answer.text()}`)
    }
    return { headers: answer.headers, bytes: new Uint8Array(await answer.arrayBuffer()) }
  }

  /** Reads the session, as a page does when it loads. */
  async loadSession() {
    const { person, csrfToken } = sessionSchema.parse((await this.get('/session')).body)
    this.csrfToken = csrfToken
    return person
  }

  async signIn(email: string, password: string): Promise<ApiAnswer> {
    await this.loadSession()
    const answer = await this.post('/session', { email, password })
    if (answer.status === 200) this.csrfToken = sessionSchema.parse(answer.body).csrfToken
    return answer
  }

  /** The request as `fetch` sees it, for what is no plain JSON answer. */
  fetch(path: string, init: RequestInit = {}): Promise<Response> {
    const headers = new Headers(init.headers)
    if (this.cookie) headers.set('cookie', this.cookie)
    return fetch(`${this.origin}/api${path}`, { ...init, headers })
  }

  async send(
    method: Method,
    path: string,
    body?: unknown,
    options: SendOptions = {},
  ): Promise<ApiAnswer> {
    const request = this.browser[VERBS[method]](`/api${path}`)
    if (method !== 'GET') {
      request.set('x-csrf-token', this.csrfToken)
      request.set('idempotency-key', options.idempotencyKey ?? randomUUID())
    }
    request.set(options.headers ?? {})
    if (body !== undefined) request.type('application/json').send(JSON.stringify(body))
    const response = await request
    this.keepCookie(response)
    return readAnswer(response)
  }

  /** The jar of the browser serves its own requests; streams are opened with a copy. */
  private keepCookie(response: SupertestResponse): void {
    const lines = z.array(z.string()).default([]).parse(response.headers['set-cookie'])
    for (const line of lines) {
      const pair = line.split(';', 1)[0] ?? ''
      this.cookie = pair.endsWith('=') ? '' : pair
    }
  }
}

const VERBS = {
  GET: 'get',
  POST: 'post',
  PUT: 'put',
  PATCH: 'patch',
  DELETE: 'delete',
} as const satisfies Record<Method, string>

function readAnswer(response: SupertestResponse): ApiAnswer {
  const headers = new Headers()
  for (const [name, value] of Object.entries(headersOf(response))) headers.set(name, String(value))
  const isJson = headers.get('content-type')?.includes('json') ?? false
  const text = response.text ?? ''
  const body: unknown = text === '' ? undefined : isJson ? JSON.parse(text) : text
  return { status: response.status, headers, body, problem: () => problemSchema.parse(body) }
}

const headersOf = (response: SupertestResponse) =>
  z.record(z.string(), z.union([z.string(), z.array(z.string())])).parse(response.headers)

export const fillPath = (path: string, params: Record<string, string>): string =>
  path.replace(/:(\w+)/g, (_, name: string) => {
    const value = params[name]
    if (value === undefined) throw new Error(`The path ${path} needs ${name}.`)
    return encodeURIComponent(value)
  })

function searchOf(query: unknown): string {
  if (query === undefined) return ''
  const given = z.record(z.string(), z.union([z.string(), z.number(), z.boolean()]).optional())
  const search = new URLSearchParams()
  for (const [name, value] of Object.entries(given.parse(query))) {
    if (value !== undefined) search.set(name, String(value))
  }
  const text = search.toString()
  return text && `?${text}`
}
