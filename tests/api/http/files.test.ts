import express from 'express'
import { createServer, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import { pino } from 'pino'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { z } from 'zod'
import { notFound } from '#server/http/errors'
import { definePublicRoute } from '#server/http/define-route'
import { mountRoutes } from '#server/http/mount-routes'
import { answerProblem } from '#server/http/problem-answer'
import { logRequests } from '#server/http/request-log'
import { fileEndpoint, type FileAnswer } from '#shared/http/endpoint'
import { problemSchema } from '#shared/http/problem'
import { startApi, type Api } from '../../support/api-app'

const drawing = fileEndpoint({
  path: '/drawings/:name',
  permission: 'public',
  summary: 'A drawing.',
  params: z.strictObject({ name: z.string() }),
  produces: 'image/svg+xml',
})

const BYTES = Uint8Array.of(60, 115, 0, 255)
const FILES: Record<string, FileAnswer> = {
  right: { name: 'F-0001_A.svg', bytes: BYTES },
  // A view into something larger: only the view may leave.
  part: { name: 'part.svg', bytes: Uint8Array.of(1, 2, 60, 115, 0, 255, 3).subarray(2, 6) },
  wrongName: { name: 'a"; filename="b', bytes: BYTES },
}

let api: Api
let server: Server
let origin = ''
beforeAll(async () => {
  api = await startApi()
  const app = express()
  app.use(logRequests(pino({ level: 'silent' })))
  const route = definePublicRoute(drawing, ({ params }) => {
    const file = FILES[params.name]
    return file ? Promise.resolve(file) : Promise.reject(notFound('drawing'))
  })
  mountRoutes(app, [route], api.db)
  app.use(answerProblem)
  server = createServer(app)
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
  origin = `http://127.0.0.1:${(server.address() as AddressInfo).port}`
})
afterAll(async () => {
  await new Promise((resolve) => server.close(resolve))
  await api.close()
})

describe('a file', () => {
  it('is sent as what the endpoint produces, to be shown, and kept by nobody on the way', async () => {
    const answer = await fetch(`${origin}/drawings/right`)
    expect(answer.status).toBe(200)
    expect(Object.fromEntries(answer.headers)).toMatchObject({
      'content-type': 'image/svg+xml',
      'content-disposition': 'inline; filename="F-0001_A.svg"',
      'cache-control': 'no-store',
      'x-content-type-options': 'nosniff',
    })
    expect(new Uint8Array(await answer.arrayBuffer())).toEqual(BYTES)
  })

  it('is nothing but its own bytes', async () => {
    const answer = await fetch(`${origin}/drawings/part`)
    expect(new Uint8Array(await answer.arrayBuffer())).toEqual(BYTES)
  })

  it('that is not there is a problem like any other', async () => {
    const answer = await fetch(`${origin}/drawings/unknown`)
    expect(answer.headers.get('content-type')).toContain('application/problem+json')
    expect(answer.headers.has('content-disposition')).toBe(false)
    expect(problemSchema.parse(await answer.json())).toMatchObject({ code: 'not-found' })
  })

  it('whose name could write a header of its own is never sent', async () => {
    const answer = await fetch(`${origin}/drawings/wrongName`)
    expect(answer.status).toBe(500)
    expect(answer.headers.has('content-disposition')).toBe(false)
  })
})
