import type { AnswerOf, Endpoint } from '#shared/http/endpoint'
import { problemSchema } from '#shared/http/problem'
import { ApiProblem, OfflineError, UnreadableAnswer } from '@/lib/api/api-errors'
import { reportAnswering } from '@/lib/api/reachability'
import { requestUrl } from '@/lib/api/request-url'

export interface Sending {
  readonly params?: unknown
  readonly query?: unknown
  readonly body?: unknown
  readonly headers: Readonly<Record<string, string>>
  readonly signal?: AbortSignal | undefined
}

async function exchange(url: string, init: RequestInit): Promise<Response> {
  try {
    const response = await fetch(url, init)
    reportAnswering(true)
    return response
  } catch (cause) {
    if (init.signal?.aborted) throw cause
    reportAnswering(false)
    throw new OfflineError(cause)
  }
}

/** The body as data; undefined for an empty one. The connection may still break while it is read. */
async function readBody(response: Response, request: string): Promise<unknown> {
  let text: string
  try {
    text = await response.text()
  } catch (cause) {
    throw new OfflineError(cause)
  }
  if (text === '') return undefined
  try {
    return JSON.parse(text)
  } catch (cause) {
    throw new UnreadableAnswer(response.status, request, cause)
  }
}

/** One exchange with the server, parsed by the endpoint's schema. Knows no session and no retry. */
export async function send<E extends Endpoint>(
  endpoint: E,
  { params, query, body, headers, signal }: Sending,
): Promise<AnswerOf<E>> {
  const request = `${endpoint.method} ${endpoint.path}`
  const response = await exchange(requestUrl(endpoint.path, params, query), {
    method: endpoint.method,
    credentials: 'same-origin',
    headers: {
      accept: 'application/json, application/problem+json',
      ...(body === undefined ? {} : { 'content-type': 'application/json' }),
      ...headers,
    },
    ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    ...(signal ? { signal } : {}),
  })
  const data = await readBody(response, request)
  if (!response.ok) {
    const problem = problemSchema.safeParse(data)
    if (!problem.success) throw new UnreadableAnswer(response.status, request, problem.error)
    throw new ApiProblem(problem.data)
  }
  const answer = endpoint.answer.safeParse(data)
  if (!answer.success) throw new UnreadableAnswer(response.status, request, answer.error)
  return answer.data as AnswerOf<E>
}
