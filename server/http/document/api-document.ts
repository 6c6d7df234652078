import { z } from 'zod'
import { PERMISSIONS } from '#shared/access/permissions'
import { ENDPOINTS } from '#shared/http/contracts'
import type { Endpoint } from '#shared/http/endpoint'
import { problemSchema } from '#shared/http/problem'

export type JsonSchema = z.core.JSONSchema.BaseSchema

interface Parameter {
  readonly name: string
  readonly in: 'path' | 'query' | 'header'
  readonly required: boolean
  readonly description?: string
  readonly schema: JsonSchema
}

interface Content {
  readonly description?: string
  readonly required?: boolean
  readonly content?: Readonly<Record<string, { readonly schema: JsonSchema }>>
}

export interface Operation {
  readonly operationId: string
  readonly summary: string
  readonly tags: readonly string[]
  readonly description: string
  readonly security: readonly Readonly<Record<string, readonly string[]>>[]
  readonly parameters: readonly Parameter[]
  readonly requestBody?: Content
  readonly responses: Readonly<Record<string, Content>>
}

export interface ApiDocument {
  readonly openapi: '3.1.0'
  readonly info: { readonly title: string; readonly version: string; readonly description: string }
  readonly servers: readonly { readonly url: string }[]
  readonly paths: Readonly<Record<string, Readonly<Record<string, Operation>>>>
  readonly components: Readonly<Record<string, unknown>>
}

const INTRODUCTION = `JSON over HTTP. Lengths are inches, angles degrees, weights pounds, money integer
cents, times ISO 8601 in UTC. GET /session gives the CSRF token that every change sends back as
X-CSRF-Token. A few endpoints answer with a file instead of JSON. Requests that make or move something carry an Idempotency-Key; sent again under the
same key they get the first answer. Every failure is an RFC 9457 problem. GET /live streams what
changes as server-sent events.`

const isNothing = (schema: z.ZodType): boolean => schema instanceof z.ZodUndefined

const jsonSchema = (schema: z.ZodType, io: 'input' | 'output'): JsonSchema => {
  const { $schema: _, ...rest } = z.toJSONSchema(schema, { io })
  return rest
}

const json = (schema: JsonSchema, type = 'application/json') => ({ [type]: { schema } })

const answerOf = ({ answer, produces }: Endpoint): Content => {
  if (isNothing(answer)) return { description: 'Done.' }
  if (produces === 'application/json') {
    return { description: 'Done.', content: json(jsonSchema(answer, 'output')) }
  }
  return { description: 'A file.', content: json({ type: 'string', format: 'binary' }, produces) }
}

function parametersOf(place: 'path' | 'query', schema: z.ZodType): Parameter[] {
  const { properties = {}, required = [] } = jsonSchema(schema, 'input')
  return Object.entries(properties).map(([name, property]) => ({
    name,
    in: place,
    required: place === 'path' || required.includes(name),
    schema: typeof property === 'boolean' ? {} : property,
  }))
}

function headersOf({ method, idempotent }: Endpoint): Parameter[] {
  const headers: Parameter[] = []
  if (method !== 'GET') {
    const description = 'The csrfToken of GET /session.'
    const schema = { type: 'string' } as const
    headers.push({ name: 'X-CSRF-Token', in: 'header', required: true, description, schema })
  }
  if (idempotent) {
    const description = 'New for each change; the same again when the change is sent again.'
    const schema = { type: 'string', minLength: 8, maxLength: 200 } as const
    headers.push({ name: 'Idempotency-Key', in: 'header', required: true, description, schema })
  }
  return headers
}

const accessOf = ({ permission }: Endpoint): string =>
  permission === 'public'
    ? 'Open to everyone.'
    : `Needs ${permission}: ${PERMISSIONS[permission].join(', ')}.`

const nameOf = ({ method, path }: Endpoint): string =>
  [method.toLowerCase(), ...path.split('/').filter(Boolean)]
    .join('-')
    .replaceAll(':', 'by-')
    .replace(/-(\w)/g, (_, letter: string) => letter.toUpperCase())

function operationOf(endpoint: Endpoint): Operation {
  const { body, success } = endpoint
  return {
    operationId: nameOf(endpoint),
    summary: endpoint.summary,
    tags: [endpoint.path.split('/')[1] ?? ''],
    description: accessOf(endpoint),
    security: endpoint.permission === 'public' ? [] : [{ session: [] }],
    parameters: [
      ...parametersOf('path', endpoint.params),
      ...parametersOf('query', endpoint.query),
      ...headersOf(endpoint),
    ],
    ...(!isNothing(body) && {
      requestBody: { required: true, content: json(jsonSchema(body, 'input')) },
    }),
    responses: {
      [success]: answerOf(endpoint),
      default: {
        description: 'Refused or failed.',
        content: json({ $ref: '#/components/schemas/Problem' }, 'application/problem+json'),
      },
    },
  }
}

/** The contract as an OpenAPI 3.1 document, whose schemas are plain JSON Schema 2020-12. */
export function createApiDocument(): ApiDocument {
  const paths: Record<string, Record<string, Operation>> = {}
  for (const endpoint of ENDPOINTS) {
    const path = endpoint.path.replace(/:(\w+)/g, '{$1}')
    paths[path] = { ...paths[path], [endpoint.method.toLowerCase()]: operationOf(endpoint) }
  }
  return {
    openapi: '3.1.0',
    info: { title: 'Foldyard', version: '1', description: INTRODUCTION },
    servers: [{ url: '/api' }],
    paths,
    components: {
      schemas: { Problem: jsonSchema(problemSchema, 'output') },
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: 'foldyard.session' } },
    },
  }
}
