import express from 'express'
import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises'
import { createServer, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { pino } from 'pino'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { answerProblem } from '#server/http/problem-answer'
import { logRequests } from '#server/http/request-log'
import { serveClient } from '#server/http/serve-client'

let directory: string
let server: Server

beforeAll(async () => {
  directory = await mkdtemp(join(tmpdir(), 'foldyard-client-'))
  await mkdir(join(directory, 'assets'))
  await writeFile(join(directory, 'index.html'), '<title>the page</title>')
  await writeFile(join(directory, 'manifest.webmanifest'), '{}')
  await writeFile(join(directory, 'assets', 'main-1a2b3c.js'), 'export {}')
  const app = express()
  app.use(logRequests(pino({ level: 'silent' })), serveClient(directory), answerProblem)
  server = createServer(app)
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
})
afterAll(async () => {
  await new Promise((resolve) => server.close(resolve))
  await rm(directory, { recursive: true })
})

const get = (path: string) => {
  const address = server.address() as AddressInfo
  return fetch(`http://127.0.0.1:${address.port}${path}`)
}

describe('the built client', () => {
  it.each(['/', '/roof/orders/17', '/no/such/place'])('is the page at %s', async (path) => {
    const response = await get(path)
    expect(response.status).toBe(200)
    expect(response.headers.get('cache-control')).toBe('no-cache')
    expect(await response.text()).toContain('the page')
  })

  it('has assets that a browser keeps for ever', async () => {
    const { headers } = await get('/assets/main-1a2b3c.js')
    expect(headers.get('cache-control')).toBe('public, max-age=31536000, immutable')
    expect(headers.get('content-type')).toContain('javascript')
  })

  it('has other files that a browser asks for anew', async () => {
    expect((await get('/manifest.webmanifest')).headers.get('cache-control')).toBe('no-cache')
  })

  it('answers a missing asset with a problem, never with the page', async () => {
    const response = await get('/assets/main-gone.js')
    expect(response.status).toBe(404)
    expect(response.headers.get('content-type')).toContain('application/problem+json')
  })

  it('gives no file from outside its folder', async () => {
    const response = await get('/assets/..%2f..%2f..%2f..%2fetc%2fhostname')
    expect(response.status).toBe(400)
    expect(response.headers.get('content-type')).toContain('application/problem+json')
  })
})
