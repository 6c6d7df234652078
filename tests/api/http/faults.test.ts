import express from 'express'
import { createServer, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import { pino } from 'pino'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { z } from 'zod'
import { inTransaction } from '#server/db/transaction'
import { definePublicRoute } from '#server/http/define-route'
import { mountRoutes } from '#server/http/mount-routes'
import { answerProblem } from '#server/http/problem-answer'
import { logRequests } from '#server/http/request-log'
import { endpoint } from '#shared/http/endpoint'
import { problemSchema } from '#shared/http/problem'
import { startApi, type Api } from '../../support/api-app'

const ask = endpoint({
  method: 'GET',
  path: '/fault/:kind',
  permission: 'public',
  summary: 'Fails as it is told.',
  params: z.strictObject({ kind: z.string() }),
  answer: z.strictObject({ text: z.string() }),
})

const raise = (code: string) =>
  `do $$ begin raise exception 'a secret of the database' using errcode = '${code}'; end $$`

let api: Api
let server: Server
const logged: string[] = []
const tables: Record<string, () => Promise<{ text: string }>> = {}

const askFor = async (kind: string) => {
  const address = server.address() as AddressInfo
  const response = await fetch(`http://127.0.0.1:${address.port}/fault/${kind}`)
  return problemSchema.parse(await response.json())
}

beforeAll(async () => {
  api = await startApi()
  const failWith = (code: string) => async () => {
    await api.db.raw(raise(code))
    return { text: 'not reached' }
  }
  for (const code of ['FY001', 'FY002', 'FY003', 'FY004', 'FY005', 'FY006', '40P01', '22012']) {
    tables[code] = failWith(code)
  }
  tables.duplicate = async () => {
    const { name } = await api.make.company()
    await api.make.company(name)
    return { text: 'not reached' }
  }
  tables.answer = () => Promise.resolve({ text: 'right', passwordHash: 'not for you' })
  tables.crash = () => Promise.reject(new Error('line 17 of a secret file'))

  const app = express()
  app.use(logRequests(pino({ level: 'info' }, { write: (line) => void logged.push(line) })))
  const route = definePublicRoute(ask, ({ params }) => {
    const act = tables[params.kind]
    if (!act) throw new Error(`No fault ${params.kind}.`)
    return act()
  })
  mountRoutes(app, [route], api.db)
  app.use(answerProblem)
  server = createServer(app)
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
})
afterAll(async () => {
  await new Promise((resolve) => server.close(resolve))
  await api.close()
})

describe('a fault of ours', () => {
  it.each(['crash', 'answer', 'FY002', 'FY004', '22012'])(
    'is told without internals and logged with them: %s',
    async (kind) => {
      const problem = await askFor(kind)
      expect(problem).toMatchObject({ status: 500, code: 'internal' })
      expect(JSON.stringify(problem)).not.toMatch(/secret|passwordHash|not for you/)
      const lines = logged.filter((line) => line.includes(problem.requestId ?? 'no id'))
      expect(lines.join('\n')).toContain('request failed')
      expect(lines.join('\n')).toMatch(/secret|passwordHash/)
    },
  )
})

describe('a refusal of the database', () => {
  it.each([
    ['FY001', 409, 'wrong-state'],
    ['FY003', 400, 'invalid-input'],
    ['FY005', 409, 'wrong-state'],
    ['FY006', 409, 'changed-meanwhile'],
    ['40P01', 409, 'changed-meanwhile'],
    ['duplicate', 400, 'invalid-input'],
  ])('%s becomes %i %s', async (kind, status, code) => {
    const problem = await askFor(kind)
    expect(problem).toMatchObject({ status, code })
    expect(JSON.stringify(problem)).not.toContain('secret')
  })

  it('names the field that is taken', async () => {
    expect((await askFor('duplicate')).errors).toEqual([
      { path: 'name', message: 'There is already a company of this name. Choose another.' },
    ])
  })
})

describe('a transaction that had to give way', () => {
  it('is done once more and then succeeds', async () => {
    let tries = 0
    const answer = await inTransaction(api.db, async (db) => {
      tries += 1
      if (tries === 1) await db.raw(raise('40001'))
      return tries
    })
    expect(answer).toBe(2)
  })

  it('fails when it has to give way again, and is not tried for ever', async () => {
    let tries = 0
    const work = inTransaction(api.db, async (db) => {
      tries += 1
      await db.raw(raise('40001'))
    })
    await expect(work).rejects.toMatchObject({ code: '40001' })
    expect(tries).toBe(2)
  })
})
