import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { z } from 'zod'
import { ENDPOINTS } from '#shared/http/contracts'
import { startApi, type Api } from '../../support/api-app'

let api: Api
beforeAll(async () => {
  api = await startApi()
})
afterAll(() => api.close())

const get = (path: string) => api.newAgent().get(path)

describe('health', () => {
  it('is ok when the database answers and has every migration', async () => {
    const answer = await get('/health')
    expect(answer.status).toBe(200)
    expect(answer.body).toEqual({ status: 'ok' })
  })

  it('is not ready while a migration is missing', async () => {
    const last = await api.db.table('knex_migrations').orderBy('id', 'desc').first<{ id: number }>()
    await api.db.table('knex_migrations').where({ id: last?.id }).delete()
    try {
      const answer = await get('/health')
      expect(answer.status).toBe(503)
      expect(answer.problem().code).toBe('not-ready')
    } finally {
      await api.db.table('knex_migrations').insert(last)
    }
    expect((await get('/health')).status).toBe(200)
  })

  it('is not ready when the database cannot be read', async () => {
    await api.db.raw('alter table knex_migrations rename to elsewhere')
    try {
      const answer = await get('/health')
      expect(answer.status).toBe(503)
      expect(answer.problem().detail).toBe('The database does not answer yet.')
    } finally {
      await api.db.raw('alter table elsewhere rename to knex_migrations')
    }
  })
})

const documentSchema = z.object({
  openapi: z.literal('3.1.0'),
  paths: z.record(
    z.string(),
    z.record(
      z.string(),
      z.object({
        operationId: z.string(),
        parameters: z.array(z.object({ name: z.string(), in: z.string(), required: z.boolean() })),
        requestBody: z
          .object({ content: z.object({ 'application/json': z.object({ schema: z.json() }) }) })
          .optional(),
        responses: z.record(z.string(), z.json()),
      }),
    ),
  ),
})

describe('the API document', () => {
  const read = async () => documentSchema.parse((await get('/openapi.json')).body)

  it('has every endpoint of the contract under its own name, with its status', async () => {
    const { paths } = await read()
    for (const { method, path, success } of ENDPOINTS) {
      const operation = paths[path.replace(/:(\w+)/g, '{$1}')]?.[method.toLowerCase()]
      expect(operation?.responses, `${method} ${path}`).toHaveProperty(String(success))
    }
    const names = Object.values(paths).flatMap((methods) =>
      Object.values(methods).map(({ operationId }) => operationId),
    )
    expect(names).toHaveLength(ENDPOINTS.length)
    expect(new Set(names).size).toBe(names.length)
  })

  it('tells the parameters, headers and body of a request', async () => {
    const operation = (await read()).paths['/jobs']?.post
    expect(operation?.parameters.map(({ name, in: place }) => `${place} ${name}`)).toEqual([
      'header X-CSRF-Token',
      'header Idempotency-Key',
    ])
    expect(operation?.requestBody?.content['application/json'].schema).toMatchObject({
      type: 'object',
      required: ['name', 'address', 'pitchRise'],
      properties: { pitchRise: { type: 'number', minimum: 0, maximum: 24 } },
      additionalProperties: false,
    })
    const list = (await read()).paths['/jobs']?.get
    expect(list?.parameters).toContainEqual(
      expect.objectContaining({ name: 'limit', in: 'query', required: false }),
    )
    expect(list?.requestBody).toBeUndefined()
  })

  it('says of a file what it is, and promises no JSON', async () => {
    const { paths } = await read()
    const files = ENDPOINTS.filter(({ produces }) => produces !== 'application/json')
    expect(files.length).toBeGreaterThan(0)
    for (const { path, produces } of files) {
      const operation = paths[path.replace(/:(\w+)/g, '{$1}')]?.get
      expect(operation?.responses[200], path).toEqual({
        description: 'A file.',
        content: { [produces]: { schema: { type: 'string', format: 'binary' } } },
      })
    }
    expect(z.string().parse((await get('/docs')).body)).toContain('a file, <code>application/pdf')
  })

  it('can be read as a page without script', async () => {
    const { headers, body } = await get('/docs')
    const page = z.string().parse(body)
    expect(headers.get('content-type')).toContain('text/html')
    for (const { path } of ENDPOINTS) expect(page).toContain(path.replace(/:(\w+)/g, '{$1}'))
    expect(page).not.toMatch(/<script|<style|style=/)
    const sheet = await get('/docs.css')
    expect(sheet.headers.get('content-type')).toContain('text/css')
  })
})
